namespace JointPlanner.Pdf.Layout;

/// <summary>A piece of content as wide as the text that never parts between pages: a line, a slice of a table row, a picture.</summary>
/// <param name="height">Its height in points.</param>
/// <param name="paint">Paints it with its top edge at a distance from the page's top.</param>
internal sealed class Strip(double height, Action<PageCanvas, double> paint)
{
    public double Height { get; } = height;

    /// <summary>Open space above it; dropped at the top of a page.</summary>
    public double SpaceBefore { get; init; }

    /// <summary>How strongly it holds to the next strip.</summary>
    public Link Link { get; set; }

    /// <summary>What is painted again above it when it begins a page; null for nothing.</summary>
    public RepeatedHead? Head { get; init; }

    /// <summary>Whether it must begin a page.</summary>
    public bool BeginsPage { get; init; }

    /// <summary>Open space, which is dropped at the top of a page.</summary>
    public bool IsSpace { get; private init; }

    public static Strip Space(double height) => new(height, (_, _) => { }) { IsSpace = true };

    public void Paint(PageCanvas canvas, double top) => paint(canvas, top);
}
