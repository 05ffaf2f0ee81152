namespace JointPlanner.Pdf.Tests;

public class PdfWriterTests
{
    [Fact]
    public void A_sheet_is_clean_for_a_strict_reader() =>
        Assert.Contains("No syntax or stream encoding errors found", Tool.Output(PdfWriter.Write(SampleSheet.Make()).Bytes, "qpdf", "--check"), StringComparison.Ordinal);
}
