using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>One open structure: the document as typed, its past states, and what follows from it. Parts of the page read it and write through it.</summary>
public sealed class Workbench : IDisposable
{
    private readonly LiveCalculation<PlanDocument, Calculation> calculation;
    private readonly PlanHistory history;
    private StepPrinter? printer;
    private (Result? Of, IReadOnlyDictionary<string, Step>? Steps) keyed;
    private (IReadOnlyList<Step>? Steps, DisplayProfile? Profile) printed;

    /// <summary>Opens a document.</summary>
    /// <param name="document">As it was last saved.</param>
    /// <param name="known">Codes and rule sets to choose from.</param>
    /// <param name="compute">Reads and computes it.</param>
    /// <param name="isReadOnly">True where the person may look and not write.</param>
    public Workbench(PlanDocument document, KnownWords known, Func<PlanDocument, CancellationToken, Calculation> compute, bool isReadOnly)
    {
        (history, Known, IsReadOnly) = (new PlanHistory(document), known, isReadOnly);
        calculation = new LiveCalculation<PlanDocument, Calculation>(compute);
        Outcome = compute(document, CancellationToken.None);
        Drawn = Outcome.Reading.Plan;
    }

    /// <summary>Codes and rule sets to choose from.</summary>
    public KnownWords Known { get; }

    /// <summary>True where the person may look and not write.</summary>
    public bool IsReadOnly { get; }

    /// <summary>The document as typed.</summary>
    public PlanDocument Document => history.Current;

    /// <summary>What follows from it.</summary>
    public Calculation Outcome { get; private set; }

    /// <summary>The last plan that could be read: the drawing keeps it while something typed is still wrong.</summary>
    public Plan? Drawn { get; private set; }

    /// <summary>Everything computed; null while a fault stands in the way.</summary>
    public Result? Result => Outcome.Result;

    /// <summary>The number under a result key; null where there is none.</summary>
    public Number? Find(string key)
    {
        if (Result is not { } result) return null;
        if (!ReferenceEquals(keyed.Of, result)) keyed = (result, result.ByKey());
        return keyed.Steps!.TryGetValue(key, out var step) ? new(step.Index, step.Value) : null;
    }

    /// <summary>What undo would take back.</summary>
    public string? Undoable => history.Undoable;

    /// <summary>What redo would do again.</summary>
    public string? Redoable => history.Redoable;

    /// <summary>The number whose derivation is unfolded; null for none.</summary>
    public Unfolding? Unfolded { get; private set; }

    /// <summary>Told after each change of document, outcome or unfolded number.</summary>
    public event Action? Changed;

    /// <summary>Told after each change of the document, for saving.</summary>
    public event Action<PlanDocument>? Edited;

    /// <summary>Writes a field's text as typed.</summary>
    public Task Write(string path, string? text) => Take(Document.With(path, text), path);

    /// <summary>Whether the document has a place for a text at this path: a field of a plan, in an item that is still there.</summary>
    public bool CanHold(string path) =>
        PlanFields.Table.At(path) is { Entry: not (Exchange.Documents.GroupEntry or Exchange.Documents.ListEntry) }
        && (path.Split('/') is not [var list, var item, _, ..] || PlanFields.Table.At(list) is not { Entry: Exchange.Documents.ListEntry } || Document.Items(list).Contains(item));

    /// <summary>Takes a changed document.</summary>
    /// <param name="document">The document.</param>
    /// <param name="act">What was changed, for undo.</param>
    public async Task Take(PlanDocument document, string act)
    {
        if (IsReadOnly) return;
        history.Edit(document, act);
        await Recompute();
    }

    /// <summary>Ends a run of keys in one field.</summary>
    public void Pause() => history.Pause();

    /// <summary>Takes the last change back.</summary>
    public Task Undo()
    {
        if (Undoable is null) return Task.CompletedTask;
        history.Undo();
        return Recompute();
    }

    /// <summary>Does it again.</summary>
    public Task Redo()
    {
        if (Redoable is null) return Task.CompletedTask;
        history.Redo();
        return Recompute();
    }

    /// <summary>Ids of a list that were used at any time.</summary>
    public IEnumerable<string> UsedIds(string list) => history.UsedIds(list);

    /// <summary>Shows how a number came about, or folds it again.</summary>
    public void Unfold(int step)
    {
        if (Result is { } result && step >= 0) Unfold(new Unfolding(IdOf(step), result.Steps, [step], result.Steps[step].Meaning));
    }

    /// <summary>Shows how a number came about whose steps are not among those kept, or folds it again.</summary>
    public void Unfold(Unfolding number)
    {
        Unfolded = Unfolded?.Id == number.Id ? null : number;
        Changed?.Invoke();
    }

    /// <summary>Folds what is unfolded.</summary>
    public void Fold()
    {
        Unfolded = null;
        Changed?.Invoke();
    }

    /// <summary>True where this step is what is unfolded.</summary>
    public bool IsUnfolded(int step) => Unfolded?.Id == IdOf(step);

    /// <summary>Prints the unfolded steps in the reader's units.</summary>
    public StepPrinter Printer(DisplayProfile profile)
    {
        var steps = Unfolded?.Steps ?? Result?.Steps ?? [];
        if (printer is null || !ReferenceEquals(printed.Steps, steps) || printed.Profile != profile)
            (printer, printed) = (new StepPrinter(steps, profile), (steps, profile));
        return printer;
    }

    /// <inheritdoc/>
    public void Dispose() => calculation.Dispose();

    private async Task Recompute()
    {
        Edited?.Invoke(Document);
        if (await calculation.Newest(Document) is not { } outcome) return;
        Outcome = outcome;
        Drawn = outcome.Reading.Plan ?? Drawn;
        Unfolded = Unfolded is { Wanted: [var wanted] } open && open.Id == IdOf(wanted) ? Again(open.Steps[wanted]) : null;
        Changed?.Invoke();
    }

    // Steps are counted anew with each calculation: the same number is the one of the same key, else the one that stands in the same place and means the same.
    private Unfolding? Again(Step before)
    {
        var now = before.Key.Length > 0 ? Find(before.Key)?.Step : before.Index;
        return now is { } index && index < Result?.Steps.Count && Result.Steps[index].Meaning == before.Meaning && Result.Steps[index].Symbol == before.Symbol
            ? new Unfolding(IdOf(index), Result.Steps, [index], before.Meaning)
            : null;
    }

    private static string IdOf(int step) => FormattableString.Invariant($"step {step}");
}
