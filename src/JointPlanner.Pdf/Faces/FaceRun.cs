namespace JointPlanner.Pdf.Faces;

/// <summary>A stretch of text that one face can set.</summary>
/// <param name="Face">The face.</param>
/// <param name="Text">The text.</param>
/// <param name="Width">Its width as a share of the type size.</param>
internal readonly record struct FaceRun(Face Face, string Text, double Width);
