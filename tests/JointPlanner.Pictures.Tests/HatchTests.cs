namespace JointPlanner.Pictures.Tests;

public class HatchTests
{
    private static readonly PaperPoint[] Square = [new(0, 0), new(10, 0), new(10, 10), new(0, 10)];

    [Fact]
    public void Level_lines_fill_a_square_from_side_to_side()
    {
        var lines = new Hatch(Role.Hatch, Square, 2, 0).Parts.Cast<Line>().ToList();
        Assert.All(lines, l => Assert.Equal(10, l.From.DistanceTo(l.To), 9));
        Assert.Equal([2.0, 4.0, 6.0, 8.0], lines.Select(l => Math.Round(l.From.Y, 9)).Where(y => y is > 0 and < 10).Order());
    }

    [Fact]
    public void Sloping_lines_rise_to_the_right_and_stay_inside()
    {
        var lines = new Hatch(Role.Hatch, Square).Parts.Cast<Line>().ToList();
        Assert.NotEmpty(lines);
        Assert.All(lines, l =>
        {
            Assert.Equal(-1, (l.To.Y - l.From.Y) / (l.To.X - l.From.X), 6);
            Assert.All(new[] { l.From, l.To }, p => Assert.True(p is { X: > -1e-9 and < 10 + 1e-9, Y: > -1e-9 and < 10 + 1e-9 }));
        });
    }

    [Fact]
    public void A_notch_stays_free_of_lines()
    {
        PaperPoint[] notched = [new(0, 0), new(4, 0), new(4, 8), new(6, 8), new(6, 0), new(10, 0), new(10, 10), new(0, 10)];
        var level = new Hatch(Role.Hatch, notched, 5, 0).Parts.Cast<Line>().Where(l => Math.Abs(l.From.Y - 5) < 1e-9).ToList();
        Assert.Equal(2, level.Count);
        Assert.All(level, l => Assert.Equal(4, l.From.DistanceTo(l.To), 9));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(double.NaN)]
    [InlineData(0.0001)]
    public void A_spacing_that_cannot_be_drawn_is_refused(double spacing) =>
        Assert.Throws<InvalidOperationException>(() => new Hatch(Role.Hatch, Square, spacing).Parts);
}
