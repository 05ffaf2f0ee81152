namespace JointPlanner.Pdf.Verifying;

/// <summary>What kind of thing an appended update did.</summary>
public enum FileChangeKind
{
    /// <summary>Put a signature and its appearance into an empty signature field; allowed.</summary>
    FieldSigned,

    /// <summary>Said that the file holds signatures; allowed.</summary>
    SignatureFlags,

    /// <summary>Said that the signature certifies the file; allowed with the first signature.</summary>
    Certified,

    /// <summary>Stored certificates and revocation data beside the signatures; allowed.</summary>
    SecurityStore,

    /// <summary>Added or removed pages, or changed their order.</summary>
    PagesChanged,

    /// <summary>Changed a page, its content or its annotations.</summary>
    PageChanged,

    /// <summary>Added a form field.</summary>
    FieldAdded,

    /// <summary>Changed a form field in another way than signing it once.</summary>
    FieldChanged,

    /// <summary>Changed an attachment.</summary>
    AttachmentChanged,

    /// <summary>Changed another part of the document.</summary>
    DocumentChanged,

    /// <summary>Added something that no allowed change needs.</summary>
    ObjectAdded,
}

/// <summary>One thing that an appended update did.</summary>
/// <param name="Kind">The kind, for programs.</param>
/// <param name="Text">What was done, for people, ready for a list: no capital, no full stop.</param>
public sealed record FileChange(FileChangeKind Kind, string Text)
{
    /// <summary>A later update may do this without touching what was signed before.</summary>
    public bool IsAllowed =>
        Kind is FileChangeKind.FieldSigned or FileChangeKind.SignatureFlags or FileChangeKind.Certified or FileChangeKind.SecurityStore;
}
