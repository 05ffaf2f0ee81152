using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Documents;

/// <summary>Values of a document's fields by path, in SI; where a field could not be read, it says so.</summary>
public sealed class FieldValues
{
    private readonly Dictionary<string, double> numbers = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> texts = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string[]> items = new(StringComparer.Ordinal);
    private readonly HashSet<string> groups = new(StringComparer.Ordinal);
    private readonly HashSet<string> unread = new(StringComparer.Ordinal);
    private readonly SortedDictionary<string, DefaultUsed> defaults = new(StringComparer.Ordinal);

    /// <summary>Paths that were given and could not be read, or are required and missing.</summary>
    public IReadOnlySet<string> Unread => unread;

    /// <summary>Stated defaults that stand in, by path.</summary>
    public IReadOnlyDictionary<string, DefaultUsed> Defaults => defaults;

    /// <summary>A number; NaN where it is absent or could not be read.</summary>
    public double Number(string path) => numbers.GetValueOrDefault(path, double.NaN);

    /// <summary>A number that may be absent: null where it is, NaN where it could not be read.</summary>
    public double? NumberOrNone(string path) => numbers.TryGetValue(path, out var value) ? value : unread.Contains(path) ? double.NaN : null;

    /// <summary>A text; empty where it is absent or could not be read.</summary>
    public string Text(string path) => texts.GetValueOrDefault(path, "");

    /// <summary>A whole number; 0 where it is absent or could not be read.</summary>
    public int Whole(string path) => numbers.TryGetValue(path, out var value) ? (int)value : 0;

    /// <summary>True where a value was read at the path.</summary>
    public bool Has(string path) => numbers.ContainsKey(path) || texts.ContainsKey(path);

    /// <summary>True where the group is in the document.</summary>
    public bool HasGroup(string path) => groups.Contains(path);

    /// <summary>Paths of a list's items, in order.</summary>
    public IReadOnlyList<string> Items(string listPath) => items.GetValueOrDefault(listPath, []);

    internal void Put(string path, double value) => numbers[path] = value;

    internal void Put(string path, string text) => texts[path] = text;

    internal void PutItems(string listPath, string[] paths) => items[listPath] = paths;

    internal void PutGroup(string path) => groups.Add(path);

    internal void Miss(string path) => unread.Add(path);

    /// <summary>Notes that a stated default stands in.</summary>
    internal void Default(string path, string text, string reason) => defaults[path] = new DefaultUsed(path, text, reason);

    /// <summary>Takes a default back that something else makes needless.</summary>
    internal void Undefault(string path) => defaults.Remove(path);
}

/// <summary>A stated default that stands in where nobody gave a value.</summary>
/// <param name="Path">Path of the field.</param>
/// <param name="Text">The value as text with its unit.</param>
/// <param name="Reason">Why, a sentence.</param>
public sealed record DefaultUsed(string Path, string Text, string Reason);
