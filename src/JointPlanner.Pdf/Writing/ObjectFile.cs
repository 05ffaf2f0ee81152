using System.IO.Compression;
using System.Security.Cryptography;
using System.Text;

namespace JointPlanner.Pdf.Writing;

/// <summary>
/// A file in the making: numbered objects, packed into object streams except those that a later signature may rewrite, and one
/// cross-reference stream (ISO 32000-1, 7.5.7 and 7.5.8). Same objects, same bytes; the file's identifier comes from its content.
/// </summary>
internal sealed class ObjectFile : INewObjects
{
    private const int PackSize = 200;
    private readonly List<byte[]?> _bodies = [null];
    private readonly HashSet<int> _plain = [];

    /// <summary>A number for an object whose content comes later.</summary>
    public int Reserve()
    {
        _bodies.Add(null);
        return _bodies.Count - 1;
    }

    /// <summary>A number for an object that is never packed.</summary>
    public int ReservePlain()
    {
        var id = Reserve();
        _plain.Add(id);
        return id;
    }

    public void Set(int id, PdfDictionary content) => _bodies[id] = Syntax.Bytes(content.ToString());

    public int Add(PdfDictionary content)
    {
        var id = Reserve();
        Set(id, content);
        return id;
    }

    public int AddArray(string content)
    {
        var id = Reserve();
        _bodies[id] = Syntax.Bytes(content);
        return id;
    }

    /// <summary>A stream; compressed unless a plain reader should find it, as with metadata.</summary>
    public int AddStream(PdfDictionary head, ReadOnlySpan<byte> data, bool compress = true)
    {
        var id = ReservePlain();
        _bodies[id] = StreamBody(head, data, compress);
        return id;
    }

    public byte[] Finish(int catalog, int information)
    {
        using var file = new MemoryStream();
        file.Write([.. "%PDF-1.7\n%"u8, 0xE2, 0xE3, 0xCF, 0xD3, (byte)'\n']);
        var places = new SortedDictionary<int, (int Kind, long First, int Second)> { [0] = (0, 0, 65535) };
        var packable = Enumerable.Range(1, _bodies.Count - 1).Where(id => !_plain.Contains(id)).ToList();
        foreach (var pack in packable.Chunk(PackSize)) Pack(pack, places);
        for (var id = 1; id < _bodies.Count; id++)
        {
            if (places.ContainsKey(id)) continue;
            places[id] = (1, file.Position, 0);
            file.Write(Syntax.Bytes(Syntax.Number(id) + " 0 obj\n"));
            file.Write(Body(id));
            file.Write("\nendobj\n"u8);
        }
        WriteCrossReferences(file, places, catalog, information);
        return file.ToArray();
    }

    private void Pack(int[] pack, SortedDictionary<int, (int Kind, long First, int Second)> places)
    {
        var stream = ReservePlain();
        var index = new StringBuilder();
        using var bodies = new MemoryStream();
        for (var i = 0; i < pack.Length; i++)
        {
            index.Append(Syntax.Number(pack[i])).Append(' ').Append(Syntax.Number((int)bodies.Length)).Append(' ');
            bodies.Write(Body(pack[i]));
            bodies.WriteByte((byte)'\n');
            places[pack[i]] = (2, stream, i);
        }
        _bodies[stream] = StreamBody(
            new PdfDictionary("ObjStm").Number("N", pack.Length).Number("First", index.Length), [.. Syntax.Bytes(index.ToString()), .. bodies.ToArray()], true);
    }

    private void WriteCrossReferences(MemoryStream file, SortedDictionary<int, (int Kind, long First, int Second)> places, int catalog, int information)
    {
        var self = Reserve();
        var start = file.Position;
        places[self] = (1, start, 0);
        var table = new byte[7 * places.Count];
        foreach (var (id, (kind, first, second)) in places)
        {
            var row = table.AsSpan(7 * id, 7);
            row[0] = (byte)kind;
            System.Buffers.Binary.BinaryPrimitives.WriteUInt32BigEndian(row[1..], checked((uint)first));
            System.Buffers.Binary.BinaryPrimitives.WriteUInt16BigEndian(row[5..], checked((ushort)second));
        }
        var identifier = "<" + Convert.ToHexString(SHA256.HashData(file.GetBuffer().AsSpan(0, (int)file.Length)).AsSpan(0, 16)) + ">";
        var head = new PdfDictionary("XRef").Number("Size", places.Count).Numbers("W", 1, 4, 2).Reference("Root", catalog)
            .Reference("Info", information).Raw("ID", "[" + identifier + identifier + "]");
        file.Write(Syntax.Bytes(Syntax.Number(self) + " 0 obj\n"));
        file.Write(StreamBody(head, table, true));
        file.Write(Syntax.Bytes("\nendobj\nstartxref\n" + Syntax.Number((int)start) + "\n%%EOF\n"));
    }

    private byte[] Body(int id) => _bodies[id] ?? throw new InvalidOperationException($"The object {id} of the file was never given its content.");

    private static byte[] StreamBody(PdfDictionary head, ReadOnlySpan<byte> data, bool compress)
    {
        var content = compress ? Deflate(data) : data;
        if (compress) head.Name("Filter", "FlateDecode");
        head.Number("Length", content.Length);
        return [.. Syntax.Bytes(head.ToString()), .. "\nstream\n"u8, .. content, .. "\nendstream"u8];
    }

    private static ReadOnlySpan<byte> Deflate(ReadOnlySpan<byte> data)
    {
        using var target = new MemoryStream();
        // Closed before the bytes are read: closing writes the checksum.
        using (var zlib = new ZLibStream(target, CompressionLevel.Optimal, leaveOpen: true)) zlib.Write(data);
        return target.ToArray();
    }
}
