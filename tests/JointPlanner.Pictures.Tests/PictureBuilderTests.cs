namespace JointPlanner.Pictures.Tests;

public class PictureBuilderTests
{
    private static readonly View Tenfold = new() { Origin = new(0, 0), PaperOrigin = new(5, 30), XScale = 2, Exaggeration = 5 };

    [Fact]
    public void World_points_go_through_the_view_and_line_weights_do_not()
    {
        var picture = new PictureBuilder(100, 40, Tenfold).Line(Role.Deck, new(0, 0), new(10, 1), Stroke.Medium).Build("t", "d");
        Assert.Equal(new Line(Role.Deck, new(5, 30), new(25, 20), Stroke.Medium), Assert.Single(picture.Elements));
    }

    [Fact]
    public void A_thing_made_of_many_lines_carries_one_path_and_one_name()
    {
        var picture = new PictureBuilder(100, 40, Tenfold)
            .Thing(Role.Support, "supports/p2", "Pier 2", b => b.Line(Role.Support, new(0, 0), new(0, -1), Stroke.Thin).Circle(Role.Bearing, new(0, 0), 1, Stroke.Thin))
            .Build("t", "d");
        var group = Assert.IsType<Group>(Assert.Single(picture.Elements));
        Assert.Equal(("supports/p2", "Pier 2", 2), (group.PlanPath, group.Title, group.Parts.Count));
    }

    [Fact]
    public void A_box_of_the_world_is_upright_on_paper()
    {
        var picture = new PictureBuilder(100, 40, Tenfold).Box(Role.Deck, new(0, 10, -1, 1), Stroke.Thin).Build("t", "d");
        Assert.Equal(new PaperBox(5, 20, 20, 20), Assert.IsType<Box>(Assert.Single(picture.Elements)).Edges);
    }
}
