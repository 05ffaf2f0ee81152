using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Tests.Layout;

public class ColumnWidthsTests
{
    [Fact]
    public void Columns_that_fit_share_what_is_left_over() =>
        Assert.Equal([50, 150], ColumnWidths.Share([null, null], [10, 10], [20, 60], 200, true));

    [Fact]
    public void A_narrow_table_keeps_to_its_content() =>
        Assert.Equal([20, 60], ColumnWidths.Share([null, null], [10, 10], [20, 60], 200, false));

    [Fact]
    public void A_column_of_text_gives_way_before_a_column_of_numbers()
    {
        var widths = ColumnWidths.Share([null, null], [40, 30], [40, 500], 200, true);
        Assert.Equal([40, 160], widths);
    }

    [Fact]
    public void A_width_that_was_asked_for_is_kept() =>
        Assert.Equal(77, ColumnWidths.Share([77, null, null], [10, 10, 10], [20, 500, 60], 300, true)[0], 9);

    [Fact]
    public void Words_wider_than_the_paper_are_squeezed_into_it() =>
        Assert.Equal(200, ColumnWidths.Share([null, null, null], [900, 20, 30], [900, 20, 30], 200, true).Sum(), 9);
}
