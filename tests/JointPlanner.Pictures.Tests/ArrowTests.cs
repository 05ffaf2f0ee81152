namespace JointPlanner.Pictures.Tests;

public class ArrowTests
{
    [Fact]
    public void The_tip_of_the_head_stands_at_the_end()
    {
        var parts = new Arrow(Role.Joint, new(0, 10), new(20, 10), Stroke.Heavy).Parts;
        var head = Assert.Single(parts.OfType<Polygon>());
        Assert.Equal(new PaperPoint(20, 10), head.Points[0]);
        Assert.True(Assert.Single(parts.OfType<Line>()).To.X < 20);
    }

    [Fact]
    public void An_arrow_of_both_ends_has_two_heads_that_look_away_from_each_other()
    {
        var heads = new Arrow(Role.Joint, new(0, 10), new(20, 10), Stroke.Thin) { BothEnds = true }.Parts.OfType<Polygon>().ToList();
        Assert.Equal(2, heads.Count);
        Assert.All(heads[0].Points.Skip(1), p => Assert.True(p.X < 20));
        Assert.All(heads[1].Points.Skip(1), p => Assert.True(p.X > 0));
    }
}
