using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Tests.Signing;

namespace JointPlanner.Pdf.Tests.Reading;

public class AttachmentsTests
{
    [Fact]
    public void Both_attachments_come_out_as_they_went_in()
    {
        foreach (byte[] sheet in new[] { HandMadeSheet.WithTable(), HandMadeSheet.WithStream() })
        {
            var files = Attachments.Read(sheet);
            Assert.Equal(["calculation.json", "results.json"], files.Select(file => file.Name));
            Assert.Equal(["Source", "Data"], files.Select(file => file.Relationship));
            Assert.Equal([HandMadeSheet.CalculationText, HandMadeSheet.ResultsText], files.Select(file => Encoding.UTF8.GetString(file.Bytes)));
        }
    }

    [Fact]
    public async Task Signing_leaves_them_as_they_are()
    {
        byte[] signed = await Signed.ByBoth(HandMadeSheet.WithStream());
        Assert.Equal(HandMadeSheet.ResultsText, Encoding.UTF8.GetString(Attachments.Read(signed)[1].Bytes));
    }

    [Fact]
    public void A_file_without_attachments_has_none() => Assert.Empty(Attachments.Read(HandMadeSheet.WithoutAttachments()));

    [Fact]
    public void Poppler_sees_the_same_attachments()
    {
        using var tool = new OutsideTool();
        tool.Write("sheet.pdf", HandMadeSheet.WithStream());
        Assert.Equal(0, tool.Run("pdfdetach", "-save", "2", "-o", "out.json", "sheet.pdf").ExitCode);
        Assert.Equal(tool.Read("out.json"), Attachments.Read(HandMadeSheet.WithStream())[1].Bytes);
    }
}
