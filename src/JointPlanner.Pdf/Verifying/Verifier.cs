using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Reads a PDF that anyone may have made and says, signature by signature, what can be concluded from it.</summary>
/// <remarks>Nothing is fetched over the network and nothing is written; the only inputs are the bytes and the roots given.</remarks>
/// <param name="trustedRoots">Certificates of the authorities that the operator trusts, for signers and for time stamps.</param>
/// <param name="limits">How much of a file is looked at; the defaults where null.</param>
public sealed class Verifier(X509Certificate2Collection trustedRoots, PdfReadLimits? limits = null)
{
    private const int MostSignatures = 16;

    private static readonly string[] SheetFields = ["designer", "checker"];
    private static readonly string[] SheetAttachments = ["calculation.json", "results.json"];

    private static readonly string[] CheckedAlways =
    [
        "Each signed range was compared with the place of the signature's own value, and must end where a state of the file ends.",
        "Each update after a signature was compared object by object with the state before it.",
        "Certificates were followed to the given roots only. Whether one was revoked was not checked, and nothing was fetched over the network.",
        "What the pages say was not judged.",
    ];

    /// <summary>Says what can be concluded; never throws because of the bytes.</summary>
    /// <param name="pdf">The file.</param>
    /// <param name="archived">The archived states of the sheet that this file is meant to be, if known.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public VerificationReport Verify(byte[] pdf, IReadOnlyList<ArchivedState>? archived = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(pdf);
        var archive = archived is null ? null : ArchiveStatement.Compare(pdf, archived);
        string hash = Convert.ToHexString(SHA256.HashData(pdf));
        try
        {
            var file = PdfRevisions.Open(pdf, limits, cancellation);
            if (file.All.Count > 1) file.ReadEverything();
            var view = file.Last;
            var fields = FormFields.In(view);
            var (origin, text) = Origin(view, fields);
            var filled = fields.Where(field => field.IsFilled(view)).ToList();
            if (filled.Count > MostSignatures)
                throw new PdfReadException(PdfReadFailure.TooManyObjects, "The PDF has more than 16 signatures.");
            var updates = Enumerable.Range(0, file.All.Count).Select(i => new Lazy<List<FileChange>>(() => UpdateChanges.Of(file, i))).ToList();
            var reports = filled.Select(field => SignatureCheck.Of(file, view, field, updates, trustedRoots)).OrderBy(report => report.Unchanged.CoveredBytes).ToList();
            return new(origin, text, pdf.Length, hash, reports, [.. fields.Where(field => !field.IsFilled(view)).Select(field => PlainText.Of(field.Name))], archive, CheckedAlways);
        }
        catch (PdfReadException e)
        {
            return new(FileOrigin.NotReadable, e.Message, pdf.Length, hash, [], [], archive, ["The file was not read further, so nothing was checked but the comparison with the archive, where one was asked for."]);
        }
    }

    private static (FileOrigin Origin, string Text) Origin(RevisionView view, List<FormField> fields)
    {
        var attached = Attachments.Specifications(view).Select(found => found.Name).ToHashSet();
        var missing = new List<string>();
        if (!SheetAttachments.All(attached.Contains)) missing.Add("the attachments calculation.json and results.json");
        if (!SheetFields.Any(name => fields.Exists(field => field.Name == name))) missing.Add("a prepared signature field");
        return missing.Count == 0
            ? (FileOrigin.InTheFormOfASheet, "The file has the form of a sheet made by this program. That alone proves nothing; the signatures and the archive do.")
            : (FileOrigin.NotMadeByThisProgram, string.Create(CultureInfo.InvariantCulture, $"The file was not made by this program: it lacks {string.Join(" and ", missing)}."));
    }
}
