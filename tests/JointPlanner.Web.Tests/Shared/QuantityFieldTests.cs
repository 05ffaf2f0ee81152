using Bunit;
using JointPlanner.Engine.Plans;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Tests.Shared;

public sealed class QuantityFieldTests : MudTest
{
    private static readonly Fault Backwards = new("segment-backwards", "segments/s1/end", "-5 m", "The end is before the start.", "More than 0 m.", "Give a station beyond the start.");

    [Fact]
    public void A_label_is_tied_to_its_field()
    {
        var cut = Render<QuantityField>(p => p.Add(f => f.Label, "Length").Add(f => f.Path, "segments/s1/end"));
        Assert.Equal(cut.Find("input").Id, cut.Find("label").GetAttribute("for"));
    }

    [Fact]
    public void Every_key_is_told_as_the_whole_text()
    {
        var told = new List<string>();
        var cut = Render<QuantityField>(p => p.Add(f => f.Path, "a").Add(f => f.TextChanged, EventCallback.Factory.Create<string>(this, told.Add)));
        cut.Find("input").Input("42");
        cut.Find("input").Input("42 m");
        Assert.Equal(["42", "42 m"], told);
    }

    [Fact]
    public void What_was_typed_stays_though_it_is_wrong()
    {
        var cut = Render<QuantityField>(p => p.Add(f => f.Path, "a").Add(f => f.Text, "10 m"));
        cut.Find("input").Input("-5 m");
        cut.Render(p => p.Add(f => f.Text, "-5 m").Add(f => f.Faults, [Backwards]));
        Assert.Equal("-5 m", cut.Find("input").GetAttribute("value"));
    }

    [Fact]
    public void A_fault_stands_beside_the_field_and_tells_what_is_allowed_and_what_to_do()
    {
        var cut = Render<QuantityField>(p => p.Add(f => f.Path, "a").Add(f => f.Text, "-5 m").Add(f => f.Faults, [Backwards]));
        var says = cut.Find($"#{cut.Find("input").GetAttribute("aria-describedby")}");
        Assert.Contains("The end is before the start. More than 0 m. Give a station beyond the start.", says.TextContent, StringComparison.Ordinal);
        Assert.Equal("true", cut.Find("input").GetAttribute("aria-invalid"));
    }

    [Fact]
    public void A_warning_does_not_mark_the_field_as_invalid()
    {
        var cut = Render<QuantityField>(p => p.Add(f => f.Path, "a").Add(f => f.Text, "72 °C").Add(f => f.Faults, [Backwards with { IsWarning = true }]));
        Assert.Equal("false", cut.Find("input").GetAttribute("aria-invalid"));
        Assert.NotNull(cut.Find(".doubt"));
    }

    [Fact]
    public void A_change_from_outside_replaces_the_text()
    {
        var cut = Render<QuantityField>(p => p.Add(f => f.Path, "a").Add(f => f.Text, "10 m"));
        cut.Find("input").Input("12 m");
        cut.Render(p => p.Add(f => f.Text, "10 m"));
        Assert.Equal("10 m", cut.Find("input").GetAttribute("value"));
    }
}
