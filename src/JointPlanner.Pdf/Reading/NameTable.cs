namespace JointPlanner.Pdf.Reading;

/// <summary>Keeps each different name of a file once.</summary>
internal sealed class NameTable
{
    /// <summary>Longest name accepted, in bytes; ISO 32000-1, Annex C gave 127.</summary>
    public const int Longest = 127;

    private readonly HashSet<string> _names = [];

    public string Of(ReadOnlySpan<char> name, ReadingBudget budget)
    {
        if (_names.GetAlternateLookup<ReadOnlySpan<char>>().TryGetValue(name, out string? known)) return known;
        budget.KeepText(2 * name.Length);
        string text = name.ToString();
        _names.Add(text);
        return text;
    }
}
