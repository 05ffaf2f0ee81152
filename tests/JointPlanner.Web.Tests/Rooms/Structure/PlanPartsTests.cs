using Bunit;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>Adding and taking out, through the buttons of the ledger.</summary>
public sealed class PlanPartsTests : LedgerTest
{
    [Theory]
    [InlineData("Add support", ".band-supports", "supports")]
    [InlineData("Add segment", ".band-segments", "segments")]
    [InlineData("Add joint", ".band-joints", "joints")]
    public void A_part_is_added_with_a_fresh_id_says_what_it_needs_and_is_taken_back(string label, string band, string list)
    {
        var cut = Ledger();
        var (before, count) = (Bench.Document.ToJson(), Bench.Document.Items(list).Count);
        Button(cut, label, band).Click();
        var added = Bench.Document.Items(list)[^1];
        Assert.Equal(count + 1, Bench.Document.Items(list).Count);
        cut.WaitForElement($"[data-column='{list}/{added}'] .fault");
        cut.InvokeAsync(Bench.Undo);
        cut.WaitForAssertion(() => Assert.Empty(Bench.Outcome.Faults));
        Assert.Equal(before, Bench.Document.ToJson());
    }

    [Fact]
    public void A_line_of_bearings_is_added_on_its_support()
    {
        var cut = Ledger(Viaduct);
        var support = Bench.Document.Items("supports")[1];
        var before = Bench.Document.Items("bearings").Count;
        Button(cut, "add a line of bearings", $"[data-column='supports/{support}']").Click();
        Assert.Equal(before + 1, Bench.Document.Items("bearings").Count);
        Assert.Equal(support, Bench.Document.TextAt($"bearings/{Bench.Document.Items("bearings")[^1]}/on"));
    }

    [Fact]
    public void What_others_refer_to_is_taken_out_only_after_saying_what_goes_with_it()
    {
        var cut = Ledger();
        var before = Bench.Document.ToJson();
        Button(cut, "Take out Support Abutment 1").Click();
        Assert.Equal("With it goes bearing line B1. Joint J1 names it and must then be told another body. Undo brings everything back.", Words(cut.Find(".take-out p")));
        Assert.Equal(before, Bench.Document.ToJson());
        Button(cut, "Keep Support Abutment 1").Click();
        Assert.Empty(cut.FindAll(".take-out"));
        Assert.Equal(before, Bench.Document.ToJson());
    }

    [Fact]
    public void What_stays_behind_says_beside_its_field_that_its_body_is_gone()
    {
        var cut = Ledger();
        Button(cut, "Take out Support Abutment 1").Click();
        Button(cut, "Take out all the same").Click();
        var says = Words(Beside(cut, "joints/j1/near"));
        Assert.Contains("there is no “a1” among the supports and segments", says, StringComparison.Ordinal);
        Assert.Contains("Allowed: a4, deck, p2, p3.", says, StringComparison.Ordinal);
        Assert.DoesNotContain("b1", Bench.Document.Items("bearings"));
    }

    [Fact]
    public void A_line_that_carries_nothing_else_goes_at_once()
    {
        var cut = Ledger();
        Button(cut, "Take out bearing line B4").Click();
        Assert.Equal(["b1", "b2", "b3"], Bench.Document.Items("bearings"));
    }

    [Fact]
    public void Given_movements_go_with_their_joint()
    {
        var cut = Ledger();
        Button(cut, "Take out Joint J1").Click();
        Assert.StartsWith("With it go given movements m-j1-1, ", Words(cut.Find(".take-out p")), StringComparison.Ordinal);
        Button(cut, "Take out all the same").Click();
        Assert.All(Bench.Document.Items("movements"), m => Assert.Equal("j4", Bench.Document.TextAt($"movements/{m}/joint")));
    }

    [Fact]
    public void Every_field_of_a_plan_can_be_written_on_the_page()
    {
        // Each list has an item, each group something in it, so that every field has its place.
        Ledger(Viaduct);
        var plan = PlanFields.Table.Fields.Where(f => f.Entry is ListEntry && !Bench.Document.Items(Concrete(f.Pattern)).Any())
            .Aggregate(Bench.Document, (p, f) => p.WithItem(Concrete(f.Pattern), "x").Document);
        plan = plan.With($"bearings/{plan.Items("bearings")[0]}/kind", "elastomeric");
        foreach (var segment in plan.Items("segments"))
            foreach (var word in new[] { "creep", "shrinkage" })
                plan = plan.With($"segments/{segment}/{word}/strain", "100 µε").WithItem($"segments/{segment}/{word}/development", "").Document;
        foreach (var joint in plan.Items("joints")) plan = plan.With($"joints/{joint}/setting/least-deck-age", "28 d");
        Open(plan.With("basis/profile", "x").With("climate/zone", "x"));
        var written = Shown<Web.Rooms.Structure.BenchView>(_ => { }).FindAll("[data-path]:is(input, select)").Select(f => PlanFields.Table.PatternOf(f.GetAttribute("data-path")!)).ToHashSet();
        Bench.Dispose();
        Ledger();
        written.UnionWith(Render<Microsoft.AspNetCore.Components.CascadingValue<Web.Rooms.Structure.Workbench>>(p => p.Add(c => c.Value, Bench).AddChildContent<Web.Rooms.Structure.BenchView>())
            .FindAll("[data-path]:is(input, select)").Select(f => PlanFields.Table.PatternOf(f.GetAttribute("data-path")!)));

        // The file's own marks, ids fixed once issued, and the joint of a movement, which is the one it stands under.
        string[] notWritten = ["schema", "supports/*/id", "segments/*/id", "bearings/*/id", "joints/*/id", "movements/*/id", "movements/*/joint",
            "setting-day/methods/*/id", "setting-day/points/*/id"];
        var missing = PlanFields.Table.Fields.Where(f => f.Entry is not (GroupEntry or ListEntry)).Select(f => f.Pattern).Except(written);
        Assert.Equal(notWritten.Order(), missing.Order());

        string Concrete(string pattern) => pattern.Replace("segments/*", $"segments/{Bench.Document.Items("segments")[0]}", StringComparison.Ordinal);
    }
}
