namespace JointPlanner.Pdf.Faces;

/// <summary>The three cuts of the text face.</summary>
internal enum FaceStyle
{
    Regular,
    Strong,
    Italic,
}
