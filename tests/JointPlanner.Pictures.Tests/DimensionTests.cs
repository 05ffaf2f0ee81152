namespace JointPlanner.Pictures.Tests;

public class DimensionTests
{
    [Fact]
    public void A_dimension_drawn_from_left_to_right_stands_above_with_its_number()
    {
        var parts = new Dimension(new(0, 50), new(40, 50), "40.0 m", 8).Parts;
        var number = Assert.Single(parts.OfType<Label>());
        Assert.Equal((20.0, 0.0), (number.At.X, number.AngleDegrees));
        Assert.True(number.At.Y < 42);
        Assert.Contains(parts.OfType<Line>(), l => l.From == new PaperPoint(0, 42) && l.To == new PaperPoint(40, 42));
    }

    [Theory]
    [InlineData(40, 0)]
    [InlineData(-40, 0)]
    [InlineData(0, 40)]
    [InlineData(0, -40)]
    [InlineData(-30, 30)]
    [InlineData(-30, -30)]
    public void A_number_is_never_upside_down(double right, double down)
    {
        var number = Assert.Single(new Dimension(new(50, 50), new(50 + right, 50 + down), "7", 5).Parts.OfType<Label>());
        Assert.InRange(number.AngleDegrees, -90.001, 90.001);
    }

    [Fact]
    public void Arrows_of_a_short_dimension_stand_outside_and_point_inwards()
    {
        var heads = new Dimension(new(50, 50), new(53, 50), "60 mm", 5).Parts.OfType<Polygon>().ToList();
        Assert.Equal(2, heads.Count);
        Assert.Equal(50, heads[0].Points[0].X, 9);
        Assert.All(heads[0].Points.Skip(1), p => Assert.True(p.X < 50));
        Assert.All(heads[1].Points.Skip(1), p => Assert.True(p.X > 53));
    }

    [Fact]
    public void A_dimension_of_nothing_draws_nothing() => Assert.Empty(new Dimension(new(5, 5), new(5, 5), "0", 5).Parts);
}
