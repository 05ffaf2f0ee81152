namespace JointPlanner.Pictures.Svg;

/// <summary>What the caller wants of an SVG besides the drawing.</summary>
public sealed record SvgLook
{
    /// <summary>
    /// Whether elements with a plan path can be pressed: each then gets a place in the tab order, the role of a button and its title as name.
    /// The picture as a whole is then a group and no longer one image, because an image may hold no buttons.
    /// </summary>
    public bool Pressable { get; init; }

    /// <summary>Whether width and height are written in millimetres, for a saved file; else the picture fills the room that the page gives it.</summary>
    public bool TrueSize { get; init; }
}
