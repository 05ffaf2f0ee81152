namespace JointPlanner.Pdf;

/// <summary>
/// A picture, drawn as lines and letters and never as a grid of dots. One wider than the text is scaled down with everything on it; lay it
/// out for <see cref="PaperSize.TextWidthMm"/> to avoid that.
/// </summary>
/// <param name="Picture">The picture; its title and description are read to whoever cannot see it.</param>
/// <param name="Caption">The line below it, with its number; null for none.</param>
public sealed record PictureBlock(Pictures.Picture Picture, string? Caption = null) : Block;
