namespace JointPlanner.Pdf.Tests;

public class AttachmentTests
{
    [Theory]
    [InlineData("")]
    [InlineData("a/b.json")]
    [InlineData("..\\b.json")]
    public void A_name_that_is_no_file_name_is_refused(string name) => Assert.Throws<ArgumentException>(() => Write(new Attachment(name, "text/plain", new byte[1], AttachmentRelation.Data, "")));

    [Fact]
    public void Two_files_of_one_name_are_refused()
    {
        var file = new Attachment("a.json", "text/plain", new byte[1], AttachmentRelation.Data, "");
        Assert.Throws<ArgumentException>(() => Write(file, file));
    }

    [Fact]
    public void The_hash_is_the_published_one_of_the_content() =>
        // FIPS 180-4 example: SHA-256 of "abc".
        Assert.Equal("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", new Attachment("a", "b", "abc"u8.ToArray(), AttachmentRelation.Data, "").Sha256);

    [Fact]
    public void Each_file_says_what_it_is_to_the_sheet()
    {
        var text = Tool.With(PdfWriter.Write(SampleSheet.Make()).Bytes, path => Tool.Run("qpdf", "--qdf", "--object-streams=disable", path, "-").Output);
        Assert.Matches(@"/AFRelationship /Source[^>]*?/Desc \(The package", text);
        Assert.Matches(@"/AFRelationship /Data[^>]*?/Desc \(Every result", text);
        Assert.Matches(@"/AF \[\s+\d+ 0 R\s+\d+ 0 R\s+\]", text);
    }

    private static void Write(params Attachment[] files) => PdfWriter.Write(SampleSheet.Make() with { Attachments = files });
}
