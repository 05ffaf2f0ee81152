using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Layout;

/// <summary>Sets formulas.</summary>
internal sealed class MathSetter(TextSetter setter)
{
    private const double ScriptShare = 0.72, SmallestScript = 5.4;

    public Piece Set(MathNode node, TextLook look) => node switch
    {
        MathText text => Letters(text, look),
        MathRow row => new RowPiece([.. row.Parts.Select(p => (Set(p, look), 0.0))]),
        Fraction fraction => new FractionPiece(Set(fraction.Top, Smaller(look, 0.94)), Set(fraction.Bottom, Smaller(look, 0.94)), look.Size, look.Grey),
        // The power of an indexed symbol stands over its index, not behind it.
        Script { Sub: null, Super: { } power, Base: Script { Super: null } indexed } => Set(indexed with { Super = power }, look),
        Script script => new ScriptPiece(
            Set(script.Base, look),
            script.Sub is null ? null : Set(script.Sub, Smaller(look, ScriptShare)),
            script.Super is null ? null : Set(script.Super, Smaller(look, ScriptShare)),
            look.Size),
        Root root => new RootPiece(Set(root.Inner, look), look.Size, look.Grey),
        Parentheses brackets => Bracketed(Set(brackets.Inner, look), look),
        _ => throw new InvalidOperationException($"The sheet cannot set a formula part of the kind {node.GetType().Name}."),
    };

    /// <summary>
    /// The formula in lines no wider than asked. Breaks before operators, first those of the formula itself, then those within brackets;
    /// what has no operator to break at is set smaller.
    /// </summary>
    public List<(Piece Piece, string Text)> Lines(MathNode node, double width, TextLook look)
    {
        var parts = Flat(node, look, width).ToList();
        List<(Piece, string)> lines = [];
        List<MathNode> line = [];
        double used = 0;
        foreach (var part in parts)
        {
            var partWidth = Set(part, look).Width;
            if (line.Count > 0 && used + partWidth > width && BreakIn(line) is var at and > 0)
            {
                var rest = line.Skip(at).ToList();
                line.RemoveRange(at, line.Count - at);
                Flush();
                line.AddRange(rest);
                used = rest.Sum(p => Set(p, look).Width);
            }
            line.Add(part);
            used += partWidth;
        }
        Flush();
        return lines;

        void Flush()
        {
            var row = new MathRow([.. line]);
            var piece = Set(row, look);
            var fitting = look;
            while (piece.Width > width && fitting.Size > 4)
            {
                fitting = fitting with { Size = Math.Max(4, fitting.Size * 0.93) };
                piece = Set(row, fitting);
            }
            lines.Add((piece, row.Linear));
            line.Clear();
            used = 0;
        }
    }

    // A break stands before an operator, so that the new line says how it goes on; a sum breaks between its terms rather than within one.
    private static int BreakIn(List<MathNode> line)
    {
        var between = line.FindLastIndex(p => p is MathText { Kind: MathKind.Operator } sign && !Multiplies(sign.Text));
        return between > 0 ? between : line.FindLastIndex(p => p is MathText { Kind: MathKind.Operator });
    }

    private static bool Multiplies(string sign) => sign is "·" or "×" or "/" or "∕" or "÷";

    private IEnumerable<MathNode> Flat(MathNode node, TextLook look, double width) => node switch
    {
        MathRow row => row.Parts.SelectMany(p => Flat(p, look, width)),
        Parentheses brackets when Set(brackets, look).Width > width =>
            [MathNode.Upright("("), .. Flat(brackets.Inner, look, width), MathNode.Upright(")")],
        _ => [node],
    };

    private Piece Letters(MathText text, TextLook look)
    {
        var style = text.Kind switch
        {
            MathKind.Variable when look.Style != FaceStyle.Strong => FaceStyle.Italic,
            MathKind.Strong => FaceStyle.Strong,
            _ => look.Style,
        };
        var letters = setter.Text(text.Text, look with { Style = style });
        if (text.Kind != MathKind.Operator) return letters;
        // Multiplication binds tighter than addition and relations, and looks so.
        var space = look.Size * (Multiplies(text.Text) ? 0.14 : 0.24);
        return new RowPiece([(letters, space)], space);
    }

    private Piece Bracketed(Piece inner, TextLook look) => inner.Ascent + inner.Descent > 1.45 * look.Size
        ? new BracketPiece(inner, look.Size, look.Grey)
        : new RowPiece([(setter.Letters("(", look), 0), (inner, 0), (setter.Letters(")", look), 0)]);

    private static TextLook Smaller(TextLook look, double share) => look with { Size = Math.Max(Math.Min(SmallestScript, look.Size), look.Size * share) };
}
