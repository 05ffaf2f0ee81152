using System.Globalization;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>One revision as one person sees it, and what they may do with it.</summary>
public sealed record RevisionView
{
    private static readonly Act[] Asked = [Act.Begin, Act.Freeze, Act.Return, Act.Accept, Act.Sign, Act.Issue, Act.Withdraw];

    /// <summary>The revision with its states.</summary>
    public required Revision Revision { get; init; }
    /// <summary>Its structure.</summary>
    public required Archive.Structures.Structure Structure { get; init; }
    /// <summary>What was frozen; null for a draft.</summary>
    public FrozenPackage? Package { get; init; }
    /// <summary>What the stored package and results say, and what differs from the last issue; null for a draft and where they were altered.</summary>
    public FrozenView? Frozen { get; init; }
    /// <summary>What is wrong with the stored bytes; empty where nothing is.</summary>
    public string Alteration { get; init; } = "";
    /// <summary>Hash of the sheet as it stands; empty for a draft.</summary>
    public string DocumentHash { get; init; } = "";
    /// <summary>Fields that are signed.</summary>
    public IReadOnlyList<SignatureField> SignedFields { get; init; } = [];
    /// <summary>Every revision of the structure that the person may see, latest first.</summary>
    public IReadOnlyList<ChainLink> Chain { get; init; } = [];
    /// <summary>Roles by which the person may do each act.</summary>
    public required IReadOnlyDictionary<Act, IReadOnlyList<Role>> Roles { get; init; }

    /// <summary>Whether the person may do the act at all; the archive asks again when it is done.</summary>
    public bool May(Act act) => Roles[act].Count > 0;

    /// <summary>The draft that stands open; null for none.</summary>
    public ChainLink? OpenDraft => Chain.FirstOrDefault(link => link.State == RevisionState.Draft);

    /// <summary>True where the next revision may be begun from here.</summary>
    public bool MayBeginNext => May(Act.Begin) && Structure.ClosedAt is null && Revision.State is RevisionState.Issued or RevisionState.Superseded or RevisionState.Withdrawn;

    /// <summary>The field that this person may sign now; null for none.</summary>
    public SignatureField? MySignature
    {
        get
        {
            if (Revision.State is not (RevisionState.InCheck or RevisionState.Checked)) return null;
            foreach (var (role, place) in (ReadOnlySpan<(Role, SignatureField)>)[(Role.Designer, SignatureField.Designer), (Role.Checker, SignatureField.Checker)])
            {
                // The checker's signature says that it was checked, so it comes with or after the acceptance.
                if (place == SignatureField.Checker && Revision.State != RevisionState.Checked) continue;
                if (Roles[Act.Sign].Contains(role) && !SignedFields.Contains(place)) return place;
            }

            return null;
        }
    }

    /// <summary>An instant in the structure's own zone.</summary>
    public string Local(DateTimeOffset instant)
    {
        var zone = TimeZoneInfo.TryFindSystemTimeZoneById(Structure.Zone, out var found) ? found : TimeZoneInfo.Utc;
        return string.Create(CultureInfo.InvariantCulture, $"{TimeZoneInfo.ConvertTime(instant, zone):yyyy-MM-dd HH:mm} {Structure.Zone}");
    }

    /// <summary>Reads it.</summary>
    /// <exception cref="NotFound">There is none for this person.</exception>
    internal static async Task<RevisionView> Read(ArchiveScope scope, Guid id)
    {
        var revision = await scope.Revisions().Include(r => r.States).FirstOrDefaultAsync(r => r.Id == id) ?? throw new NotFound("revision");
        var structure = await scope.Structures().FirstAsync(s => s.Id == revision.StructureId);
        var package = await scope.Packages().FirstOrDefaultAsync(p => p.RevisionId == id);
        var (document, alteration) = package is null ? (null, "") : await Stored(scope, package);
        var roles = new Dictionary<Act, IReadOnlyList<Role>>();
        foreach (var act in Asked) roles[act] = await scope.RolesFor(act, structure.Id);
        return new RevisionView
        {
            Revision = revision,
            Structure = structure,
            Package = package,
            Frozen = package is not null && alteration.Length == 0 ? await FrozenView.Read(scope, revision, package) : null,
            Alteration = alteration,
            DocumentHash = document?.Hash ?? "",
            SignedFields = [.. (document?.Segments ?? []).Select(s => s.Field).OfType<SignatureField>()],
            Chain = await ChainLink.All(scope, structure.Id),
            Roles = roles,
        };
    }

    private static async Task<(StoredDocument? Document, string Alteration)> Stored(ArchiveScope scope, FrozenPackage package)
    {
        if (!package.IsIntact)
            return (null, "The stored calculation package was altered: it no longer gives the hash that it was frozen with. Nothing of it is shown or done; tell the administrator to run verify-archive.");
        try
        {
            return (await scope.Document(package.RevisionId), "");
        }
        catch (ActRefused altered) when (altered.Reason == RefusalReason.Altered)
        {
            return (null, altered.Message);
        }
    }
}
