namespace JointPlanner.Pictures;

/// <summary>
/// A drawing laid out for a given size: geometry that came from world units, with labels, arrows and line weights in millimetres of paper.
/// One writer makes an SVG of it for the screen, another draws it in a PDF.
/// </summary>
public sealed record Picture
{
    /// <summary>Makes a picture.</summary>
    /// <param name="widthMm">Width on paper, above zero.</param>
    /// <param name="heightMm">Height on paper, above zero.</param>
    /// <param name="title">Its name, read out first.</param>
    /// <param name="description">What it shows, in words, for whoever cannot see it.</param>
    /// <param name="elements">What is drawn, in drawing order.</param>
    /// <exception cref="ArgumentException">A size is not a number above zero, or the title is empty.</exception>
    public Picture(double widthMm, double heightMm, string title, string description, IReadOnlyList<Element> elements)
    {
        if (!(widthMm > 0) || !(heightMm > 0) || !double.IsFinite(widthMm + heightMm))
            throw new ArgumentException($"A picture's width and height must be above zero, not {widthMm} mm by {heightMm} mm.", nameof(widthMm));
        if (string.IsNullOrWhiteSpace(title))
            throw new ArgumentException("A picture needs a title: it is its name for whoever cannot see it.", nameof(title));
        (WidthMm, HeightMm, Title, Description, Elements) = (widthMm, heightMm, title, description, elements);
    }

    /// <summary>Width on paper in millimetres.</summary>
    public double WidthMm { get; }

    /// <summary>Height on paper in millimetres.</summary>
    public double HeightMm { get; }

    /// <summary>The picture's name.</summary>
    public string Title { get; }

    /// <summary>What the picture shows, in words.</summary>
    public string Description { get; }

    /// <summary>What is drawn, in drawing order.</summary>
    public IReadOnlyList<Element> Elements { get; }
}
