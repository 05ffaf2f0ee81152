namespace JointPlanner.Pdf.Layout;

/// <summary>A heading for the outline.</summary>
/// <param name="Rank">1 or 2.</param>
/// <param name="Title">Its words with their number.</param>
/// <param name="Page">Index of the page.</param>
/// <param name="Top">Distance from the page's top edge in points.</param>
internal sealed record OutlineMark(int Rank, string Title, int Page, double Top);
