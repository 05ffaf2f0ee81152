using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Web.Rooms.SetDay;

namespace JointPlanner.Web.Tests.Rooms.SetDay;

public sealed class SiteEntryTests
{
    private static SiteEntry Typed(Quantity kind, string text, DisplayProfile shown)
    {
        var entry = new SiteEntry(kind);
        entry.Take(text, shown);
        return entry;
    }

    [Fact]
    public void A_bare_number_is_read_in_the_unit_shown_beside_it()
    {
        Assert.Equal(12.5, Typed(Quantity.Temperature, "12.5", DisplayProfile.Metric).Value!.Value, 1e-12);
        Assert.Equal(12.5, Typed(Quantity.Temperature, "54.5", DisplayProfile.Us).Value!.Value, 1e-12);
        Assert.Equal(12.5, Typed(Quantity.Temperature, "12,5", DisplayProfile.Metric).Value!.Value, 1e-12);
        Assert.Equal(0.047625, Typed(Quantity.Opening, "1 7/8", DisplayProfile.Us).Value!.Value, 1e-12);
    }

    [Fact]
    public void A_unit_that_was_typed_holds() => Assert.Equal(10, Typed(Quantity.Temperature, "50 °F", DisplayProfile.Metric).Value!.Value, 1e-12);

    [Fact]
    public void A_change_of_the_units_shown_never_changes_what_was_meant()
    {
        var entry = Typed(Quantity.Temperature, "12", DisplayProfile.Metric);
        entry.Take("12.5", DisplayProfile.Us);
        Assert.Equal((12.5, Unit.Celsius), (entry.Value!.Value, entry.Unit));
        entry.Take("", DisplayProfile.Us);
        entry.Take("50", DisplayProfile.Us);
        Assert.Equal(10, entry.Value!.Value, 1e-12);
    }

    [Fact]
    public void The_sign_turns_there_and_back()
    {
        var entry = Typed(Quantity.Temperature, "3", DisplayProfile.Metric);
        entry.TurnSign(DisplayProfile.Metric);
        Assert.Equal(("-3", -3.0), (entry.Text, entry.Value!.Value));
        entry.TurnSign(DisplayProfile.Metric);
        Assert.Equal("3", entry.Text);
    }

    [Theory]
    [InlineData("abc")]
    [InlineData("1,234")]
    [InlineData("12 bar")]
    public void What_cannot_be_read_is_no_value_and_says_why(string text)
    {
        var entry = Typed(Quantity.Opening, text, DisplayProfile.Metric);
        Assert.Null(entry.Value);
        Assert.NotEmpty(entry.Read()!.Fault!.Remedy);
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("-")]
    public void Nothing_typed_yet_is_no_fault(string text) => Assert.Null(Typed(Quantity.Temperature, text, DisplayProfile.Metric).Read());
}
