using System.Buffers.Binary;

namespace JointPlanner.Pdf.Faces;

/// <summary>Reads a face's <c>cmap</c> table: from character to glyph, in the formats 12 and 4 that our faces have.</summary>
internal static class CharacterMap
{
    public static Dictionary<int, int> Read(ReadOnlySpan<byte> cmap)
    {
        int best = -1, rank = 0;
        for (var i = 0; i < U16(cmap, 2); i++)
        {
            int entry = 4 + (8 * i), platform = U16(cmap, entry), encoding = U16(cmap, entry + 2), at = (int)U32(cmap, entry + 4);
            var value = (U16(cmap, at), platform, encoding) switch
            {
                (12, _, _) => 2,
                (4, 3, 1) or (4, 0, _) => 1,
                _ => 0,
            };
            if (value > rank) (best, rank) = (at, value);
        }
        if (best < 0) throw new InvalidDataException("The face has no Unicode character map of format 4 or 12.");
        return rank == 2 ? Ranges(cmap[best..]) : Segments(cmap[best..]);
    }

    private static Dictionary<int, int> Ranges(ReadOnlySpan<byte> map)
    {
        Dictionary<int, int> glyphs = [];
        for (var i = 0; i < (int)U32(map, 12); i++)
        {
            int at = 16 + (12 * i), first = (int)U32(map, at), last = (int)U32(map, at + 4), glyph = (int)U32(map, at + 8);
            for (var c = first; c <= last; c++) glyphs[c] = glyph + c - first;
        }
        return glyphs;
    }

    private static Dictionary<int, int> Segments(ReadOnlySpan<byte> map)
    {
        Dictionary<int, int> glyphs = [];
        int bytes = U16(map, 6), ends = 14, starts = ends + bytes + 2, deltas = starts + bytes, offsets = deltas + bytes;
        for (var s = 0; s < bytes; s += 2)
        {
            int first = U16(map, starts + s), last = U16(map, ends + s), delta = U16(map, deltas + s), offset = U16(map, offsets + s);
            for (var c = first; c <= last && c != 0xFFFF; c++)
            {
                var glyph = offset == 0 ? c : U16(map, offsets + s + offset + (2 * (c - first)));
                if (offset == 0 || glyph != 0) glyph = (glyph + delta) & 0xFFFF;
                if (glyph != 0) glyphs[c] = glyph;
            }
        }
        return glyphs;
    }

    private static int U16(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt16BigEndian(data[at..]);

    private static uint U32(ReadOnlySpan<byte> data, int at) => BinaryPrimitives.ReadUInt32BigEndian(data[at..]);
}
