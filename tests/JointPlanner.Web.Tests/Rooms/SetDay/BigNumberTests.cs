using Bunit;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Setting;
using JointPlanner.Web.Rooms.SetDay;

namespace JointPlanner.Web.Tests.Rooms.SetDay;

public sealed class BigNumberTests : MudTest
{
    private static readonly MaySet Set = new(Direction.Normal, 0.042, 0.0035, 0.004, 0.0371, 0.0473, "least gap in service", "greatest gap in service", 0.001);

    private static readonly DoNotSet No = new(new("setting-outside-temperatures", Severity.Warning, "joints/j1", "Do not set at {0}.", [(Quantity.Temperature, 45.0)]));

    private IRenderedComponent<BigNumber> Show(SettingAnswer? answer, string? whyNot = null, DisplayProfile? profile = null, string missing = "") => Render<BigNumber>(p => p
        .Add(b => b.Mark, "J1").Add(b => b.Answer, answer).Add(b => b.WhyNot, whyNot).Add(b => b.Mean, 11.5).Add(b => b.Missing, missing).Add(b => b.Profile, profile ?? DisplayProfile.Metric));

    [Fact]
    public void It_shows_one_number_with_tolerance_direction_and_window()
    {
        var cut = Show(Set);
        Assert.Equal("42 mm", cut.Find("[data-set]").TextContent);
        Assert.Equal("measured normal to the joint", cut.Find(".big-measured").TextContent);
        Assert.Equal(["tighter by at most 3.5 mm", "wider by at most 4 mm"], cut.FindAll(".big-tolerance span").Select(s => s.TextContent));
        Assert.Equal("at 11.5 °C · window 37.1 mm – 47.3 mm", cut.Find(".big-window").TextContent);
    }

    [Fact]
    public void In_inches_it_is_a_fraction_that_a_rule_shows() =>
        Assert.Equal("1 7/8 in", Show(Set with { Set = 1.875 * 0.0254 }, profile: DisplayProfile.Us).Find("[data-set]").TextContent);

    [Fact]
    public void A_refusal_of_the_table_shows_why_and_no_number()
    {
        var cut = Show(No, profile: DisplayProfile.Us);
        Assert.Equal("Do not set at 113.0 °F.", cut.Find(".big-why").TextContent);
        Assert.Empty(cut.FindAll("[data-set]"));
    }

    [Fact]
    public void An_issue_that_may_not_be_used_shows_no_number_though_the_table_has_one()
    {
        var cut = Show(Set, whyNot: "Revision 2 was withdrawn.");
        Assert.Equal(("Do not set", "Revision 2 was withdrawn."), (cut.Find(".big-stop").TextContent, cut.Find(".big-why").TextContent));
        Assert.Empty(cut.FindAll("[data-set]"));
        Assert.DoesNotContain("42", cut.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void While_something_is_missing_it_says_what() =>
        Assert.Equal("Enter the temperature of the structure.", Show(null, missing: "Enter the temperature of the structure.").Find(".big-why").TextContent);
}
