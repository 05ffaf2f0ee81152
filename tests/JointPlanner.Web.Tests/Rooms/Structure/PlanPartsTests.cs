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
        Open(Viaduct);
        var plan = Filled(Bench.Document, "");
        plan = plan.With($"bearings/{plan.Items("bearings")[0]}/kind", "elastomeric").With("basis/profile", "x").With("climate/zone", "x");
        foreach (var joint in plan.Items("joints")) plan = plan.With($"joints/{joint}/setting/least-deck-age", "28 d").With($"joints/{joint}/setting/near-deck-age", "90 d").With($"joints/{joint}/setting/far-deck-age", "90 d");
        Open(plan.Without($"supports/{plan.Items("supports")[1]}/column"));
        var written = Shown<Web.Rooms.Structure.BenchView>(_ => { }).FindAll("[data-path]:is(input, select)").Select(f => PlanFields.Table.PatternOf(f.GetAttribute("data-path")!));

        // Ids are fixed once issued; the file says itself what it is; the joint of a movement is the one it stands under.
        var missing = PlanFields.Table.Fields.Where(f => f.Entry is not (GroupEntry or ListEntry or IdEntry)).Select(f => f.Pattern).Except(written);
        Assert.Equal(["movements/*/joint", "schema"], missing.Order());
    }

    /// <summary>Each list has an item, so that every field has its place.</summary>
    private static PlanDocument Filled(PlanDocument plan, string path)
    {
        foreach (var field in PlanFields.Table.In(path.Length == 0 ? "" : PlanFields.Table.PatternOf(path)))
        {
            var at = path.Length == 0 ? field.Word : $"{path}/{field.Word}";
            if (field.Entry is GroupEntry) plan = Filled(plan, at);
            if (field.Entry is not ListEntry) continue;
            if (plan.Items(at).Count == 0) plan = plan.WithItem(at, "x").Document;
            if (PlanFields.Table.Find($"{field.Pattern}/*") is null) plan = plan.Items(at).Aggregate(plan, (filled, item) => Filled(filled, $"{at}/{item}"));
        }

        return plan;
    }
}
