using System.Buffers.Binary;
using System.Text;
using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Writing;

/// <summary>
/// A TrueType file with the outlines of the used characters alone: glyph 0 for a missing one, then one for each character in order, then
/// the parts that composite glyphs are made of. Tables by ISO/IEC 14496-22.
/// </summary>
internal sealed class GlyphProgram
{
    private const int PartsAreWords = 1, HasScale = 8, MoreParts = 0x20, HasTwoScales = 0x40, HasMatrix = 0x80;
    private readonly Face _face;
    private readonly List<int> _glyphs = [0];
    private readonly List<byte[]> _outlines = [];

    public GlyphProgram(Face face, IEnumerable<int> characters)
    {
        _face = face;
        _glyphs.AddRange(characters.Select(face.GlyphOf));
        CollectOutlines();
        var head = face.Table("head");
        Box = [S16(head, 36), S16(head, 38), S16(head, 40), S16(head, 42)];
        var os2 = face.Table("OS/2");
        CapitalHeight = U16(os2, 0) >= 2 ? S16(os2, 88) : (int)(0.7 * face.UnitsPerEm);
        Bytes = Assemble();
    }

    public byte[] Bytes { get; }

    /// <summary>The box round all glyphs of the whole face, in the face's units.</summary>
    public IReadOnlyList<int> Box { get; }

    public int CapitalHeight { get; }

    private void CollectOutlines()
    {
        Dictionary<int, int> parts = [];
        for (var i = 0; i < _glyphs.Count; i++)
        {
            var outline = Outline(_glyphs[i]);
            if (outline.Length > 10 && S16(outline, 0) < 0) Renumber(outline, parts);
            _outlines.Add(outline);
        }
    }

    private byte[] Outline(int glyph)
    {
        var places = _face.Table("loca");
        var (start, end) = U16(_face.Table("head"), 50) == 0
            ? (2 * U16(places, 2 * glyph), 2 * U16(places, (2 * glyph) + 2))
            : ((int)U32(places, 4 * glyph), (int)U32(places, (4 * glyph) + 4));
        return _face.Table("glyf")[start..end].ToArray();
    }

    // Parts of a composite glyph get new numbers behind all others.
    private void Renumber(byte[] outline, Dictionary<int, int> parts)
    {
        int at = 10, flags;
        do
        {
            flags = U16(outline, at);
            var part = U16(outline, at + 2);
            if (!parts.TryGetValue(part, out var number))
            {
                number = parts[part] = _glyphs.Count;
                _glyphs.Add(part);
            }
            Put16(outline, at + 2, number);
            at += 4 + ((flags & PartsAreWords) != 0 ? 4 : 2)
                + ((flags & HasScale) != 0 ? 2 : (flags & HasTwoScales) != 0 ? 4 : (flags & HasMatrix) != 0 ? 8 : 0);
        }
        while ((flags & MoreParts) != 0);
    }

    private byte[] Assemble()
    {
        var count = _glyphs.Count;
        var metrics = new byte[4 * count];
        var places = new byte[4 * (count + 1)];
        using var outlines = new MemoryStream();
        for (var i = 0; i < count; i++)
        {
            Put16(metrics, 4 * i, _face.WidthOfGlyph(_glyphs[i]));
            Put16(metrics, (4 * i) + 2, SideBearing(_glyphs[i]));
            Put32(places, 4 * i, (uint)outlines.Length);
            outlines.Write(_outlines[i]);
            Pad(outlines);
        }
        Put32(places, 4 * count, (uint)outlines.Length);
        var head = _face.Table("head").ToArray();
        Put32(head, 8, 0);
        Put16(head, 50, 1);
        var horizontal = _face.Table("hhea").ToArray();
        Put16(horizontal, 34, count);
        var profile = _face.Table("maxp").ToArray();
        Put16(profile, 4, count);
        var tables = new SortedDictionary<string, byte[]>(StringComparer.Ordinal)
        {
            ["glyf"] = outlines.ToArray(),
            ["head"] = head,
            ["hhea"] = horizontal,
            ["hmtx"] = metrics,
            ["loca"] = places,
            ["maxp"] = profile,
        };
        foreach (var hinting in new[] { "cvt ", "fpgm", "prep" })
        {
            if (!_face.Table(hinting).IsEmpty) tables[hinting] = _face.Table(hinting).ToArray();
        }
        return WithDirectory(tables);
    }

    private int SideBearing(int glyph)
    {
        var metrics = _face.Table("hmtx");
        return glyph < _face.WidthCount ? U16(metrics, (4 * glyph) + 2) : U16(metrics, (4 * _face.WidthCount) + (2 * (glyph - _face.WidthCount)));
    }

    private static byte[] WithDirectory(SortedDictionary<string, byte[]> tables)
    {
        var power = (int)Math.Log2(tables.Count);
        var directory = new byte[12 + (16 * tables.Count)];
        Put32(directory, 0, 0x00010000);
        Put16(directory, 4, tables.Count);
        Put16(directory, 6, 16 << power);
        Put16(directory, 8, power);
        Put16(directory, 10, (16 * tables.Count) - (16 << power));
        using var body = new MemoryStream();
        int entry = 12, head = 0;
        foreach (var (tag, table) in tables)
        {
            var at = directory.Length + (int)body.Length;
            if (tag == "head") head = at;
            Encoding.ASCII.GetBytes(tag).CopyTo(directory, entry);
            Put32(directory, entry + 4, Sum(table));
            Put32(directory, entry + 8, (uint)at);
            Put32(directory, entry + 12, (uint)table.Length);
            entry += 16;
            body.Write(table);
            Pad(body);
        }
        byte[] file = [.. directory, .. body.ToArray()];
        // The constant by which the sum over the whole file comes out right (OpenType, table head).
        Put32(file, head + 8, unchecked(0xB1B0AFBA - Sum(file)));
        return file;
    }

    private static void Pad(MemoryStream stream)
    {
        while (stream.Length % 4 != 0) stream.WriteByte(0);
    }

    private static uint Sum(ReadOnlySpan<byte> data)
    {
        var sum = 0u;
        for (var i = 0; i < data.Length; i++) sum = unchecked(sum + ((uint)data[i] << (24 - (8 * (i & 3)))));
        return sum;
    }

    private static int U16(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt16BigEndian(data[at..]);

    private static int S16(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadInt16BigEndian(data[at..]);

    private static uint U32(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt32BigEndian(data[at..]);

    private static void Put16(byte[] data, int at, int value) => BinaryPrimitives.WriteUInt16BigEndian(data.AsSpan(at), (ushort)(value & 0xFFFF));

    private static void Put32(byte[] data, int at, uint value) => BinaryPrimitives.WriteUInt32BigEndian(data.AsSpan(at), value);
}
