namespace JointPlanner.Pdf;

/// <summary>A finished file.</summary>
/// <param name="Bytes">The file.</param>
/// <param name="PageCount">How many pages it has.</param>
/// <param name="SpeltOut">Characters of the document that no face has or that run from right to left; each stands on the page as its code
/// point, such as <c>[U+4E00]</c>. In order of code point; empty when every character was set as it is.</param>
public sealed record PdfFile(byte[] Bytes, int PageCount, IReadOnlyList<int> SpeltOut);
