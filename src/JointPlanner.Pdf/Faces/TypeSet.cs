using System.Text;

namespace JointPlanner.Pdf.Faces;

/// <summary>
/// The faces of a sheet: three cuts of the text face and, for characters that it lacks, a fallback of wide coverage. A character that
/// neither has is spelt out by its code point, such as <c>[U+4E00]</c>, and so are the scripts that are written from right to left: the
/// sheet sets no such lines, and a name in the wrong order would be worse than one spelt out.
/// </summary>
internal sealed class TypeSet
{
    private readonly Face _regular = Load("IBMPlexSans-Regular", "IBMPlexSans");
    private readonly Face _strong = Load("IBMPlexSans-SemiBold", "IBMPlexSans-SemiBold");
    private readonly Face _italic = Load("IBMPlexSans-Italic", "IBMPlexSans-Italic");
    private readonly Face _fallback = Load("DejaVuSans", "DejaVuSans");
    private readonly Face _strongFallback = Load("DejaVuSans-Bold", "DejaVuSans-Bold");

    private TypeSet()
    {
    }

    /// <summary>The one set, read once from the program's own resources.</summary>
    public static TypeSet Standard { get; } = new();

    /// <summary>The text with every character that cannot be set spelt out, and a list of those characters.</summary>
    public string Settable(string text, ISet<int> missing)
    {
        var plain = Pictures.PlainCharacters.Of(text);
        StringBuilder? spelt = null;
        var at = 0;
        foreach (var rune in plain.EnumerateRunes())
        {
            if (CanSet(rune.Value)) spelt?.Append(rune);
            else
            {
                spelt ??= new StringBuilder(plain, 0, at, plain.Length + 8);
                spelt.Append(Pictures.PlainCharacters.Spell(rune.Value));
                missing.Add(rune.Value);
            }
            at += rune.Utf16SequenceLength;
        }
        return spelt?.ToString() ?? plain;
    }

    /// <summary>Splits a text into stretches of one face each.</summary>
    public List<FaceRun> Split(string text, FaceStyle style)
    {
        List<FaceRun> runs = [];
        Face? current = null;
        int start = 0, at = 0;
        double width = 0;
        foreach (var rune in text.EnumerateRunes())
        {
            var face = FaceFor(rune.Value, style);
            if (current is not null && face != current)
            {
                runs.Add(new(current, text[start..at], width));
                (start, width) = (at, 0);
            }
            current = face;
            width += face.WidthOf(rune.Value);
            at += rune.Utf16SequenceLength;
        }
        if (current is not null) runs.Add(new(current, text[start..], width));
        return runs;
    }

    /// <summary>The width of a text in points at a type size in points.</summary>
    public double Width(string text, FaceStyle style, double size)
    {
        double width = 0;
        foreach (var rune in text.EnumerateRunes()) width += FaceFor(rune.Value, style).WidthOf(rune.Value);
        return width * size;
    }

    private bool CanSet(int character) => (_regular.Has(character) || _fallback.Has(character)) && !IsRightToLeft(character);

    // Hebrew, Arabic, Syriac, Thaana, NKo, Samaritan, Mandaic; their presentation forms; the right-to-left planes beyond.
    private static bool IsRightToLeft(int c) => c is (>= 0x0590 and <= 0x08FF) or (>= 0xFB1D and <= 0xFDFF) or (>= 0xFE70 and <= 0xFEFE)
        or (>= 0x10800 and <= 0x10FFF) or (>= 0x1E800 and <= 0x1EFFF);

    private Face FaceFor(int character, FaceStyle style)
    {
        var (first, second) = style switch
        {
            FaceStyle.Regular => (_regular, _fallback),
            FaceStyle.Strong => (_strong, _strongFallback),
            FaceStyle.Italic => (_italic, _fallback),
            _ => throw new InvalidOperationException($"There is no face style {style}."),
        };
        if (first.Has(character)) return first;
        if (second.Has(character)) return second;
        return _fallback.Has(character) ? _fallback : _regular;
    }

    private static Face Load(string file, string postScriptName)
    {
        using var stream = typeof(TypeSet).Assembly.GetManifestResourceStream(file + ".ttf")
            ?? throw new InvalidOperationException($"The face {file}.ttf is missing from the program.");
        var data = new byte[stream.Length];
        stream.ReadExactly(data);
        return new(postScriptName, data);
    }
}
