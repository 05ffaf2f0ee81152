namespace JointPlanner.Pictures.Tests;

public class LabelTests
{
    [Fact]
    public void Text_hung_by_its_middle_drops_half_a_capital()
    {
        var label = new Label(Role.Label, new(0, 0), "Pier 2") { SizeMm = 10, Level = Level.Middle };
        Assert.Equal(10 * Label.CapitalHeight / 2, label.BaselineDropMm, 12);
        Assert.Equal(0, (label with { Level = Level.Baseline }).BaselineDropMm);
    }

    [Fact]
    public void Longer_and_larger_text_is_guessed_wider()
    {
        var label = new Label(Role.Label, new(0, 0), "Pier 2");
        Assert.True((label with { Text = "Pier 12" }).GuessedWidthMm > label.GuessedWidthMm);
        Assert.Equal(2 * label.GuessedWidthMm, (label with { SizeMm = 2 * label.SizeMm }).GuessedWidthMm, 9);
    }
}
