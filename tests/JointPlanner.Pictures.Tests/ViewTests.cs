namespace JointPlanner.Pictures.Tests;

public class ViewTests
{
    private static readonly WorldBox LongDeck = new(0, 200, -8, 2);
    private static readonly PaperBox Room = new(10, 5, 160, 40);

    [Fact]
    public void A_world_that_fits_to_one_scale_keeps_its_shape()
    {
        var view = View.Fit(LongDeck, Room);
        Assert.Equal(0.8, view.XScale, 12);
        Assert.Equal(view.XScale, view.ZScale, 12);
        Assert.Equal("Heights and lengths to one scale.", view.ScaleSentence);
    }

    [Fact]
    public void Heights_grow_upwards_in_the_world_and_downwards_on_paper()
    {
        var view = View.Fit(LongDeck, Room);
        Assert.True(view.ToPaper(new(0, 2)).Y < view.ToPaper(new(0, -8)).Y);
        Assert.Equal(10, view.ToPaper(new(0, 0)).X, 12);
        Assert.Equal(170, view.ToPaper(new(200, 0)).X, 12);
    }

    [Fact]
    public void Exaggeration_enlarges_heights_alone_by_the_number_that_is_printed()
    {
        var view = View.FitExaggerated(LongDeck, Room);
        var (foot, head) = (view.ToPaper(new(0, -8)), view.ToPaper(new(0, 2)));
        Assert.Equal(10 * view.XScale * view.Exaggeration, foot.Y - head.Y, 9);
        Assert.Equal(5, view.Exaggeration);
        Assert.Equal("Heights drawn 5 times as large as lengths.", view.ScaleSentence);
    }

    [Fact]
    public void Exaggeration_never_passes_the_most_that_is_allowed() =>
        Assert.Equal(3, View.FitExaggerated(LongDeck, Room, most: 3).Exaggeration);

    [Fact]
    public void A_world_higher_than_wide_is_not_exaggerated()
    {
        var view = View.FitExaggerated(new(0, 10, 0, 100), Room);
        Assert.Equal(1, view.Exaggeration);
        Assert.Equal(0.4, view.ZScale, 12);
    }

    [Fact]
    public void The_way_back_from_the_paper_ends_where_it_began()
    {
        var view = View.FitExaggerated(LongDeck, Room);
        var back = view.ToWorld(view.ToPaper(new(123.4, -3.2)));
        Assert.Equal(123.4, back.X, 9);
        Assert.Equal(-3.2, back.Z, 9);
    }

    [Fact]
    public void A_diagram_fills_its_room_along_both_axes()
    {
        var view = View.Fill(new(-20, 40, 0, 100), Room);
        Assert.Equal(new PaperPoint(10, 45), Rounded(view.ToPaper(new(-20, 0))));
        Assert.Equal(new PaperPoint(170, 5), Rounded(view.ToPaper(new(40, 100))));
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(double.NaN, 1)]
    [InlineData(double.PositiveInfinity, 1)]
    [InlineData(-1, 1)]
    public void A_world_without_a_finite_extent_is_refused(double width, double height) =>
        Assert.Throws<ArgumentException>(() => View.Fit(new(0, width, 0, height), Room));

    private static PaperPoint Rounded(PaperPoint p) => new(Math.Round(p.X, 9), Math.Round(p.Y, 9));
}
