namespace JointPlanner.Cli.Tests;

public class TextTableTests
{
    [Fact]
    public void Words_stand_to_the_left_and_numbers_to_the_right()
    {
        var table = new TextTable("cause", "#opens by");
        table.Add("creep", "12.0 mm");
        table.Add("wind on the deck", "−1.0 mm");
        Assert.Equal(["  cause             opens by", "  creep              12.0 mm", "  wind on the deck   −1.0 mm"], table.Lines("  "));
    }

    [Fact]
    public void A_row_has_as_many_cells_as_there_are_columns() => Assert.Throws<ArgumentException>(() => new TextTable("a", "b").Add("1"));
}
