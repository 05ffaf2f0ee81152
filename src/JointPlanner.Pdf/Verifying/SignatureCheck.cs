using System.Globalization;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Checks one filled field and words the three statements.</summary>
internal static class SignatureCheck
{
    private static readonly WhoStatement Nobody = new(WhoVerdict.NotEstablished, "Nothing can be said about who signed.", "", "", "", "");
    private static readonly WhenStatement Never = new(WhenVerdict.NotStated, "Nothing can be said about when it was signed.", null);

    public static SignatureReport Of(PdfRevisions file, RevisionView view, FormField field, List<Lazy<List<FileChange>>> updates, X509Certificate2Collection roots)
    {
        var dictionary = view.Dictionary(field.Dictionary["V"]);
        var (unchanged, value) = Unchanged(file, view, field, updates);
        var when = value is null ? Never : SigningTime.Of(value, view.Text(dictionary?["M"]), roots);
        var who = value is null ? Nobody : GuardedWho(value, when, roots);
        return new(PlainText.Of(field.Name), unchanged, who, when, Stated("Name"), Stated("Reason"), Stated("Location"), value?.NotSigned ?? []);

        string Stated(string key) => PlainText.Of(view.Text(dictionary?[key]));
    }

    /// <summary>The value of a signature that fits its bytes, without a word on later updates; for the signer and the upload rule.</summary>
    public static (SignatureHole? Hole, SignatureValue? Value, string Fault) Value(PdfRevisions file, RevisionView view, FormField field)
    {
        var (hole, fault) = SignatureHole.Find(file, view, field.Dictionary["V"]);
        if (hole is null) return (null, null, fault);
        var (value, misfit) = SignatureValue.Check(hole.Value, hole.Signed(file.File), view.Name(hole.Dictionary["SubFilter"]) == "ETSI.CAdES.detached");
        return (hole, value, misfit);
    }

    private static (UnchangedStatement Statement, SignatureValue? Value) Unchanged(PdfRevisions file, RevisionView view, FormField field, List<Lazy<List<FileChange>>> updates)
    {
        string kind = view.Name(view.Dictionary(field.Dictionary["V"])?["SubFilter"]) ?? "";
        if (kind is not ("ETSI.CAdES.detached" or "adbe.pkcs7.detached"))
            return (new(UnchangedVerdict.NotCheckable, $"Not checked: this program does not check signatures of the kind \"{PlainText.Of(kind)}\".", 0, []), null);
        var (hole, value, fault) = Value(file, view, field);
        if (hole is null || value is null) return (new(UnchangedVerdict.Broken, $"Broken: {fault}.", 0, []), null);
        var later = updates.Skip(hole.Revision + 1).SelectMany(update => update.Value).ToList();
        var forbidden = later.Where(change => !change.IsAllowed).Select(change => change.Text).ToList();
        string covered = hole.Covered == file.File.Length
            ? Invariant($"it covers the whole file, {hole.Covered} bytes, but for its own value")
            : Invariant($"it covers the first {hole.Covered} of {file.File.Length} bytes, but for its own value");
        if (forbidden.Count > 0)
            return (new(UnchangedVerdict.ChangedAfterSigning, $"Changed after signing: {PlainText.List(forbidden)}. The signed state itself is whole: {covered}.", hole.Covered, later), value);
        string then = later.Count == 0 ? "" : $" After it only this was added: {PlainText.List([.. later.Select(change => change.Text).Distinct()])}.";
        return (new(UnchangedVerdict.Unchanged, $"Unchanged since it was signed: {covered}.{then}", hole.Covered, later), value);
    }

    private static WhoStatement GuardedWho(SignatureValue value, WhenStatement when, X509Certificate2Collection roots)
    {
        try
        {
            return Who(value, when, roots);
        }
        catch (Exception e) when (StrangersValue.IsAtFault(e))
        {
            return Nobody with { Text = "Nothing can be said about who signed: the certificate cannot be read." };
        }
    }

    private static WhoStatement Who(SignatureValue value, WhenStatement when, X509Certificate2Collection roots)
    {
        var certificate = value.Certificate;
        string subject = PlainText.Of(certificate.Subject), issuer = PlainText.Of(certificate.Issuer), fingerprint = CertificateRules.Fingerprint(certificate);
        var instant = when.Instant ?? new DateTimeOffset(certificate.NotBefore.ToUniversalTime());
        var chain = IssuerChain.Of(certificate, value.Carried, roots, instant);
        if (chain.Root is null)
            return new(WhoVerdict.UnknownIssuer, $"Unknown issuer: the certificate says {subject}, issued by {issuer}, which leads to no authority trusted here. Anyone could have made it.", subject, issuer, "", fingerprint);
        string root = PlainText.Of(chain.Root.Subject);
        string unsuitable = !chain.WithinDates ? "was not within its dates at the time of signing"
            : !CertificateRules.MaySign(certificate) ? "is not made for signing documents"
            : CertificateRules.WeakSignature(certificate) ? "was issued with SHA-1 or MD5" : "";
        return unsuitable.Length > 0
            ? new(WhoVerdict.CertificateUnsuitable, $"The certificate of {subject}, vouched for by {root}, {unsuitable}.", subject, issuer, root, fingerprint)
            : new(WhoVerdict.KnownIssuer, $"Signed with the certificate of {subject}, vouched for by {root}. Revocation was not checked.", subject, issuer, root, fingerprint);
    }

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
