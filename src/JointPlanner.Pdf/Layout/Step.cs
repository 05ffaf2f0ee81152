using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>One step of painting a page, in points from its left and top edges.</summary>
internal abstract record Step;

/// <summary>Letters of one face on a baseline, turned clockwise about their start.</summary>
internal sealed record TextStep(double X, double Y, Face Face, double Size, string Text, double Grey, double AngleDegrees) : Step;

/// <summary>A line with corners, or an area when closed.</summary>
internal sealed record PathStep(IReadOnlyList<(double X, double Y)> Points, bool Closed, Pen Pen) : Step;

/// <summary>A circle.</summary>
internal sealed record CircleStep(double X, double Y, double Radius, Pen Pen) : Step;

/// <summary>What follows belongs to an element of the structure.</summary>
internal sealed record OpenElement(StructureElement Element) : Step;

/// <summary>What follows belongs to no element: page furniture.</summary>
internal sealed record OpenArtifact(string Kind) : Step;

/// <summary>What follows reads as this text when it is copied or searched.</summary>
internal sealed record OpenReading(string Text) : Step;

/// <summary>Ends the last open element, artifact or reading.</summary>
internal sealed record Close : Step
{
    public static Close Step { get; } = new();
}
