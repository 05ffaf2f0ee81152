using System.Collections.Immutable;

namespace JointPlanner.Exchange.Documents;

/// <summary>Every field of one kind of document, in the order in which they are written.</summary>
public sealed class FieldTable
{
    private readonly Dictionary<string, Field> byPattern;
    private readonly ILookup<string, Field> byParent;

    /// <summary>A table.</summary>
    /// <param name="kind">What the document is called in its schema, without the major number, for instance joint-plan.</param>
    /// <param name="major">Its major number.</param>
    /// <param name="fields">The fields.</param>
    public FieldTable(string kind, int major, ImmutableArray<Field> fields)
    {
        (Kind, Major, Fields) = (kind, major, fields);
        byPattern = fields.ToDictionary(f => f.Pattern, StringComparer.Ordinal);
        byParent = fields.Where(f => f.Word != "*").ToLookup(f => f.Pattern.Contains('/', StringComparison.Ordinal) ? f.Pattern[..f.Pattern.LastIndexOf('/')] : "", StringComparer.Ordinal);
    }

    /// <summary>What the document is called in its schema, without the major number.</summary>
    public string Kind { get; }

    /// <summary>Its major number.</summary>
    public int Major { get; }

    /// <summary>The whole schema word, for instance joint-plan/1.</summary>
    public string Schema => FormattableString.Invariant($"{Kind}/{Major}");

    /// <summary>The fields.</summary>
    public ImmutableArray<Field> Fields { get; }

    /// <summary>Fields of the group with this pattern; the empty pattern is the document itself.</summary>
    public IEnumerable<Field> In(string pattern) => byParent[pattern];

    /// <summary>The field with this pattern; null where there is none.</summary>
    public Field? Find(string pattern) => byPattern.GetValueOrDefault(pattern);

    /// <summary>The field at a path of the document; null where there is none.</summary>
    public Field? At(string path) => Find(PatternOf(path));

    /// <summary>The pattern of a path: ids of items become *.</summary>
    public string PatternOf(string path)
    {
        var pattern = "";
        foreach (var part in path.Split('/'))
        {
            var isItem = Find(pattern) is { Entry: ListEntry };
            pattern = pattern.Length == 0 ? part : $"{pattern}/{(isItem ? "*" : part)}";
        }
        return pattern;
    }

    /// <summary>True where the list's items have ids of their own; else they go by their number, as #1.</summary>
    public bool ItemsHaveIds(string listPattern) => Find($"{listPattern}/*/id") is not null;
}
