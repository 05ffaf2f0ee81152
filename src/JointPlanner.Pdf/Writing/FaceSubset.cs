using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using JointPlanner.Pdf.Faces;

namespace JointPlanner.Pdf.Writing;

/// <summary>
/// The characters of one face that a file uses. Every character has a code of its own, in order of first use, even where two share a glyph
/// (Δ the letter and ∆ the increment): copied text is then what was written.
/// </summary>
internal sealed class FaceSubset(Face face, string name)
{
    private readonly Dictionary<int, int> _codes = [];
    private readonly List<int> _characters = [];

    /// <summary>What content streams call the font.</summary>
    public string Name { get; } = name;

    /// <summary>Text as the hexadecimal string of a show operator.</summary>
    public string Encode(string text)
    {
        var codes = new StringBuilder("<", (4 * text.Length) + 2);
        foreach (var rune in text.EnumerateRunes())
        {
            if (!_codes.TryGetValue(rune.Value, out var code))
            {
                _characters.Add(rune.Value);
                _codes[rune.Value] = code = _characters.Count;
            }
            codes.Append(code.ToString("X4", CultureInfo.InvariantCulture));
        }
        return codes.Append('>').ToString();
    }

    /// <summary>Writes the font with its glyphs, widths and way back to Unicode (ISO 32000-1, 9.7 and 9.10.3); gives its object's number.</summary>
    public int Write(INewObjects file)
    {
        var glyphs = new GlyphProgram(face, _characters);
        var tag = new string([.. SHA256.HashData(glyphs.Bytes).Take(6).Select(b => (char)('A' + (b % 26)))]);
        var fontName = tag + "+" + face.PostScriptName;
        double Em(int units) => units * 1000.0 / face.UnitsPerEm;
        var program = file.AddStream(new PdfDictionary().Number("Length1", glyphs.Bytes.Length), glyphs.Bytes);
        var descriptor = file.Add(new PdfDictionary("FontDescriptor").Name("FontName", fontName)
            .Number("Flags", face.ItalicAngle == 0 ? 4 : 4 + 64)
            .Numbers("FontBBox", glyphs.Box.Select(Em))
            .Number("ItalicAngle", face.ItalicAngle)
            .Number("Ascent", face.Ascent * 1000).Number("Descent", -face.Descent * 1000)
            .Number("CapHeight", Em(glyphs.CapitalHeight)).Number("StemV", 80)
            .Reference("FontFile2", program));
        var descendant = file.Add(new PdfDictionary("Font").Name("Subtype", "CIDFontType2").Name("BaseFont", fontName)
            .Dictionary("CIDSystemInfo", new PdfDictionary().Text("Registry", "Adobe").Text("Ordering", "Identity").Number("Supplement", 0))
            .Reference("FontDescriptor", descriptor)
            .Number("DW", Em(face.WidthOfGlyph(0)))
            .Raw("W", "[1[" + string.Join(' ', _characters.Select(c => Syntax.Number(Em(face.WidthOfGlyph(face.GlyphOf(c)))))) + "]]")
            .Name("CIDToGIDMap", "Identity"));
        var unicode = file.AddStream(new PdfDictionary(), Encoding.ASCII.GetBytes(UnicodeMap()));
        return file.Add(new PdfDictionary("Font").Name("Subtype", "Type0").Name("BaseFont", fontName).Name("Encoding", "Identity-H")
            .References("DescendantFonts", [descendant]).Reference("ToUnicode", unicode));
    }

    private string UnicodeMap()
    {
        var map = new StringBuilder("""
            /CIDInit /ProcSet findresource begin
            12 dict begin
            begincmap
            /CIDSystemInfo <</Registry (Adobe) /Ordering (UCS) /Supplement 0>> def
            /CMapName /Adobe-Identity-UCS def
            /CMapType 2 def
            1 begincodespacerange
            <0000> <FFFF>
            endcodespacerange

            """.ReplaceLineEndings("\n"));
        var lines = _characters.Select((c, i) =>
            "<" + (i + 1).ToString("X4", CultureInfo.InvariantCulture) + "> <" + Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(char.ConvertFromUtf32(c))) + ">\n");
        foreach (var part in lines.Chunk(100))
            map.Append(Syntax.Number(part.Length)).Append(" beginbfchar\n").AppendJoin("", part).Append("endbfchar\n");
        return map.Append("endcmap\nCMapName currentdict /CMap defineresource pop\nend\nend\n").ToString();
    }
}
