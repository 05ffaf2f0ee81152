namespace JointPlanner.Pdf.Tests;

public class TableTests
{
    [Fact]
    public void A_row_with_a_cell_too_few_is_refused_by_the_tables_name()
    {
        var fault = Assert.Throws<ArgumentException>(() => Print(Table.Of("Table 9", [new("a"), new("b")], [["1"]])));
        Assert.Contains("Table 9", fault.Message, StringComparison.Ordinal);
        Assert.Contains("1 cells", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Heads_that_cover_too_many_columns_are_refused() =>
        Assert.Throws<ArgumentException>(() => Print(Table.Of("t", [new("a"), new("b")], [["1", "2"]]) with { Spans = [new("s", 3)] }));

    [Fact]
    public void A_cell_higher_than_a_page_runs_on_and_loses_nothing()
    {
        var words = string.Join(' ', Enumerable.Range(1, 3000).Select(i => "w" + i + "."));
        var text = Print(Table.Of("Notes", [new("Remark"), new("By") { WidthMm = 20 }], [[words, "me"]]));
        var found = text.Split((char[])[' ', '\n', '\f'], StringSplitOptions.RemoveEmptyEntries).Where(w => w.StartsWith('w') && w.EndsWith('.')).ToHashSet();
        Assert.Equal(3000, found.Count);
    }

    [Fact]
    public void Rows_of_a_group_stay_on_one_page()
    {
        var groups = Enumerable.Range(1, 40).Select(g => new RowGroup([.. Enumerable.Range(1, 4).Select(r => new Row([$"g{g}-r{r}."]))])).ToList();
        var pages = Print(new Table([new("Row")], groups)).Split('\f', StringSplitOptions.RemoveEmptyEntries);
        Assert.True(pages.Length >= 3);
        for (var g = 1; g <= 40; g++)
            Assert.Single(pages, p => Enumerable.Range(1, 4).All(r => p.Contains($"g{g}-r{r}.", StringComparison.Ordinal)));
    }

    private static string Print(Table table) =>
        Tool.Output(PdfWriter.Write(SampleSheet.Make() with { Watermark = null, Blocks = [table] }).Bytes, "pdftotext", "-layout");
}
