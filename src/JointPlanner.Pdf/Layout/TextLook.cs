using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>How a text is set where its words do not say otherwise.</summary>
/// <param name="Size">Type size in points.</param>
/// <param name="LineHeight">Least distance of baselines in points.</param>
/// <param name="Style">Cut of the face.</param>
/// <param name="Grey">Shade.</param>
internal readonly record struct TextLook(double Size, double LineHeight, FaceStyle Style = FaceStyle.Regular, double Grey = Measures.Ink)
{
    public static TextLook Body => new(Measures.Body, Measures.BodyLine);

    public static TextLook Cell => new(Measures.Small, Measures.SmallLine);

    public TextLook With(Emphasis emphasis) => emphasis switch
    {
        Emphasis.None => this,
        Emphasis.Strong => this with { Style = FaceStyle.Strong },
        Emphasis.Italic => this with { Style = FaceStyle.Italic },
        Emphasis.Quiet => this with { Grey = Math.Max(Grey, Measures.Quiet) },
        _ => throw new InvalidOperationException($"There is no emphasis {emphasis}."),
    };
}
