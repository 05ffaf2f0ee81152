using System.Text;

namespace JointPlanner.Pdf.Layout;

/// <summary>Breaks words into lines: at spaces, after hyphens and slashes, and anywhere in a word that is wider than the line (a hash).</summary>
internal sealed class LineBreaker(TextSetter setter, double width, TextLook look)
{
    // A column as wide as its widest number comes out of additions a hair narrower; the number is not cut for that.
    private const double Hair = 1e-6;

    private readonly double _room = width + Hair;
    private readonly List<Piece> _lines = [];
    private readonly List<(Piece Piece, double SpaceBefore)> _line = [];
    private readonly StringBuilder _letters = new();
    private TextLook _lettersLook;
    private double _used;
    private bool _spaceWaits;

    public List<Piece> Break(Words words)
    {
        foreach (var run in words.Runs)
        {
            switch (run)
            {
                case TextRun text:
                    Put(text);
                    break;
                case MathRun math:
                    var piece = setter.Formula(math.Formula, look);
                    MakeRoom(piece.Width);
                    PutSpace(look);
                    FlushLetters();
                    _line.Add((piece, 0));
                    _used += piece.Width;
                    break;
                default:
                    throw new InvalidOperationException($"The sheet cannot set words of the kind {run.GetType().Name}.");
            }
        }
        if (_lines.Count == 0 || _line.Count > 0 || _letters.Length > 0) EndLine();
        return _lines;
    }

    private void Put(TextRun run)
    {
        var runLook = look.With(run.Emphasis);
        var paragraphs = run.Text.ReplaceLineEndings("\n").Split('\n');
        for (var i = 0; i < paragraphs.Length; i++)
        {
            if (i > 0) EndLine();
            var words = setter.Settable(paragraphs[i]).Split(' ');
            for (var k = 0; k < words.Length; k++)
            {
                if (k > 0) _spaceWaits = true;
                foreach (var part in Parts(words[k])) PutPart(part, runLook);
            }
        }
    }

    private void PutPart(string part, TextLook partLook)
    {
        var partWidth = setter.Width(part, partLook);
        MakeRoom(partWidth);
        PutSpace(partLook);
        while (partWidth > _room - _used && part.Length > 1)
        {
            var fits = Fitting(part, partLook);
            PutLetters(part[..fits], partLook);
            EndLine();
            part = part[fits..];
            partWidth = setter.Width(part, partLook);
        }
        PutLetters(part, partLook);
    }

    // Ends the line when the next part does not fit on it but would fit on one of its own, or at least begin there.
    private void MakeRoom(double partWidth)
    {
        var space = _spaceWaits ? setter.Width(" ", look) : 0;
        if (_used > 0 && _used + space + partWidth > _room) EndLine();
    }

    private void PutSpace(TextLook spaceLook)
    {
        if (_spaceWaits && _used > 0) PutLetters(" ", spaceLook);
        _spaceWaits = false;
    }

    private void PutLetters(string letters, TextLook lettersLook)
    {
        if (lettersLook != _lettersLook) FlushLetters();
        _lettersLook = lettersLook;
        _letters.Append(letters);
        _used += setter.Width(letters, lettersLook);
    }

    private void FlushLetters()
    {
        if (_letters.Length == 0) return;
        _line.Add((setter.Letters(_letters.ToString(), _lettersLook), 0));
        _letters.Clear();
    }

    private void EndLine()
    {
        FlushLetters();
        _lines.Add(new RowPiece([.. _line]));
        _line.Clear();
        (_used, _spaceWaits) = (0, false);
    }

    private int Fitting(string part, TextLook partLook)
    {
        var fits = 0;
        double total = 0;
        foreach (var rune in part.EnumerateRunes())
        {
            total += setter.Width(rune.ToString(), partLook);
            if (total > _room - _used && fits > 0) break;
            fits += rune.Utf16SequenceLength;
        }
        return fits;
    }

    private static IEnumerable<string> Parts(string word)
    {
        var start = 0;
        for (var i = 1; i < word.Length - 1; i++)
        {
            if (word[i] is not ('-' or '/' or '–' or '—') || !char.IsLetter(word[i + 1]) || !char.IsLetterOrDigit(word[i - 1])) continue;
            yield return word[start..(i + 1)];
            start = i + 1;
        }
        yield return word[start..];
    }
}
