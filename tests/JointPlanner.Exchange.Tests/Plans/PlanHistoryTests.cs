using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class PlanHistoryTests
{
    private static PlanDocument Named(PlanDocument document, string name) => document.With("structure/name", name);

    [Fact]
    public void Undo_takes_back_a_field_as_a_whole_and_redo_brings_it_again()
    {
        var start = TestPlans.Document(TestPlans.Least);
        var history = new PlanHistory(start);
        foreach (var typed in new[] { "A", "Ab", "Abc" }) history.Edit(Named(history.Current, typed), "structure/name");
        history.Edit(history.Current.With("joints/j1/skew", "10°"), "joints/j1/skew");
        Assert.Equal("joints/j1/skew", history.Undoable);

        history.Undo();
        Assert.Equal(("Abc", null), (history.Current.TextAt("structure/name"), history.Current.TextAt("joints/j1/skew")));
        history.Undo();
        Assert.Equal(start.ToJson(), history.Current.ToJson());
        Assert.Null(history.Undoable);
        history.Redo();
        history.Redo();
        Assert.Equal(("Abc", "10°"), (history.Current.TextAt("structure/name"), history.Current.TextAt("joints/j1/skew")));
        Assert.Null(history.Redoable);
    }

    [Fact]
    public void Leaving_a_field_ends_a_run_of_edits()
    {
        var history = new PlanHistory(TestPlans.Document(TestPlans.Least));
        history.Edit(Named(history.Current, "first"), "structure/name");
        history.Pause();
        history.Edit(Named(history.Current, "second"), "structure/name");

        history.Undo();

        Assert.Equal("first", history.Current.TextAt("structure/name"));
    }

    [Fact]
    public void An_edit_after_undo_forgets_what_was_undone_but_not_its_ids()
    {
        var history = new PlanHistory(TestPlans.Document(TestPlans.Least));
        history.Edit(history.Current.WithItem("supports", "p").Document, "supports");
        history.Undo();
        history.Edit(Named(history.Current, "other"), "structure/name");

        history.Redo();

        Assert.Equal("other", history.Current.TextAt("structure/name"));
        Assert.DoesNotContain("p1", history.Current.Items("supports"));
        Assert.Contains("p1", history.UsedIds("supports"));
    }

    [Fact]
    public void At_most_500_states_are_kept()
    {
        var history = new PlanHistory(TestPlans.Document(TestPlans.Least));
        for (var i = 0; i < PlanHistory.Depth + 100; i++) history.Edit(Named(history.Current, $"name {i}"), $"act {i}");

        var undone = 0;
        for (; history.Undoable is not null; undone++) history.Undo();

        Assert.Equal(PlanHistory.Depth, undone);
    }
}
