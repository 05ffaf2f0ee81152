using System.Globalization;
using System.Security.Cryptography;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Why an uploaded signed sheet was not accepted.</summary>
public enum UploadRefusal
{
    /// <summary>The upload cannot be read as a PDF.</summary>
    NotReadable,

    /// <summary>The upload is not the archived file with something appended: bytes were changed.</summary>
    ChangedBytes,

    /// <summary>The upload is the archived file as it was: nothing was signed.</summary>
    NothingAdded,

    /// <summary>More than one update was appended.</summary>
    SecondUpdate,

    /// <summary>Another field than the expected one was signed.</summary>
    WrongField,

    /// <summary>The update did something besides signing the field.</summary>
    MoreThanASignature,

    /// <summary>The signature does not fit its bytes or cannot be read.</summary>
    BrokenSignature,

    /// <summary>The signature was made with another certificate than the one registered for the person.</summary>
    AnotherCertificate,

    /// <summary>The certificate is too weak, out of its dates, or not made for signing.</summary>
    CertificateUnsuitable,

    /// <summary>The same key has signed another field.</summary>
    KeyUsedInOtherField,
}

/// <summary>The answer to an upload: either a refusal with its reason, or what was accepted.</summary>
/// <param name="Refusal">The reason for refusing, for programs; null when accepted.</param>
/// <param name="Text">The answer, for people.</param>
/// <param name="Signature">What the signature says; null when refused. Its issuer is not judged here: the registered fingerprint is what counts.</param>
/// <param name="Appended">The bytes to store behind the archived ones; empty when refused.</param>
public sealed record UploadAnswer(UploadRefusal? Refusal, string Text, SignatureReport? Signature, ReadOnlyMemory<byte> Appended)
{
    /// <summary>The upload may be stored.</summary>
    public bool IsAccepted => Refusal is null;
}

/// <summary>What must be true of an uploaded sheet that was signed elsewhere.</summary>
public static class UpdateRule
{
    /// <summary>Accepts the upload only if it is the archived file exactly, and exactly one update after it that signs the field and does nothing else.</summary>
    /// <param name="archived">The archived file.</param>
    /// <param name="uploaded">The file that came back.</param>
    /// <param name="field">The prepared field that this person signs.</param>
    /// <param name="registeredFingerprint">SHA-256 of the certificate registered for this person, hexadecimal.</param>
    /// <param name="received">When the upload came; the certificate must be within its dates then.</param>
    /// <param name="limits">How much of the file is looked at; the defaults where null.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public static UploadAnswer AcceptSignedUpload(
        byte[] archived, byte[] uploaded, string field, string registeredFingerprint, DateTimeOffset received, PdfReadLimits? limits = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(archived);
        ArgumentNullException.ThrowIfNull(uploaded);
        int same = archived.AsSpan().CommonPrefixLength(uploaded);
        if (same < archived.Length)
        {
            return No(UploadRefusal.ChangedBytes, uploaded.Length <= same
                ? Invariant($"The upload ends after {same} bytes; the archived file has {archived.Length}. Upload the signed file as a whole.")
                : Invariant($"The upload differs from the archived file from byte {same} on. A signature must be appended to the archived file; a program that rewrites the file cannot be used."));
        }
        if (uploaded.Length == same) return No(UploadRefusal.NothingAdded, "The upload is the archived file itself: nothing was signed.");
        try
        {
            var file = PdfRevisions.Open(uploaded, limits, cancellation);
            file.ReadEverything();
            return Judge(file, same, field, registeredFingerprint, received);
        }
        catch (PdfReadException e)
        {
            return No(UploadRefusal.NotReadable, e.Message);
        }
        catch (Exception e) when (StrangersValue.IsAtFault(e))
        {
            return No(UploadRefusal.BrokenSignature, "The signature or its certificate cannot be read.");
        }
    }

    private static UploadAnswer Judge(PdfRevisions file, int archived, string field, string registered, DateTimeOffset received)
    {
        int first = 0;
        while (first < file.All.Count && file.All[first].End < archived) first++;
        if (first == file.All.Count || file.All[first].End != archived && file.All[first].MarkEnd != archived)
            return No(UploadRefusal.ChangedBytes, "The archived file is not a whole state of the uploaded one.");
        int updates = file.All.Count - 1 - first;
        if (updates == 0) return No(UploadRefusal.NothingAdded, "The upload adds no update to the archived file: nothing was signed.");
        if (updates > 1)
            return No(UploadRefusal.SecondUpdate, Invariant($"The upload adds {updates} updates to the archived file; one signature is one update. Sign the downloaded file once and change nothing else."));
        var view = file.Last;
        var changes = UpdateChanges.Of(file, file.All.Count - 1);
        // Stricter than for readers: a store of certificates may follow later, but is no part of signing.
        var other = changes.Where(change => !change.IsAllowed || change.Kind == FileChangeKind.SecurityStore).Select(change => change.Text).ToList();
        if (other.Count > 0)
            return No(UploadRefusal.MoreThanASignature, $"The upload changes more than the signature field: {PlainText.List(other)}.");
        var before = FormFields.In(file.View(first)).Where(known => known.IsFilled(file.View(first))).Select(known => known.Number).ToHashSet();
        var signed = FormFields.In(view).Where(known => known.IsFilled(view) && !before.Contains(known.Number)).ToList();
        if (signed.Count == 0) return No(UploadRefusal.NothingAdded, "The upload fills no signature field: nothing was signed.");
        if (signed.Count > 1 || signed[0].Name != field)
            return No(UploadRefusal.WrongField, $"The upload signs the field {PlainText.List([.. signed.Select(known => PlainText.Of(known.Name))])}; expected was {PlainText.Of(field)}.");
        return JudgeSignature(file, view, signed[0], registered, received, archived);
    }

    private static UploadAnswer JudgeSignature(PdfRevisions file, RevisionView view, FormField field, string registered, DateTimeOffset received, int archived)
    {
        var (hole, value, fault) = SignatureCheck.Value(file, view, field);
        if (hole is null || value is null) return No(UploadRefusal.BrokenSignature, $"The signature is not whole: {fault}.");
        if (hole.Covered != file.File.Length) return No(UploadRefusal.BrokenSignature, "The signature does not cover the whole file.");
        string fingerprint = CertificateRules.Fingerprint(value.Certificate);
        if (!CryptographicOperations.FixedTimeEquals(System.Text.Encoding.ASCII.GetBytes(fingerprint), System.Text.Encoding.ASCII.GetBytes(registered.ToUpperInvariant())))
            return No(UploadRefusal.AnotherCertificate, $"The sheet was signed with the certificate {fingerprint} of {PlainText.Of(value.Certificate.Subject)}; registered for this person is {PlainText.Of(registered)}.");
        if (CertificateRules.Fault(value.Certificate, received) is { } unsuitable)
            return No(UploadRefusal.CertificateUnsuitable, unsuitable.Text);
        foreach (var filled in FormFields.In(view).Where(known => known.Number != field.Number && known.IsFilled(view)))
            if (SignatureCheck.Value(file, view, filled).Value is { } earlier && CertificateRules.SameKey(earlier.Certificate, value.Certificate))
                return No(UploadRefusal.KeyUsedInOtherField, $"The field {PlainText.Of(filled.Name)} is signed with the same key; designer and checker must be two persons with two keys.");
        var report = SignatureCheck.Of(file, view, field, [.. file.All.Select(_ => new Lazy<List<FileChange>>([]))], []);
        return new(null, $"The field {PlainText.Of(field.Name)} was signed and nothing else was changed.", report, file.File.AsMemory(archived));
    }

    private static UploadAnswer No(UploadRefusal refusal, string text) => new(refusal, text, null, ReadOnlyMemory<byte>.Empty);

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
