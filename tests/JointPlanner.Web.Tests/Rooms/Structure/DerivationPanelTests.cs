using AngleSharp.Dom;
using Bunit;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>Every figure of the ledger unfolds into its derivation.</summary>
public sealed class DerivationPanelTests : LedgerTest
{
    [Theory]
    [InlineData(Composite)]
    [InlineData(Viaduct)]
    [InlineData("kestrel-lane-overbridge")]
    [InlineData(Us)]
    public void Every_figure_can_be_asked_how_it_came_about(string structure)
    {
        var cut = Ledger(structure);
        Button(cut, "Unfold the causes of movement").Click();
        Assert.True(cut.FindAll("button.fact-number").Count > 60);
        Assert.Empty(cut.FindAll("span.fact-number").Select(Words));
    }

    [Theory]
    [InlineData(".band-joints .opens .fact-number")]
    [InlineData(".band-joints .closes .fact-number")]
    [InlineData(".cell-set .fact-number")]
    [InlineData(".band-segments .fact-number")]
    [InlineData(".travel .fact-number")]
    [InlineData(".setting-table tbody tr:first-child .set .fact-number")]
    [InlineData(".setting-table tbody tr:last-child td:nth-child(4) .fact-number")]
    [InlineData(".setting-table tbody tr:last-child td:last-child .fact-number")]
    public void The_derivation_ends_in_the_figure_that_was_pressed(string figure)
    {
        var cut = Ledger(Viaduct);
        var shown = Words(cut.Find(figure));
        cut.Find(figure).Click();
        var result = cut.Find(".derivation .step-result .step-value");
        Assert.Equal(Start(shown), Start(Words(result).TrimStart('=', ' ')), 1e-9);
        Assert.Equal("true", cut.Find(figure).GetAttribute("aria-expanded"));
        Assert.True(cut.FindAll(".derivation .step").Count > 1, "a computed figure rests on others");
        cut.Find(figure).Click();
        Assert.Empty(cut.FindAll(".derivation"));

        static double Start(string text) => double.Parse(
            string.Concat(text.Replace('−', '-').TakeWhile(c => char.IsAsciiDigit(c) || c is '.' or '-')), System.Globalization.CultureInfo.InvariantCulture);
    }

    [Fact]
    public void Room_left_unfolds_both_sides_of_its_rule_and_the_difference()
    {
        var cut = Ledger();
        var room = cut.Find(".band-joints .share .fact-number");
        var left = Words(room).Replace(" left", "", StringComparison.Ordinal);
        room.Click();
        Assert.Equal(2, cut.FindAll(".derivation .step-result").Count);
        Assert.Contains($"= {left}. Source:", Words(cut.Find(".step-closing")), StringComparison.Ordinal);
    }

    [Fact]
    public void The_derivation_is_shown_in_the_units_chosen()
    {
        var cut = Ledger();
        cut.Find(".cell-set .fact-number").Click();
        Assert.EndsWith(" mm", Words(cut.Find(".step-result .step-value")), StringComparison.Ordinal);
        cut.InvokeAsync(() => Preferences.Choose(Web.Shell.UnitProfile.Us));
        Assert.EndsWith(" in", Words(cut.Find(".step-result .step-value")), StringComparison.Ordinal);
    }

    [Fact]
    public void An_open_derivation_follows_its_number_while_another_field_changes()
    {
        var cut = Ledger();
        cut.Find(".cell-set .fact-number").Click();
        var title = Words(cut.Find(".derivation h2"));
        Type(cut, "climate/shade-max", "40 °C");
        cut.WaitForAssertion(() => Assert.Equal(40, Bench.Outcome.Reading.Plan?.Climate.ShadeMax));
        cut.WaitForAssertion(() => Assert.Equal(title, Words(cut.Find(".derivation h2"))));
        var shown = Words(cut.Find(".cell-set .fact-number"));
        Assert.Contains(shown[..shown.IndexOf(' ', StringComparison.Ordinal)], Words(cut.Find(".step-result .step-value")), StringComparison.Ordinal);
    }
}
