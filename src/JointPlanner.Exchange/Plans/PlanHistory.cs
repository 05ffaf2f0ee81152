using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>The states a plan has been through while being edited: undo and redo.</summary>
public sealed class PlanHistory
{
    /// <summary>How many states are kept.</summary>
    public const int Depth = 500;

    private readonly LinkedList<(PlanDocument Document, string Act)> undone = new(), done = new();
    private readonly HashSet<(string List, string Id)> forgotten = [];
    private bool isPaused;

    /// <summary>A history that starts with a document.</summary>
    public PlanHistory(PlanDocument start) => Current = start;

    /// <summary>The document as it stands.</summary>
    public PlanDocument Current { get; private set; }

    /// <summary>What undo would take back; null where there is nothing.</summary>
    public string? Undoable => done.Last?.Value.Act;

    /// <summary>What redo would do again; null where there is nothing.</summary>
    public string? Redoable => undone.Last?.Value.Act;

    /// <summary>
    /// Notes an edit. Edits that follow one another with the same act, as keys typed into one field, are taken back together.
    /// </summary>
    /// <param name="document">The document after the edit.</param>
    /// <param name="act">What was edited, for instance the path of the field.</param>
    public void Edit(PlanDocument document, string act)
    {
        if (ReferenceEquals(document, Current)) return;
        if (isPaused || done.Last?.Value.Act != act || undone.Count > 0) done.AddLast((Current, act));
        isPaused = false;
        if (done.Count > Depth) Forget(done.First!);
        while (undone.First is { } first) Forget(first);
        Current = document;
    }

    /// <summary>Ends a run of edits, so that the next one is taken back by itself; called when a field is left.</summary>
    public void Pause() => isPaused = true;

    /// <summary>Takes the last edit back; does nothing where there is none.</summary>
    public void Undo() => Move(done, undone);

    /// <summary>Does the edit again that was taken back last; does nothing where there is none.</summary>
    public void Redo() => Move(undone, done);

    /// <summary>Ids that any state of this history has had, so that none is given twice.</summary>
    public IEnumerable<string> UsedIds(string listPath) =>
        done.Concat(undone).Select(s => s.Document).Append(Current).SelectMany(d => d.Items(listPath))
            .Concat(forgotten.Where(f => f.List == listPath).Select(f => f.Id)).Distinct();

    private void Forget(LinkedListNode<(PlanDocument Document, string Act)> state)
    {
        foreach (var list in PlanFields.Table.Fields.Where(f => f.Entry is ListEntry && PlanFields.Table.ItemsHaveIds(f.Pattern)).Select(f => f.Pattern))
            foreach (var id in state.Value.Document.Items(list))
                forgotten.Add((list, id));
        state.List!.Remove(state);
    }

    private void Move(LinkedList<(PlanDocument Document, string Act)> from, LinkedList<(PlanDocument Document, string Act)> to)
    {
        if (from.Last is not { } last) return;
        from.RemoveLast();
        to.AddLast((Current, last.Value.Act));
        Current = last.Value.Document;
    }
}
