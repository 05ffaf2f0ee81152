using System.Globalization;
using System.IO.Compression;
using System.Security.Cryptography;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Writing;

namespace JointPlanner.Pdf.Signing;

/// <summary>Collects changed and new objects and appends them to a file; not one byte of the file before is touched.</summary>
internal sealed class UpdateWriter : INewObjects
{
    private readonly PdfRevisions _file;
    private readonly SortedDictionary<int, (int Generation, byte[] Body)> _objects = [];
    private int _next;

    public UpdateWriter(PdfRevisions file)
    {
        _file = file;
        // Not the trailer's /Size alone: a number in use, or referred to, must not be given again.
        var view = file.Last;
        int highest = Math.Max(view.Numbers().DefaultIfEmpty(0).Max(), (view.Whole(view.Trailer["Size"]) ?? 1) - 1);
        foreach (int number in view.Numbers())
            foreach (var reference in ReferenceWalk.In(view.Object(number)!.Value)) highest = Math.Max(highest, reference.Number);
        _next = highest + 1;
    }

    public int Reserve() => _next++;

    public void Set(int number, string body, int generation = 0) => _objects[number] = (generation, Encoding.Latin1.GetBytes(body));

    public int Add(string body)
    {
        int number = Reserve();
        Set(number, body);
        return number;
    }

    public int Add(Writing.PdfDictionary content) => Add(content.ToString());

    public int AddStream(Writing.PdfDictionary head, ReadOnlySpan<byte> data, bool compress = true)
    {
        int number = Reserve();
        var content = compress ? Pack(data) : data;
        if (compress) head.Name("Filter", "FlateDecode");
        head.Number("Length", content.Length);
        _objects[number] = (0, [.. Encoding.Latin1.GetBytes(head.ToString()), .. "\nstream\n"u8, .. content, .. "\nendstream"u8]);
        return number;
    }

    /// <summary>The whole new file, and where the body of an object stands in it.</summary>
    public (byte[] File, int BodyStart) Finish(int wanted)
    {
        using var output = new MemoryStream();
        output.Write(_file.File);
        if (_file.File[^1] is not (10 or 13)) output.WriteByte(10);
        var places = new SortedDictionary<int, (int Place, int Generation)>();
        int bodyStart = -1;
        foreach (var (number, (generation, body)) in _objects)
        {
            places[number] = ((int)output.Position, generation);
            Write(output, $"{number} {generation} obj\n");
            if (number == wanted) bodyStart = (int)output.Position;
            output.Write(body);
            output.Write("\nendobj\n"u8);
        }
        if (_file.Last.Revision.IsTable) Table(output, places);
        else Stream(output, places);
        return (output.ToArray(), bodyStart);
    }

    private string Trailer(MemoryStream output)
    {
        var view = _file.Last;
        var text = new StringBuilder();
        foreach (string key in new[] { "Root", "Info" }) if (view.Trailer[key] is { } value) text.Append(CultureInfo.InvariantCulture, $"/{key} {ValueText.Of(value)}");
        // ISO 32000-2, 14.4: the first identifier stays for good, the second is new for each state.
        if (view.Array(view.Trailer["ID"]) is { Items: [PdfText lasting, _] })
            text.Append(CultureInfo.InvariantCulture, $"/ID[{ValueText.Of(lasting)}<{Convert.ToHexString(SHA256.HashData(output.GetBuffer().AsSpan(0, (int)output.Length)).AsSpan(0, 16))}>]");
        return text.Append(CultureInfo.InvariantCulture, $"/Prev {view.Revision.CrossReferenceStart}").ToString();
    }

    private void Table(MemoryStream output, SortedDictionary<int, (int Place, int Generation)> places)
    {
        string trailer = Trailer(output);
        int start = (int)output.Position;
        Write(output, $"xref\n");
        foreach (var (number, (place, generation)) in places) Write(output, $"{number} 1\n{place:D10} {generation:D5} n \n");
        Write(output, $"trailer\n<</Size {_next}{trailer}>>\nstartxref\n{start}\n%%EOF\n");
    }

    private void Stream(MemoryStream output, SortedDictionary<int, (int Place, int Generation)> places)
    {
        string trailer = Trailer(output);
        int self = Reserve(), start = (int)output.Position;
        places[self] = (start, 0);
        var rows = new List<byte>();
        foreach (var (place, generation) in places.Values)
            rows.AddRange([1, (byte)(place >> 24), (byte)((place >> 16) & 255), (byte)((place >> 8) & 255), (byte)(place & 255), (byte)((generation >> 8) & 255), (byte)(generation & 255)]);
        var packed = Pack(rows.ToArray());
        string index = string.Join(' ', places.Keys.Select(number => string.Create(CultureInfo.InvariantCulture, $"{number} 1")));
        Write(output, $"{self} 0 obj\n<</Type/XRef/Size {_next}/W[1 4 2]/Index[{index}]{trailer}/Filter/FlateDecode/Length {packed.Length}>>\nstream\n");
        output.Write(packed);
        Write(output, $"\nendstream\nendobj\nstartxref\n{start}\n%%EOF\n");
    }

    private static byte[] Pack(ReadOnlySpan<byte> data)
    {
        using var packed = new MemoryStream();
        // Closed before the bytes are taken: closing writes the checksum.
        using (var zlib = new ZLibStream(packed, CompressionLevel.SmallestSize, leaveOpen: true)) zlib.Write(data);
        return packed.ToArray();
    }

    private static void Write(MemoryStream output, FormattableString text) =>
        output.Write(Encoding.Latin1.GetBytes(text.ToString(CultureInfo.InvariantCulture)));
}
