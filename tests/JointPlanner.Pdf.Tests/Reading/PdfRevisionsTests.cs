using System.Globalization;
using System.IO.Compression;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Tests.Signing;

namespace JointPlanner.Pdf.Tests.Reading;

public class PdfRevisionsTests
{
    [Fact]
    public void Table_and_stream_give_the_same_document()
    {
        var table = PdfRevisions.Open(HandMadeSheet.WithTable()).Last;
        var stream = PdfRevisions.Open(HandMadeSheet.WithStream()).Last;
        for (int number = 1; number <= 14; number++)
            Assert.True(CanonicalText.Same(table.Object(number)!.Value, stream.Object(number)!.Value), string.Create(CultureInfo.InvariantCulture, $"object {number}"));
    }

    [Fact]
    public void A_file_that_qpdf_packed_reads_as_before()
    {
        using var tool = new OutsideTool();
        tool.Write("plain.pdf", HandMadeSheet.WithTable());
        Assert.Equal(0, tool.Run("qpdf", "--object-streams=generate", "plain.pdf", "packed.pdf").ExitCode);
        byte[] packed = tool.Read("packed.pdf");
        Assert.Equal(HandMadeSheet.ResultsText, Encoding.UTF8.GetString(Attachments.Read(packed).Single(file => file.Name == "results.json").Bytes));
    }

    [Fact]
    public void Each_revision_looks_as_the_file_did_then()
    {
        byte[] first = HandMadeSheet.WithTable();
        byte[] second = HandMadeUpdate.Append(first, (7, "<</Title(Other)>>"));
        var file = PdfRevisions.Open(second);
        Assert.Equal(first.Length, file.All[0].End);
        Assert.Equal("Sample", Title(file.View(0)));
        Assert.Equal("Other", Title(file.View(1)));

        static string? Title(RevisionView view) => view.Text(view.Dictionary(view.Trailer["Info"])!["Title"]);
    }

    [Fact]
    public void More_than_25_MiB_are_not_read() => Refused(PdfReadFailure.FileTooLarge, new byte[(25 * 1024 * 1024) + 1]);

    [Fact]
    public void Another_kind_of_file_is_told() => Refused(PdfReadFailure.NotAPdf, "PK\u0003\u0004 and so on"u8.ToArray());

    [Fact]
    public void A_file_cut_short_is_told() => Refused(PdfReadFailure.Malformed, HandMadeSheet.WithTable()[..^40]);

    [Fact]
    public void Bytes_behind_the_end_are_told() => Refused(PdfReadFailure.Malformed, [.. HandMadeSheet.WithTable(), (byte)'x']);

    [Fact]
    public void More_than_50_000_objects_are_not_read()
    {
        string entries = string.Concat(Enumerable.Repeat("0000000000 00000 f \n", 50_001));
        Refused(PdfReadFailure.TooManyObjects, File($"xref\n0 50001\n{entries}trailer\n<</Size 50001/Root 1 0 R>>\nstartxref\n9\n%%EOF\n"));
    }

    [Fact]
    public void More_than_64_revisions_are_not_read()
    {
        byte[] file = HandMadeSheet.WithTable();
        for (int i = 1; i < 64; i++) file = HandMadeUpdate.Append(file);
        Assert.Equal(64, PdfRevisions.Open(file).All.Count);
        Refused(PdfReadFailure.TooManyRevisions, HandMadeUpdate.Append(file));
    }

    [Fact]
    public void A_revision_whose_predecessor_is_itself_is_told() =>
        Refused(PdfReadFailure.RevisionsNotDescending, File("xref\n0 1\n0000000000 65535 f \ntrailer\n<</Size 1/Root 1 0 R/Prev 9>>\nstartxref\n9\n%%EOF\n"));

    [Fact]
    public void A_linearised_file_is_told()
    {
        using var tool = new OutsideTool();
        tool.Write("plain.pdf", HandMadeSheet.WithTable());
        Assert.Equal(0, tool.Run("qpdf", "--linearize", "plain.pdf", "linear.pdf").ExitCode);
        Assert.Throws<PdfReadException>(() => PdfRevisions.Open(tool.Read("linear.pdf")));
    }

    [Fact]
    public void An_encrypted_file_is_told()
    {
        using var tool = new OutsideTool();
        tool.Write("plain.pdf", HandMadeSheet.WithTable());
        Assert.Equal(0, tool.Run("qpdf", "--encrypt", "", "owner", "256", "--", "plain.pdf", "locked.pdf").ExitCode);
        Refused(PdfReadFailure.Unsupported, tool.Read("locked.pdf"));
    }

    [Fact]
    public void Nesting_is_read_to_64_and_no_deeper()
    {
        Assert.NotNull(Catalog(new string('[', 63) + new string(']', 63)));
        Assert.Equal(PdfReadFailure.NestedTooDeep, Assert.Throws<PdfReadException>(() => Catalog(new string('[', 1_000_000))).Failure);
    }

    [Fact]
    public void The_same_key_twice_in_a_dictionary_is_told() =>
        Assert.Contains("twice", Assert.Throws<PdfReadException>(() => Catalog("1/Pages 2 0 R/Pages 3 0 R")).Message, StringComparison.Ordinal);

    [Fact]
    public void An_object_that_is_not_where_it_is_said_to_be_is_told()
    {
        byte[] file = HandMadeSheet.WithTable();
        int entry = file.AsSpan().IndexOf(" 00000 n"u8);
        file[entry - 1] ^= 1;
        Assert.Equal(PdfReadFailure.Malformed, Assert.Throws<PdfReadException>(() => PdfRevisions.Open(file).Last.Object(1)).Failure);
    }

    [Fact]
    public void A_stream_that_unpacks_to_more_than_20_MiB_is_not_unpacked()
    {
        byte[] bomb = WithAttachment(new byte[(20 * 1024 * 1024) + 1]);
        Assert.True(bomb.Length < 100_000);
        Assert.Equal(PdfReadFailure.InflatesTooFar, Assert.Throws<PdfReadException>(() => Attachments.Read(bomb)).Failure);
        Assert.Equal(20 * 1024 * 1024, Attachments.Read(WithAttachment(new byte[20 * 1024 * 1024]))[0].Bytes.Length);
    }

    [Fact]
    public void Streams_that_unpack_to_more_than_100_MiB_together_are_not_unpacked()
    {
        byte[] packed = Pack(new byte[20 * 1024 * 1024]);
        string stream = $"<</Filter/FlateDecode/Length {packed.Length.ToString(CultureInfo.InvariantCulture)}>>\nstream\n{Encoding.Latin1.GetString(packed)}\nendstream";
        string names = string.Concat(Enumerable.Range(0, 6).Select(i => string.Create(CultureInfo.InvariantCulture, $"({i})<</EF<</F {20 + i} 0 R>>>>")));
        byte[] file = HandMadeUpdate.Append(HandMadeSheet.WithTable(),
            [(1, $"<</Type/Catalog/Pages 2 0 R/Names<</EmbeddedFiles<</Names[{names}]>>>>>>"), .. Enumerable.Range(20, 6).Select(number => (number, stream))]);
        Assert.Equal(PdfReadFailure.InflatesTooFar, Assert.Throws<PdfReadException>(() => Attachments.Read(file)).Failure);
    }

    [Fact]
    public void A_chain_of_lengths_given_by_reference_is_cut()
    {
        // Each stream's length is said to stand in the next stream.
        var chain = Enumerable.Range(20, 2000).Select(number => (number, string.Create(CultureInfo.InvariantCulture, $"<</Length {number + 1} 0 R>>\nstream\n\nendstream"))).ToArray();
        var view = PdfRevisions.Open(HandMadeUpdate.Append(HandMadeSheet.WithTable(), chain)).Last;
        Assert.Equal(PdfReadFailure.Malformed, Assert.Throws<PdfReadException>(() => view.Object(20)).Failure);
    }

    [Fact]
    public void A_list_of_attachments_that_runs_in_a_circle_is_told()
    {
        byte[] file = HandMadeUpdate.Append(HandMadeSheet.WithTable(), (1, "<</Type/Catalog/Pages 2 0 R/Names<</EmbeddedFiles 20 0 R>>>>"), (20, "<</Kids[20 0 R]>>"));
        Assert.Contains("circle", Assert.Throws<PdfReadException>(() => Attachments.Read(file)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Reading_stops_when_the_time_is_over()
    {
        var limits = PdfReadLimits.Default with { Time = TimeSpan.Zero };
        Assert.Equal(PdfReadFailure.TookTooLong, Assert.Throws<PdfReadException>(() => PdfRevisions.Open(HandMadeSheet.WithTable(), limits)).Failure);
    }

    [Fact]
    public void Reading_stops_when_it_is_called_off()
    {
        using var called = new CancellationTokenSource();
        called.Cancel();
        Assert.ThrowsAny<OperationCanceledException>(() => PdfRevisions.Open(HandMadeSheet.WithTable(), null, called.Token));
    }

    [Fact]
    public void Twenty_thousand_strings_one_inside_the_other_end_within_the_limits()
    {
        // Each object is a string that holds all the objects after it: work and memory that grow with objects times bytes.
        const int objects = 20_000;
        var text = new StringBuilder("%PDF-1.7\n");
        var table = new StringBuilder().Append(CultureInfo.InvariantCulture, $"xref\n0 {objects + 1}\n0000000000 65535 f \n");
        for (int number = 1; number <= objects; number++)
        {
            table.Append(CultureInfo.InvariantCulture, $"{text.Length:D10} 00000 n \n");
            text.Append(CultureInfo.InvariantCulture, $"{number} 0 obj\n({new string('x', 100)}");
        }
        text.Insert(text.Length, ")endobj ", objects);
        int start = text.Length;
        text.Append(table).Append(CultureInfo.InvariantCulture, $"trailer\n<</Size {objects + 1}/Root 1 0 R>>\nstartxref\n{start}\n%%EOF\n");
        // Time to spare on a loaded machine: the limit on strings is the one tried.
        var view = PdfRevisions.Open(Encoding.Latin1.GetBytes(text.ToString()), PdfReadLimits.Default with { Time = TimeSpan.FromMinutes(2) }).Last;
        var failure = Assert.Throws<PdfReadException>(() => view.Numbers().Order().Select(number => view.Object(number)!.Number).Sum());
        Assert.Equal(PdfReadFailure.TooManyObjects, failure.Failure);
        Assert.Contains("bytes of strings", failure.Message, StringComparison.Ordinal);
    }

    private static PdfDictionary Catalog(string value) =>
        PdfRevisions.Open(HandMadeUpdate.Append(HandMadeSheet.WithTable(), (1, $"<</Type/Catalog/X {value}>>"))).Last.Catalog;

    private static byte[] WithAttachment(byte[] content)
    {
        byte[] packed = Pack(content);
        return HandMadeUpdate.Append(HandMadeSheet.WithTable(), (13, $"<</Type/EmbeddedFile/Filter/FlateDecode/Length {packed.Length.ToString(CultureInfo.InvariantCulture)}>>\nstream\n{Encoding.Latin1.GetString(packed)}\nendstream"));
    }

    private static byte[] Pack(byte[] data)
    {
        var packed = new MemoryStream();
        using (var zlib = new ZLibStream(packed, CompressionLevel.Optimal, leaveOpen: true)) zlib.Write(data);
        return packed.ToArray();
    }

    private static byte[] File(string rest) => Encoding.Latin1.GetBytes("%PDF-1.7\n" + rest);

    private static void Refused(PdfReadFailure expected, byte[] file) =>
        Assert.Equal(expected, Assert.Throws<PdfReadException>(() => PdfRevisions.Open(file)).Failure);
}
