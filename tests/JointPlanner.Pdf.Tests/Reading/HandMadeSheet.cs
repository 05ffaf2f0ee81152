using System.Globalization;
using System.IO.Compression;
using System.Text;

namespace JointPlanner.Pdf.Tests.Reading;

/// <summary>A small PDF made by hand in the form of a sheet: a page, two empty signature fields, two attachments. Independent of the program's own writer.</summary>
internal sealed class HandMadeSheet
{
    public const string CalculationText = """{"schema":"sample"}""";
    public const string ResultsText = """{"opening":"12.5 mm"}""";

    /// <summary>Catalog 1, pages 2, page 3, form 4, designer 5, checker 6, information 7; the rest may be packed.</summary>
    private readonly SortedDictionary<int, byte[]> _objects = [];

    private HandMadeSheet()
    {
    }

    public static byte[] WithTable() => Make().Table();

    public static byte[] WithStream() => Make().Stream();

    public static byte[] WithoutFields()
    {
        var sheet = Make();
        sheet.Set(1, "<</Type/Catalog/Pages 2 0 R/Names<</EmbeddedFiles<</Names[(calculation.json)11 0 R(results.json)12 0 R]>>>>>>");
        sheet.Set(3, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]/Contents 8 0 R/Resources<</Font<</F 9 0 R>>>>>>");
        foreach (int number in new[] { 4, 5, 6, 10 }) sheet._objects.Remove(number);
        return sheet.Table();
    }

    public static byte[] WithoutAttachments()
    {
        var sheet = Make();
        sheet.Set(1, "<</Type/Catalog/Pages 2 0 R/AcroForm 4 0 R>>");
        return sheet.Table();
    }

    /// <summary>Flags not yet set, and the form inside the catalog.</summary>
    public static byte[] WithFormInCatalog()
    {
        var sheet = Make();
        sheet.Set(1, "<</Type/Catalog/Pages 2 0 R/AcroForm<</Fields[5 0 R 6 0 R]>>/Names<</EmbeddedFiles<</Names[(calculation.json)11 0 R(results.json)12 0 R]>>>>>>");
        sheet._objects.Remove(4);
        return sheet.Table();
    }

    private static HandMadeSheet Make()
    {
        var sheet = new HandMadeSheet();
        sheet.Set(1, "<</Type/Catalog/Pages 2 0 R/AcroForm 4 0 R/Names<</EmbeddedFiles<</Names[(calculation.json)11 0 R(results.json)12 0 R]>>>>>>");
        sheet.Set(2, "<</Type/Pages/Count 1/Kids[3 0 R]>>");
        sheet.Set(3, "<</Type/Page/Parent 2 0 R/MediaBox[0 0 595 842]/Contents 8 0 R/Resources<</Font<</F 9 0 R>>>>/Annots[5 0 R 6 0 R]>>");
        sheet.Set(4, "<</Fields[5 0 R 6 0 R]/SigFlags 3>>");
        sheet.Set(5, "<</Type/Annot/Subtype/Widget/FT/Sig/T(designer)/F 4/P 3 0 R/Rect[50 50 250 110.5]/AP<</N 10 0 R>>>>");
        sheet.Set(6, "<</Type/Annot/Subtype/Widget/FT/Sig/T(checker)/F 4/P 3 0 R/Rect[300 50 500 110.5]/AP<</N 10 0 R>>>>");
        sheet.Set(7, "<</Title(Sample)/Producer(Test)>>");
        sheet.SetStream(8, "", "BT /F 12 Tf 50 780 Td (Opening 12.5 mm) Tj ET"u8);
        sheet.Set(9, "<</Type/Font/Subtype/Type1/BaseFont/Helvetica>>");
        sheet.SetStream(10, "/Type/XObject/Subtype/Form/BBox[0 0 1 1]", " "u8);
        sheet.Set(11, "<</Type/Filespec/F(calculation.json)/UF(calculation.json)/AFRelationship/Source/EF<</F 13 0 R/UF 13 0 R>>>>");
        sheet.Set(12, "<</Type/Filespec/F(results.json)/UF(results.json)/AFRelationship/Data/EF<</F 14 0 R/UF 14 0 R>>>>");
        sheet.SetStream(13, "/Type/EmbeddedFile", Encoding.UTF8.GetBytes(CalculationText));
        sheet.SetStream(14, "/Type/EmbeddedFile", Encoding.UTF8.GetBytes(ResultsText));
        return sheet;
    }

    private void Set(int number, string body) => _objects[number] = Encoding.Latin1.GetBytes(body);

    private void SetStream(int number, string entries, ReadOnlySpan<byte> data)
    {
        var packed = Pack(data);
        _objects[number] = [.. Latin($"<<{entries}/Filter/FlateDecode/Length {packed.Length}>>\nstream\n"), .. packed, .. "\nendstream"u8];
    }

    private byte[] Table()
    {
        var file = new MemoryStream();
        file.Write("%PDF-1.7\n%\u00e2\u00e3\u00cf\u00d3\n"u8);
        var places = WriteAll(file, _objects.Keys);
        long start = file.Position;
        int size = _objects.Keys.Max() + 1;
        file.Write(Latin($"xref\n0 {size}\n0000000000 65535 f \n"));
        for (int number = 1; number < size; number++) file.Write(places.TryGetValue(number, out long place) ? Latin($"{place:D10} 00000 n \n") : "0000000000 00000 f \n"u8);
        file.Write(Latin($"trailer\n<</Size {size}/Root 1 0 R/Info 7 0 R/ID[<00112233445566778899AABBCCDDEEFF><00112233445566778899AABBCCDDEEFF>]>>\nstartxref\n{start}\n%%EOF\n"));
        return file.ToArray();
    }

    private byte[] Stream()
    {
        var file = new MemoryStream();
        file.Write("%PDF-1.7\n%\u00e2\u00e3\u00cf\u00d3\n"u8);
        int[] packed = [7, 9, 11, 12];
        var head = new StringBuilder();
        var body = new StringBuilder();
        foreach (int number in packed)
        {
            head.Append(CultureInfo.InvariantCulture, $"{number} {body.Length} ");
            body.Append(Encoding.Latin1.GetString(_objects[number])).Append('\n');
        }
        SetStream(15, $"/Type/ObjStm/N {packed.Length}/First {head.Length}", Encoding.Latin1.GetBytes(head.ToString() + body));
        var places = WriteAll(file, _objects.Keys.Except(packed));
        long start = file.Position;
        var rows = new List<byte>();
        for (int number = 0; number <= 16; number++)
        {
            var (kind, place, detail) = number == 0 ? (0, 0L, 0) : number == 16 ? (1, start, 0) : packed.Contains(number) ? (2, 15L, Array.IndexOf(packed, number)) : (1, places[number], 0);
            rows.AddRange([(byte)kind, (byte)(place >> 8), (byte)(place & 255), (byte)detail]);
        }
        var data = Pack([.. rows]);
        file.Write(Latin($"16 0 obj\n<</Type/XRef/Size 17/W[1 2 1]/Root 1 0 R/Info 7 0 R/ID[<00112233445566778899AABBCCDDEEFF><00112233445566778899AABBCCDDEEFF>]/Filter/FlateDecode/Length {data.Length}>>\nstream\n"));
        file.Write(data);
        file.Write(Latin($"\nendstream\nendobj\nstartxref\n{start}\n%%EOF\n"));
        return file.ToArray();
    }

    private Dictionary<int, long> WriteAll(MemoryStream file, IEnumerable<int> numbers)
    {
        var places = new Dictionary<int, long>();
        foreach (int number in numbers)
        {
            places[number] = file.Position;
            file.Write(Latin($"{number} 0 obj\n"));
            file.Write(_objects[number]);
            file.Write("\nendobj\n"u8);
        }
        return places;
    }

    private static byte[] Pack(ReadOnlySpan<byte> data)
    {
        var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal, leaveOpen: true)) zlib.Write(data);
        return packed.ToArray();
    }

    private static byte[] Latin(FormattableString text) => Encoding.Latin1.GetBytes(text.ToString(CultureInfo.InvariantCulture));
}
