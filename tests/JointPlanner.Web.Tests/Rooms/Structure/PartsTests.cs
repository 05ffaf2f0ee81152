using Bunit;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Rooms.Structure.Ledger;
using JointPlanner.Web.Shell;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>The parts beside and below the ledger, each in its states.</summary>
public sealed class PartsTests : LedgerTest
{
    private const string LongName = "the one with the very long name that nobody ever shortened, because it has always been called so by everybody along the river";

    [Fact]
    public void Each_family_that_is_left_says_why_with_its_numbers()
    {
        var cut = Ledger();
        var fit = Bench.Result!.Joints[0].Fit!;
        Assert.Contains(fit.Families, f => f.Rejection is not null);
        foreach (var family in fit.Families)
        {
            var row = Words(cut.FindAll("#joint-j1 section:first-of-type tbody tr").First(r => Words(r).StartsWith(family.Family.Replace('-', ' '), StringComparison.Ordinal)));
            if (family.Rejection is { } left) Assert.Contains(Exchange.Printing.FindingText.Of(left, Preferences.Profile), row, StringComparison.Ordinal);
            else Assert.EndsWith("fits", row, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_rejection_is_told_in_the_units_chosen()
    {
        var cut = Ledger();
        Assert.Matches(@"No size of the strip seal fits.* \d+\.\d mm", Words(cut.Find("#joint-j1")));
        cut.InvokeAsync(() => Preferences.Choose(UnitProfile.Us));
        Assert.Matches(@"No size of the strip seal fits.* \d+\.\d+ in", Words(cut.Find("#joint-j1")));
    }

    [Fact]
    public void Without_an_owners_rules_the_page_says_where_to_choose_them()
    {
        var cut = Ledger(change: p => p["basis"]!.AsObject().Remove("owner-rules"));
        Assert.Contains("No owner's rule set is chosen", Words(cut.Find("#joint-j1")), StringComparison.Ordinal);
        Assert.Contains("choose an owner's rule set", Words(cut.Find("[data-column='joints/j1']")), StringComparison.Ordinal);
        Assert.Empty(cut.FindAll(".setting-table"));
    }

    [Fact]
    public void A_row_outside_the_temperatures_says_do_not_set_and_why_and_shows_no_number()
    {
        var cut = Ledger(change: p => p["setting-table"]!["to"] = "60 °C");
        var refused = cut.FindAll("#joint-j1 .setting-table tbody tr").Where(r => r.QuerySelector(".do-not-set") is not null).ToList();
        Assert.NotEmpty(refused);
        Assert.All(refused, row =>
        {
            Assert.Empty(row.QuerySelectorAll(".fact-number"));
            Assert.Matches("^do not set · .{20,}", Words(row.QuerySelector(".do-not-set")!));
        });
        Assert.Equal(Bench.Result!.Joints[0].Table!.Rows.Count(r => r.Set is null), refused.Count);
    }

    [Fact]
    public void A_share_bar_says_in_words_what_its_hatch_shows()
    {
        var rule = Held();
        var cut = Shown<ShareBar>(p => p.Add(b => b.Rule, rule));
        Assert.Equal($"{Exchange.Printing.NumberText.WithUnit(rule.Room, rule.Quantity, Preferences.Profile)} left · {rule.Name}", Words(cut.Find(".share-words")));
        Assert.Matches(@"width: \d+(\.\d)?%", cut.Find(".share-used").GetAttribute("style")!);
        Assert.Equal("does not hold · " + rule.Name, Words(Shown<ShareBar>(p => p.Add(b => b.Rule, rule with { Room = -0.001, Share = 1.2 })).Find(".share-words")));
        Assert.Empty(Shown<ShareBar>(p => p.Add(b => b.Rule, rule with { Share = null })).FindAll(".share"));
    }

    [Fact]
    public void Every_default_that_stands_in_is_listed_with_its_reason()
    {
        var cut = Part<DefaultsPanel>(_ => { }, change: p => p["joints"]![0]!.AsObject().Remove("skew"));
        Assert.Equal($"Defaults that stand in: {Bench.Outcome.Reading.Defaults.Length}", Words(cut.Find("h2")));
        var row = cut.FindAll("tbody tr").Select(Words).Single(r => r.StartsWith("J1: skew", StringComparison.Ordinal));
        Assert.Equal("J1: skew0°no skew is given: taken as square", row);
    }

    [Fact]
    public void Findings_stand_with_the_gravest_first_and_say_in_words_how_grave()
    {
        var cut = Part<FindingsPanel>(_ => { }, change: p => p["movements"]!.AsArray().RemoveAt(0));
        var said = cut.FindAll(".finding strong").Select(Words).ToList();
        Assert.Equal("stops issue", said[0]);
        Assert.Equal(Bench.Result!.Findings.Count, said.Count);
        Assert.Contains("Not included at joint j1: live load", Words(cut.Find(".finding")), StringComparison.Ordinal);
    }

    [Fact]
    public void A_movement_that_is_not_included_yet_is_given_by_one_press_and_asks_for_its_source()
    {
        var cut = Ledger(change: p => p["movements"]!.AsArray().RemoveAt(0));
        Button(cut, "Give live load", "#joint-j1").Click();
        var added = Bench.Document.Items("movements")[^1];
        Assert.Equal(("j1", "live-load"), (Bench.Document.TextAt($"movements/{added}/joint"), Bench.Document.TextAt($"movements/{added}/cause")));
        Assert.Contains("Give it", Words(Beside(cut, $"movements/{added}/opens-by")), StringComparison.Ordinal);
        Type(cut, $"movements/{added}/opens-by", "1 mm");
        Type(cut, $"movements/{added}/closes-by", "1 mm");
        Type(cut, $"movements/{added}/source", "designer's estimate");
        cut.WaitForElement("#joint-j1 .setting-table");
        Assert.DoesNotContain(cut.FindAll("button"), b => Words(b) == "Give live load");
    }

    [Fact]
    public void A_choice_of_ones_own_keeps_its_fields_until_the_reason_is_given()
    {
        var cut = Ledger();
        Choose(cut, "joints/j1/choice/family", "modular");
        Assert.Contains("nothing is given", Words(Beside(cut, "joints/j1/choice/reason")), StringComparison.Ordinal);
        Type(cut, "joints/j1/choice/reason", "spare parts of this family are held nearby");
        cut.WaitForAssertion(() => Assert.StartsWith("modular · taken", Words(cut.Find("#joint-j1 tr.taken")), StringComparison.Ordinal));
        Assert.EndsWith("spare parts of this family are held nearby", Words(cut.Find("#joint-j1 tr.taken")), StringComparison.Ordinal);
    }

    [Fact]
    public void A_cell_without_a_value_shows_a_dash_that_is_read_as_none()
    {
        Open();
        var cut = Shown<Fact>(p => p.Add(f => f.Number, null).Add(f => f.Quantity, Engine.Formulas.Quantity.Movement));
        Assert.Equal(("–", "none"), (Words(cut.Find(".fact-none")), cut.Find(".fact-none").GetAttribute("aria-label")));
    }

    [Fact]
    public void While_a_fault_stands_in_the_way_columns_and_drawing_stay_and_no_figure_is_shown()
    {
        var cut = Ledger();
        var columns = cut.FindAll(".column").Count;
        Type(cut, "supports/p2/station", "forty-two");
        Beside(cut, "supports/p2/station");
        Assert.Equal(columns, cut.FindAll(".column").Count);
        Assert.Equal(2, cut.FindAll(".ledger-elevation svg").Count);
        Assert.Empty(cut.FindAll(".fact-number"));
    }

    [Fact]
    public void A_long_name_stays_whole_on_its_column_and_in_its_field()
    {
        var cut = Ledger(change: p => p["supports"]![1]!["mark"] = LongName);
        Assert.Equal(LongName, Words(cut.Find("[data-column='supports/p2'] .column-mark")));
        Assert.Equal(LongName, cut.Find("input[data-path='supports/p2/mark']").GetAttribute("value"));
    }

    [Fact]
    public void A_value_typed_in_other_units_is_shown_beside_as_it_was_understood()
    {
        var cut = Part<PlanField>(p => p.Add(f => f.Path, "supports/p2/station"), change: p => p["supports"]![1]!["station"] = "12 ft 6 1/2 in");
        Assert.Equal("12 ft 6 1/2 in", cut.Find("input").GetAttribute("value"));
        Assert.Equal("= 3.823 m", Words(cut.Find(".understood")));
        cut.InvokeAsync(() => Preferences.Choose(UnitProfile.Us));
        Assert.Equal("12 ft 6 1/2 in", cut.Find("input").GetAttribute("value"));
    }

    [Fact]
    public void A_default_stands_in_the_empty_field_and_says_that_it_is_one()
    {
        var cut = Part<PlanField>(p => p.Add(f => f.Path, "supports/a1/stiffness"), change: p => p["supports"]![0]!.AsObject().Remove("stiffness"));
        Assert.Equal(("", "rigid (default)"), (cut.Find("input").GetAttribute("value") ?? "", cut.Find("input").GetAttribute("placeholder")));
    }

    [Fact]
    public void Whoever_may_only_look_finds_no_way_to_write()
    {
        var cut = Ledger(isReadOnly: true);
        Assert.All(cut.FindAll("input[data-path]"), f => Assert.True(f.HasAttribute("readonly")));
        Assert.All(cut.FindAll("select[data-path]"), f => Assert.True(f.HasAttribute("disabled")));
        string[] ways = ["take out", "Add", "add", "Give"];
        Assert.DoesNotContain(cut.FindAll("button"), b => ways.Any(w => Words(b).StartsWith(w, StringComparison.Ordinal)));
    }

    [Fact]
    public void A_slider_travels_and_a_fixed_line_holds_in_their_own_words()
    {
        var cut = Ledger();
        Assert.Contains("travels", Words(cut.Find("[data-column='supports/a1'] .travel")), StringComparison.Ordinal);
        Assert.Contains("holds", Words(cut.Find("[data-column='supports/p2'] .travel")), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Typing_in_one_field_is_taken_back_as_a_whole_and_done_again()
    {
        const string path = "supports/p2/station";
        var cut = Ledger();
        foreach (var text in new[] { "4", "45", "45 ", "45 m" }) Type(cut, path, text);
        cut.WaitForAssertion(() => Assert.Equal(45, Bench.Outcome.Reading.Plan?.Supports[1].Station));
        await cut.InvokeAsync(Bench.Pause);
        await cut.InvokeAsync(Bench.Undo);
        cut.WaitForAssertion(() => Assert.Equal("42 m", Shown(cut)));
        await cut.InvokeAsync(Bench.Redo);
        cut.WaitForAssertion(() => Assert.Equal("45 m", Shown(cut)));
        Assert.Equal(path, Bench.Undoable);

        static string? Shown(IRenderedComponent<BenchView> cut) => cut.Find($"input[data-path='{path}']").GetAttribute("value");
    }

    [Fact]
    public void The_set_opening_names_temperature_and_direction_of_measure()
    {
        var cut = Part<SetFact>(_ => { });
        Assert.Equal("", cut.Markup.Trim());
        cut = Shown<SetFact>(p => p.Add(f => f.Joint, Bench.Result!.Joints[0]));
        Assert.Matches(@"^\d+\.\d mm at 10\.0 °C, normal to the joint\s*setting table$", Words(cut.Nodes[0].ParentElement!));
    }

    private Engine.Fitting.Joints.RuleCheck Held()
    {
        Open();
        return Bench.Result!.Joints[0].Fit!.Chosen!.Governing!;
    }
}
