namespace JointPlanner.Pdf.Reading;

/// <summary>A file carried inside a PDF.</summary>
/// <param name="Name">Its name, as the PDF gives it: never use it as a path.</param>
/// <param name="Relationship">What it is to the PDF, such as "Source" or "Data" (ISO 32000-2, 7.11.3); empty where not said.</param>
/// <param name="Bytes">Its content, unpacked.</param>
public sealed record AttachedFile(string Name, string Relationship, byte[] Bytes);
