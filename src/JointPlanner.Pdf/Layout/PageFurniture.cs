using System.Globalization;
using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Head, foot and watermark of every page.</summary>
internal sealed class PageFurniture(Document document, Frame frame)
{
    private static readonly System.Text.CompositeFormat PageOfPages = System.Text.CompositeFormat.Parse("Page {0} of {1}");
    private readonly TextLook _look = new(Measures.Tiny + 0.3, 10, FaceStyle.Regular, Measures.Quiet);

    /// <summary>Behind the text, painted before it.</summary>
    public void PaintWatermark(PageCanvas canvas)
    {
        if (string.IsNullOrWhiteSpace(document.Watermark)) return;
        var text = frame.Set.Settable(document.Watermark);
        double width = frame.Paper.WidthPoints, height = frame.Paper.HeightPoints;
        var unit = frame.Set.Width(text, new(1, 1, FaceStyle.Strong));
        var size = Math.Min(92, Math.Sqrt((width * width) + (height * height)) * 0.74 / unit);
        var angle = Math.Atan2(height, width);
        double x = (width / 2) - (Math.Cos(angle) * unit * size / 2) + (Math.Sin(angle) * size * 0.35);
        double y = (height / 2) + (Math.Sin(angle) * unit * size / 2) + (Math.Cos(angle) * size * 0.35);
        // Read as nothing: the same words stand in the page's head, and letters across the page would be mixed into the text.
        canvas.Furniture(() => canvas.ReadAs("", () =>
        {
            foreach (var run in TypeSet.Standard.Split(text, FaceStyle.Strong))
            {
                canvas.Text(x, y, run.Face, size, run.Text, Measures.Watermark, -angle * 180 / Math.PI);
                (x, y) = (x + (run.Width * size * Math.Cos(angle)), y - (run.Width * size * Math.Sin(angle)));
            }
        }), "Watermark");
    }

    /// <summary>Painted when the number of pages is known.</summary>
    public void PaintHeadAndFoot(PageCanvas canvas, int pageCount)
    {
        var headLine = Measures.Top - 27;
        canvas.Furniture(() =>
        {
            if (!string.IsNullOrWhiteSpace(document.Watermark))
            {
                var mark = frame.Set.Fitted(document.Watermark, frame.Width, new(Measures.Small, 10, FaceStyle.Strong));
                Frame.PaintLine(canvas, mark, Frame.Left + ((frame.Width - mark.Width) / 2), headLine - 16, 10);
            }
            Pair(canvas, document.Head.Left, document.Head.Right, headLine);
            if (document.Head.Left.Length + document.Head.Right.Length > 0) canvas.Line(Frame.Left, headLine + 13, frame.Right, headLine + 13, Pen.Hair);
        }, "Header");
        var footLine = frame.Paper.HeightPoints - Measures.Bottom + 17;
        canvas.Furniture(() =>
        {
            canvas.Line(Frame.Left, footLine - 4, frame.Right, footLine - 4, Pen.Hair);
            Pair(canvas, document.Foot, string.Format(CultureInfo.InvariantCulture, PageOfPages, canvas.Index + 1, pageCount), footLine);
        }, "Footer");
    }

    private void Pair(PageCanvas canvas, string left, string right, double top)
    {
        var rightPiece = frame.Set.Fitted(right, frame.Width * 0.5, _look);
        var leftPiece = frame.Set.Fitted(left, frame.Width - rightPiece.Width - 16, _look);
        Frame.PaintLine(canvas, leftPiece, Frame.Left, top, 10);
        Frame.PaintLine(canvas, rightPiece, frame.Right - rightPiece.Width, top, 10);
    }
}
