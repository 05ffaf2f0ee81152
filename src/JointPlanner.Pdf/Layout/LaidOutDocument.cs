namespace JointPlanner.Pdf.Layout;

/// <summary>A document on its pages, in painting steps; it knows nothing of PDF.</summary>
internal sealed record LaidOutDocument(Document Document, IReadOnlyList<PageCanvas> Pages, StructureElement Root, IReadOnlyList<int> SpeltOut);
