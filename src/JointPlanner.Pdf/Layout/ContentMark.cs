namespace JointPlanner.Pdf.Layout;

/// <summary>A marked stretch of a page's content.</summary>
/// <param name="Page">Index of the page.</param>
/// <param name="Number">Number of the stretch on its page.</param>
internal readonly record struct ContentMark(int Page, int Number);
