using System.Globalization;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Revisions;
using JointPlanner.Exchange.Packages;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Issuing.Verifying;

/// <summary>What can be said of a sheet that anyone may have made: from the file itself, and against the archive.</summary>
/// <param name="Report">What the file says by itself.</param>
/// <param name="Archive">Sentences of the comparison with this archive, the gravest first.</param>
/// <param name="MayBeUsed">False where the archive knows a reason not to build from it: not issued, superseded, withdrawn, not there.</param>
public sealed record SheetVerification(VerificationReport Report, IReadOnlyList<string> Archive, bool MayBeUsed)
{
    /// <summary>Looks at a file.</summary>
    /// <param name="pdf">The file.</param>
    /// <param name="roots">Authorities that the operator trusts.</param>
    /// <param name="lookup">The archive.</param>
    /// <param name="cancel">Stops the reading.</param>
    public static async Task<SheetVerification> Of(byte[] pdf, X509Certificate2Collection roots, SheetLookup lookup, CancellationToken cancel = default)
    {
        var found = await lookup.ByPrefix(FilePrefixes.Hashes(pdf), cancel);
        var report = new Verifier(roots).Verify(pdf, found?.Prefixes.Select(p => new ArchivedState((int)p.Length, p.Hash)).ToList(), cancel);
        if (found is not null)
            return new(report, [.. Standing(found), .. Bytes(report.Archive!)], found.State == RevisionState.Issued && report.Archive!.Verdict == ArchiveVerdict.Latest);
        var kept = PackageOf(pdf, report, cancel) is { } package ? await lookup.ByPackage(package, cancel) : null;
        return new(report, kept is null
            ? ["This file is not in this archive, and no archived sheet begins as it does. It may be of another installation, or forged."]
            : [
                "These are not the archived bytes: the file was rewritten, or imitates a sheet. Signatures in it count only if they are told unchanged below; get the sheet from its owner.",
                $"The calculation attached to it is, byte for byte, that of an archived sheet. {Standing(kept)[0]}",
            ], MayBeUsed: false);
    }

    private static IReadOnlyList<string> Standing(FoundSheet sheet)
    {
        var since = Local(sheet.Since, sheet.Zone);
        return sheet.State switch
        {
            RevisionState.Issued => [Invariant($"Revision {sheet.Number} is issued, since {since}, and no later one is.")],
            RevisionState.Superseded => [Invariant($"Superseded on {since}: a later revision than {sheet.Number} is issued. Do not build or set a joint from this one.")],
            RevisionState.Withdrawn => [Invariant($"Withdrawn on {since}, because: {sheet.Reason?.TrimEnd('.')}. Do not build or set a joint from revision {sheet.Number}.")],
            RevisionState.Returned => [Invariant($"Never issued: revision {sheet.Number} was returned by its checker on {since}. Do not build or set a joint from it.")],
            _ => [Invariant($"Not issued: revision {sheet.Number} is still being checked. Do not build or set a joint from it.")],
        };
    }

    private static IEnumerable<string> Bytes(ArchiveStatement statement) => statement.Verdict switch
    {
        ArchiveVerdict.Latest => ["The file is, byte for byte, the sheet as this archive holds it."],
        ArchiveVerdict.Earlier => ["The file is, byte for byte, an earlier state of the archived sheet; the archive holds it with more signatures. Get that one."],
        _ => [$"The file is not the archived sheet. {statement.Text}"],
    };

    private static string? PackageOf(byte[] pdf, VerificationReport report, CancellationToken cancel)
    {
        if (report.Origin == FileOrigin.NotReadable) return null;
        try
        {
            return Attachments.Read(pdf, cancellation: cancel).FirstOrDefault(a => a.Name == "calculation.json") is { } package ? ContentHash.Of(package.Bytes) : null;
        }
        catch (PdfReadException)
        {
            return null;
        }
    }

    private static string Local(DateTimeOffset instant, string zone)
    {
        var place = TimeZoneInfo.TryFindSystemTimeZoneById(zone, out var known) ? known : TimeZoneInfo.Utc;
        return string.Create(CultureInfo.InvariantCulture, $"{TimeZoneInfo.ConvertTime(instant, place):yyyy-MM-dd HH:mm} {place.Id}");
    }

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
