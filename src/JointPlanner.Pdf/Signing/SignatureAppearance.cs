using System.Globalization;
using System.Text;
using JointPlanner.Pdf.Faces;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Verifying;
using JointPlanner.Pdf.Writing;

namespace JointPlanner.Pdf.Signing;

/// <summary>Draws what stands in the field's rectangle once it is signed, in the sheet's own faces, which come along as subsets.</summary>
internal static class SignatureAppearance
{
    private const double Margin = 2, Leading = 1.3;

    /// <summary>Adds the drawing and gives its object number.</summary>
    public static int Add(UpdateWriter update, RevisionView view, FormField field, SignRequest request)
    {
        var corners = view.Array(field.Dictionary["Rect"])!.Items.Select(item => (view.Resolve(item) as PdfNumber)?.Value ?? 0).ToArray();
        double width = Math.Abs(corners[2] - corners[0]), height = Math.Abs(corners[3] - corners[1]);
        var fonts = new FontShelf();
        string drawing = Draw(Lines(request), width, height, fonts);
        var head = new Writing.PdfDictionary("XObject").Name("Subtype", "Form").Numbers("BBox", 0, 0, width, height).Dictionary("Resources", fonts.Write(update));
        return update.AddStream(head, Encoding.ASCII.GetBytes(drawing));
    }

    private static List<(string Text, FaceStyle Style, double Size)> Lines(SignRequest request)
    {
        string when = request.Instant.UtcDateTime.ToString("yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture) + " UTC (the signer's word)";
        string fingerprint = CertificateRules.Fingerprint(request.Certificate);
        return
        [
            (request.SignerName, FaceStyle.Strong, 8.5),
            (string.Join(" · ", new[] { request.Reason, request.Place, when }.Where(part => part.Length > 0)), FaceStyle.Regular, 7),
            ("Issuer " + PlainText.Of(request.Certificate.GetNameInfo(System.Security.Cryptography.X509Certificates.X509NameType.SimpleName, true)), FaceStyle.Regular, 6.5),
            ($"Certificate SHA-256 {fingerprint[..16]}…{fingerprint[^8..]}", FaceStyle.Regular, 6.5),
        ];
    }

    private static string Draw(List<(string Text, FaceStyle Style, double Size)> lines, double width, double height, FontShelf fonts)
    {
        var set = TypeSet.Standard;
        double room = lines.Sum(line => line.Size * Leading) + (2 * Margin), shrink = Math.Min(1, height / room), top = height - (Margin * shrink);
        var drawing = new StringBuilder("0.1 g\n");
        foreach (var (text, style, full) in lines)
        {
            string settable = set.Settable(text, new HashSet<int>());
            double size = full * shrink, natural = set.Width(settable, style, size);
            // Text too long for the box is set smaller, never cut: it says who signed.
            if (natural > width - (2 * Margin)) size *= (width - (2 * Margin)) / natural;
            top -= full * shrink * Leading;
            double x = Margin, y = top + (full * shrink * 0.3);
            foreach (var run in set.Split(settable, style))
            {
                var font = fonts.For(run.Face);
                drawing.Append(CultureInfo.InvariantCulture, $"BT /{font.Name} {Syntax.Number(size)} Tf {Syntax.Number(x)} {Syntax.Number(y)} Td {font.Encode(run.Text)} Tj ET\n");
                x += run.Width * size;
            }
        }
        return drawing.ToString();
    }
}
