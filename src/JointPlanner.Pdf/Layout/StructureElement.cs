namespace JointPlanner.Pdf.Layout;

/// <summary>An element of the document's logical structure, in reading order whatever the page; what is painted is tied to it.</summary>
internal sealed class StructureElement(string type, StructureElement? parent)
{
    private readonly List<object> _kids = [];

    /// <summary>A standard structure type of ISO 32000-1, 14.8.4: H1, P, Table, TR …</summary>
    public string Type { get; } = type;

    public StructureElement? Parent { get; } = parent;

    /// <summary>What to read aloud instead of the painted content.</summary>
    public string? Alternative { get; init; }

    /// <summary>"Row" or "Column" for a cell that names others.</summary>
    public string? Scope { get; init; }

    public int ColumnSpan { get; init; } = 1;

    /// <summary>Elements, <see cref="ContentMark"/>s and <see cref="FieldPlace"/>s in reading order.</summary>
    public IReadOnlyList<object> Kids => _kids;

    /// <summary>The box round a figure or formula on its first page; null until painted.</summary>
    public Bounds? Bounds { get; private set; }

    public StructureElement Child(string type, string? alternative = null, string? scope = null, int columnSpan = 1)
    {
        var child = new StructureElement(type, this) { Alternative = alternative, Scope = scope, ColumnSpan = columnSpan };
        _kids.Add(child);
        return child;
    }

    public void Add(ContentMark mark) => _kids.Add(mark);

    public void Add(FieldPlace field) => _kids.Add(field);

    public void Enclose(Bounds bounds) => Bounds = Bounds is { } known && known.Page == bounds.Page ? known.Around(bounds) : Bounds ?? bounds;
}
