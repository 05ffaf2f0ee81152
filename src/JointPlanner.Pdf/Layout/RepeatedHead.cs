namespace JointPlanner.Pdf.Layout;

/// <summary>A table's head as it is painted again on the pages that the table runs on to; not read out a second time.</summary>
internal sealed record RepeatedHead(double Height, Action<PageCanvas, double> Paint);
