using System.Globalization;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Signing;

/// <summary>Draws what stands in the field's rectangle once it is signed.</summary>
internal static class SignatureAppearance
{
    /// <summary>Adds the drawing and gives its object number.</summary>
    public static int Add(UpdateWriter update, RevisionView view, FormField field, SignRequest request)
    {
        ArgumentNullException.ThrowIfNull(request);
        var rectangle = view.Array(field.Dictionary["Rect"])!.Items.Select(item => (view.Resolve(item) as PdfNumber)?.Value ?? 0).ToArray();
        string width = ValueText.Of(ValueText.Number(Math.Abs(rectangle[2] - rectangle[0]))), height = ValueText.Of(ValueText.Number(Math.Abs(rectangle[3] - rectangle[1])));
        return update.AddStream($"/Type/XObject/Subtype/Form/BBox[0 0 {width} {height}]/Resources<<>>",
            System.Text.Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"q 0.5 w 0.25 0.25 {width} {height} re S Q")));
    }
}
