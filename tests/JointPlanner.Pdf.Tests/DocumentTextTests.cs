namespace JointPlanner.Pdf.Tests;

public class DocumentTextTests
{
    [Fact]
    public void The_text_of_a_document_says_what_is_printed()
    {
        var text = DocumentText.Of(SampleSheet.Make());
        foreach (var line in new[]
        {
            "watermark: DEMONSTRATION, not for construction", "== Movements at joints and bearings", "# 1 Basis", "## 2.1 Joint at abutment A2",
            "Contraction of the deck from setting to the lowest uniform temperature [EN 1991-1-5:2003, 6.1.3.3 (1)]",
            "    u_T = α · ΔT_(N,con) · L", "    = 31.5 mm", "-- Service", "| Braking | 2.64 | 2.64 | 2.64 | 2.64 | step 3",
            "* Sum, service | 42.18 | 29.54 | 35.04 | 29.54 | ", "[signature] designer: Designer, M. Ångström",
        })
        {
            Assert.Contains("\n" + line + "\n", text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Every_printed_number_of_a_table_is_in_the_text_and_on_the_page()
    {
        var document = SampleSheet.Make(settingRows: 130);
        var (text, page) = (DocumentText.Of(document), Tool.Output(PdfWriter.Write(document).Bytes, "pdftotext", "-layout"));
        var cells = document.Blocks.OfType<Table>().SelectMany(t => t.Groups).SelectMany(g => g.Rows).SelectMany(r => r.Cells).Select(c => c.Linear).Where(c => c.Length > 0).ToList();
        Assert.True(cells.Count > 500);
        Assert.All(cells, c => Assert.True(text.Contains(c, StringComparison.Ordinal) && page.Contains(c.Split(',')[0], StringComparison.Ordinal), c));
    }
}
