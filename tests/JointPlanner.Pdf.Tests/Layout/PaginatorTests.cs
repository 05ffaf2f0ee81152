using JointPlanner.Pdf.Layout;

namespace JointPlanner.Pdf.Tests.Layout;

public class PaginatorTests
{
    private readonly List<(string Name, int Page, double Top)> _placed = [];

    [Fact]
    public void A_strip_that_does_not_fit_begins_the_next_page_without_its_space()
    {
        Place(Strip("a", 60), Strip("b", 50, spaceBefore: 10));
        Assert.Equal([("a", 0, 0), ("b", 1, 0)], _placed);
    }

    [Fact]
    public void A_heading_moves_on_with_what_follows_it()
    {
        Place(Strip("text", 80), Strip("heading", 10, Link.Strong), Strip("body", 20));
        Assert.Equal([("text", 0, 0), ("heading", 1, 0), ("body", 1, 10)], _placed);
    }

    [Fact]
    public void When_a_group_is_higher_than_a_page_its_weak_links_part_first()
    {
        Place(Strip("a1", 30, Link.Strong), Strip("a2", 30, Link.Weak), Strip("b1", 30, Link.Strong), Strip("b2", 30));
        Assert.Equal([("a1", 0, 0), ("a2", 0, 30), ("b1", 1, 0), ("b2", 1, 30)], _placed);
    }

    [Fact]
    public void A_head_stands_again_on_the_page_that_a_row_begins()
    {
        var head = new RepeatedHead(15, (canvas, top) => _placed.Add(("head", canvas.Index, top)));
        Place(Strip("row1", 80, head: head), Strip("row2", 60, head: head));
        Assert.Equal([("head", 0, 0), ("row1", 0, 15), ("head", 1, 0), ("row2", 1, 15)], _placed);
    }

    [Fact]
    public void A_page_break_at_the_top_of_a_page_does_nothing()
    {
        var begin = new Strip(0, (_, _) => { }) { BeginsPage = true };
        Assert.Equal(2, Place(begin, begin, Strip("a", 10), begin, begin, Strip("b", 10)).Count);
        Assert.Equal([("a", 0, 0), ("b", 1, 0)], _placed);
    }

    private static List<PageCanvas> Place(params Strip[] strips) => new Paginator(0, 100, _ => { }).Place(strips);

    private Strip Strip(string name, double height, Link link = Link.None, double spaceBefore = 0, RepeatedHead? head = null) =>
        new(height, (canvas, top) => _placed.Add((name, canvas.Index, top))) { Link = link, SpaceBefore = spaceBefore, Head = head };
}
