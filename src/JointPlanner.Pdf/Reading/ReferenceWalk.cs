namespace JointPlanner.Pdf.Reading;

/// <summary>Lists the references that a value holds, and the objects that can be reached from it.</summary>
internal static class ReferenceWalk
{
    public static IEnumerable<PdfReference> In(PdfValue value)
    {
        var open = new Stack<PdfValue>();
        open.Push(value);
        while (open.TryPop(out var next))
            switch (next)
            {
                case PdfReference reference: yield return reference; break;
                case PdfArray array: foreach (var item in array.Items) open.Push(item); break;
                case PdfDictionary dictionary: foreach (var item in dictionary.Entries.Values) open.Push(item); break;
                case PdfStream stream: open.Push(stream.Dictionary); break;
                default: break;
            }
    }

    /// <summary>Object numbers reached from the value, stopping at numbers for which <paramref name="enter"/> says no.</summary>
    public static HashSet<int> Reached(RevisionView view, ReadingBudget budget, PdfValue from, Func<int, bool> enter)
    {
        var reached = new HashSet<int>();
        var open = new Stack<PdfValue>();
        open.Push(from);
        while (open.TryPop(out var value))
            foreach (var reference in In(value))
            {
                budget.Work(1);
                if (!enter(reference.Number) || !reached.Add(reference.Number)) continue;
                if (view.Object(reference.Number) is { } found) open.Push(found.Value);
            }
        return reached;
    }
}
