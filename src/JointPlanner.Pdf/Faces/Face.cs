using System.Buffers.Binary;

namespace JointPlanner.Pdf.Faces;

/// <summary>
/// A TrueType face as far as a sheet needs it: which characters it has, how wide they are, and its tables for embedding. Never changes
/// once read, so any number of threads may share it. Layout of the tables: ISO/IEC 14496-22 (OpenType).
/// </summary>
internal sealed class Face
{
    private readonly byte[] _data;
    private readonly Dictionary<string, (int Start, int Length)> _tables = new(StringComparer.Ordinal);
    private readonly Dictionary<int, int> _glyphs;
    private readonly int[] _glyphWidths;
    private readonly double[] _commonWidths;

    public Face(string postScriptName, byte[] data)
    {
        (PostScriptName, _data) = (postScriptName, data);
        for (var i = 0; i < U16(data, 4); i++)
        {
            var entry = 12 + (16 * i);
            _tables[System.Text.Encoding.ASCII.GetString(data, entry, 4)] = ((int)U32(data, entry + 8), (int)U32(data, entry + 12));
        }
        UnitsPerEm = U16(Table("head"), 18);
        GlyphCount = U16(Table("maxp"), 4);
        WidthCount = U16(Table("hhea"), 34);
        Ascent = (double)S16(Table("hhea"), 4) / UnitsPerEm;
        Descent = (double)-S16(Table("hhea"), 6) / UnitsPerEm;
        ItalicAngle = S16(Table("post"), 4);
        _glyphs = CharacterMap.Read(Table("cmap"));
        _glyphWidths = new int[GlyphCount];
        var metrics = Table("hmtx");
        for (var g = 0; g < GlyphCount; g++) _glyphWidths[g] = U16(metrics, 4 * Math.Min(g, WidthCount - 1));
        // Nearly every letter of a sheet is asked for here; a table is many times faster than the map.
        _commonWidths = new double[0x250];
        for (var c = 0; c < _commonWidths.Length; c++) _commonWidths[c] = _glyphs.TryGetValue(c, out var g) ? (double)_glyphWidths[g] / UnitsPerEm : double.NaN;
    }

    public string PostScriptName { get; }

    public int UnitsPerEm { get; }

    public int GlyphCount { get; }

    /// <summary>How many glyphs have a width of their own; the rest share the last one.</summary>
    public int WidthCount { get; }

    /// <summary>Height above the baseline as a share of the type size.</summary>
    public double Ascent { get; }

    /// <summary>Depth below the baseline as a share of the type size, above zero.</summary>
    public double Descent { get; }

    /// <summary>Whole degrees, below zero for letters that lean to the right.</summary>
    public int ItalicAngle { get; }

    public bool Has(int character) => character < _commonWidths.Length
        ? !double.IsNaN(_commonWidths[character])
        : _glyphs.ContainsKey(character);

    /// <summary>The glyph of a character; 0, the "missing" glyph, when the face has none.</summary>
    public int GlyphOf(int character) => _glyphs.GetValueOrDefault(character);

    /// <summary>Width of a character as a share of the type size.</summary>
    public double WidthOf(int character) => character < _commonWidths.Length && _commonWidths[character] is var common && !double.IsNaN(common)
        ? common
        : (double)_glyphWidths[GlyphOf(character)] / UnitsPerEm;

    /// <summary>Width of a glyph in the face's own units.</summary>
    public int WidthOfGlyph(int glyph) => _glyphWidths[glyph];

    /// <summary>The bytes of a table; empty when the face has none of that name.</summary>
    public ReadOnlySpan<byte> Table(string tag) => _tables.TryGetValue(tag, out var at) ? _data.AsSpan(at.Start, at.Length) : default;

    private static int U16(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt16BigEndian(data[at..]);

    private static int S16(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadInt16BigEndian(data[at..]);

    private static uint U32(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt32BigEndian(data[at..]);
}
