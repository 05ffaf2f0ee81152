namespace JointPlanner.Recomputation.Tests.Sheets;

/// <summary>A stretch of a page: what a person sees, and what a reading aid or a copied text gets.</summary>
/// <param name="Drawn">The letters on the page, in the order of drawing.</param>
/// <param name="Read">The text that stands for them; the letters themselves where none does.</param>
public sealed record Stretch(string Drawn, string Read);

/// <summary>An element of a sheet's structure (ISO 32000-1, 14.7): heading, paragraph, table, row, cell, formula.</summary>
/// <param name="Type">Its type, such as P, Table, TR, TH, TD, Formula.</param>
/// <param name="Stretches">What of it stands on pages, in order.</param>
/// <param name="Parts">Elements in it.</param>
public sealed record SheetPart(string Type, IReadOnlyList<Stretch> Stretches, IReadOnlyList<SheetPart> Parts)
{
    /// <summary>Its text in one line.</summary>
    public string Text => string.Join(' ', Stretches.Select(s => s.Read.Trim()).Concat(Parts.Select(p => p.Text)).Where(t => t.Length > 0));
}
