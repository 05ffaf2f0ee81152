using Bunit;
using JointPlanner.Web.Rooms.Structure;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>Every wrong entry in the ledger is answered in its place with what is wrong, what is allowed and what to do; what was typed stays. The command line's half stands in its own tests.</summary>
public sealed class WrongInputTests : LedgerTest
{
    [Theory]
    [InlineData("segments/deck/end", "-5 m", "its length would be negative", "Allowed: a station greater than -0.6 m.", "Correct the end or the start")]
    [InlineData("supports/p3/station", "30 m", "before support p2 at 42 m", "Allowed: a station greater than 42 m.", "put the supports in station order")]
    [InlineData("climate/shade-min", "-300 °C", "below absolute zero (-273.15 °C)", "from -90 °C to 70 °C", "Correct the temperature.")]
    [InlineData("joints/j1/skew", "90°", "90° is out of range", "from -80° to 80°", "Correct the value or its unit.")]
    [InlineData("supports/p2/station", "42", "42", "in m", "“42 m”")]
    [InlineData("supports/p2/station", "1,234 m", "1,234", "1234 m", "1.234 m")]
    public void A_fault_stands_beside_its_field_with_what_is_allowed_and_what_to_do(string path, string typed, string wrong, string allowed, string remedy)
    {
        var cut = Ledger();
        Type(cut, path, typed);
        var says = Words(Beside(cut, path));
        Assert.Contains(wrong, says, StringComparison.Ordinal);
        Assert.Contains(allowed, says, StringComparison.Ordinal);
        Assert.Contains(remedy, says, StringComparison.Ordinal);
        Assert.Contains($"“{typed}”", Listed(cut, path), StringComparison.Ordinal);
        Assert.Equal(typed, cut.Find($"input[data-path='{path}']").GetAttribute("value"));
        Assert.Equal("true", cut.Find($"input[data-path='{path}']").GetAttribute("aria-invalid"));
        Assert.Equal(typed, Bench.Document.TextAt(path));
    }

    [Fact]
    public void An_empty_deck_is_told_at_the_deck_and_undo_brings_everything_back()
    {
        var cut = Ledger();
        var before = Bench.Document.ToJson();
        Button(cut, "Take out Segment Deck").Click();
        Button(cut, "Take out all the same").Click();
        cut.WaitForElement(".band-segments [data-fault='segments']");
        var says = Words(cut.Find(".band-segments [data-fault='segments']"));
        Assert.Equal("The deck is empty: there is no segment. Allowed: 1 or more. Add a deck segment.", says);
        Assert.StartsWith("deck segments", Listed(cut, "segments"), StringComparison.Ordinal);
        Assert.Equal(4, cut.FindAll(".band-supports .column").Count);
        cut.InvokeAsync(Bench.Undo);
        cut.WaitForAssertion(() => Assert.Empty(cut.FindAll("[data-fault='segments']")));
        Assert.Equal(before, Bench.Document.ToJson());
    }

    [Fact]
    public void A_deck_that_nothing_holds_is_told_at_its_segment()
    {
        var cut = Ledger();
        Choose(cut, "bearings/b2/kind", "free");
        Choose(cut, "bearings/b3/kind", "free");
        cut.WaitForElement("[data-column='segments/deck'] [data-fault='segments/deck']");
        var says = Words(cut.Find("[data-column='segments/deck'] [data-fault='segments/deck']"));
        Assert.Contains("held along the deck by sliders alone (b1, b2, b3, b4)", says, StringComparison.Ordinal);
        Assert.Contains("Allowed: at least one fixed or elastomeric line", says, StringComparison.Ordinal);
        Assert.Contains("Make one of its bearing lines fixed or elastomeric.", says, StringComparison.Ordinal);
        Assert.StartsWith("Deck:", Listed(cut, "segments/deck"), StringComparison.Ordinal);
    }

    [Fact]
    public void Degrees_Fahrenheit_typed_as_Celsius_are_doubted_beside_the_field_and_computed_all_the_same()
    {
        var cut = Ledger();
        Type(cut, "climate/shade-max", "60 °C");
        var says = Words(Beside(cut, "climate/shade-max", ".doubt"));
        Assert.Contains("60 °C is unusual", says, StringComparison.Ordinal);
        Assert.Contains("Usual: from -60 °C to 52 °C.", says, StringComparison.Ordinal);
        Assert.Contains("Was it meant in °F?", says, StringComparison.Ordinal);
        Assert.Equal("false", cut.Find("input[data-path='climate/shade-max']").GetAttribute("aria-invalid"));
        Assert.Contains("“60 °C”", Listed(cut, "climate/shade-max"), StringComparison.Ordinal);
        Assert.NotNull(Bench.Result);
    }

    [Fact]
    public void A_girder_span_over_500_m_is_doubted_beside_the_station_and_computed_all_the_same()
    {
        var cut = Ledger();
        Type(cut, "segments/deck/end", "680.6 m");
        Type(cut, "supports/a4/station", "680 m");
        Type(cut, "supports/p3/station", "643 m");
        cut.WaitForAssertion(() => Assert.Equal(643, Bench.Outcome.Reading.Plan?.Supports[2].Station));
        var says = Words(Beside(cut, "supports/p3/station", ".doubt"));
        Assert.Contains("the deck spans 601 m", says, StringComparison.Ordinal);
        Assert.Contains("Usual for a girder deck: up to 500 m.", says, StringComparison.Ordinal);
        Assert.Contains("Check the stations and their unit", says, StringComparison.Ordinal);
        cut.WaitForAssertion(() => Assert.NotNull(Bench.Result));
    }

    [Fact]
    public void A_comma_that_can_only_divide_is_read_and_stays_as_typed()
    {
        var cut = Ledger();
        Type(cut, "supports/p2/station", "42,5 m");
        cut.WaitForAssertion(() => Assert.Equal(42.5, Bench.Outcome.Reading.Plan?.Supports[1].Station));
        Assert.Equal("42,5 m", cut.Find("input[data-path='supports/p2/station']").GetAttribute("value"));
    }

    [Fact]
    public void Supports_out_of_order_can_be_put_in_order_by_one_press()
    {
        var cut = Ledger();
        Type(cut, "supports/p3/station", "30 m");
        cut.WaitForAssertion(() => Button(cut, "Put in station order", ".band-supports"));
        Button(cut, "Put in station order", ".band-supports").Click();
        cut.WaitForAssertion(() => Assert.NotNull(Bench.Result));
        Assert.Equal(["a1", "p3", "p2", "a4"], Bench.Document.Items("supports"));
        Assert.DoesNotContain(cut.FindAll("button"), b => Words(b) == "Put in station order");
    }

    [Fact]
    public void A_fault_leads_to_its_field_and_the_drawing_stays()
    {
        var cut = Ledger();
        Type(cut, "joints/j1/skew", "90°");
        Listed(cut, "joints/j1/skew");
        Assert.Equal("J1: skew", Words(cut.Find("[data-leads='joints/j1/skew']")));
        Assert.Equal(2, cut.FindAll(".ledger-elevation svg").Count);
    }

    [Fact]
    public void Pads_that_are_missing_are_told_where_they_belong()
    {
        var cut = Ledger();
        Choose(cut, "bearings/b2/kind", "elastomeric");
        cut.WaitForElement("[data-fault='bearings/b2/pads']:not(li)");
        var place = cut.Find("[data-fault='bearings/b2/pads']:not(li)");
        Assert.Contains("its pads are not given", Words(place), StringComparison.Ordinal);
        Assert.True(place.ParentElement!.HasAttribute("open"));
    }
}
