using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Turns words into pieces. Remembers the characters that had to be spelt out; one setter serves one document.</summary>
internal sealed class TextSetter(TypeSet faces)
{
    private readonly SortedSet<int> _missing = [];

    public IReadOnlyList<int> Missing => [.. _missing];

    public string Settable(string text) => faces.Settable(text, _missing);

    public double Width(string settable, TextLook look) => faces.Width(settable, look.Style, look.Size);

    /// <summary>One line of letters.</summary>
    public TextPiece Text(string text, TextLook look) => Letters(Settable(text), look);

    /// <summary>Letters that are known to be settable.</summary>
    public TextPiece Letters(string settable, TextLook look) => new(faces, settable, look.Style, look.Size, look.Grey);

    /// <summary>A formula in type, copied and searched in its line form.</summary>
    public Piece Formula(MathNode node, TextLook look) => new ReadingPiece(new MathSetter(this).Set(node, look), Settable(node.Linear));

    /// <summary>The words broken into lines no wider than asked, at least one.</summary>
    public List<Piece> Lines(Words words, double width, TextLook look) => new LineBreaker(this, width, look).Break(words);

    /// <summary>The words in one line.</summary>
    public Piece OneLine(Words words, TextLook look) => Lines(words, double.PositiveInfinity, look)[0];

    /// <summary>One line cut to a width with an ellipsis.</summary>
    public TextPiece Fitted(string text, double width, TextLook look)
    {
        var settable = Settable(text);
        if (Width(settable, look) <= width) return Letters(settable, look);
        var runes = settable.EnumerateRunes().ToList();
        var kept = runes.Count;
        while (kept > 0 && Width(string.Concat(runes.Take(kept)) + "…", look) > width) kept--;
        return Letters(string.Concat(runes.Take(kept)).TrimEnd() + "…", look);
    }
}
