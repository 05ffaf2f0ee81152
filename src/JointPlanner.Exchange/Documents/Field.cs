using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Documents;

/// <summary>One field of a document, said once: reader, schema and screen read it here.</summary>
/// <param name="Pattern">Path with * for an item's id, for instance joints/*/setting/temperature.</param>
/// <param name="Name">What people call it.</param>
/// <param name="Entry">What may stand in it.</param>
/// <param name="Meaning">What it means, a sentence.</param>
public sealed record Field(string Pattern, string Name, Entry Entry, string Meaning)
{
    /// <summary>True where something must be given whenever the group around it is.</summary>
    public bool IsRequired { get; init; }

    /// <summary>Text that stands in where nothing is given; null where nothing does.</summary>
    public string? Default { get; init; }

    /// <summary>Why that is the default, a sentence that the result prints.</summary>
    public string DefaultReason { get; init; } = "";

    /// <summary>A few words for a small screen: what to type.</summary>
    public string Hint { get; init; } = "";

    /// <summary>Last part of the pattern: its name in the file.</summary>
    public string Word => Pattern[(Pattern.LastIndexOf('/') + 1)..];
}

/// <summary>What may stand in a field.</summary>
public abstract record Entry;

/// <summary>Lowest and highest, as texts with their unit.</summary>
/// <param name="Low">Lowest.</param>
/// <param name="High">Highest.</param>
public sealed record Extent(string Low, string High);

/// <summary>A quantity with its unit.</summary>
/// <param name="Kind">Kind of quantity.</param>
/// <param name="Allowed">What is allowed; beyond it is a fault.</param>
public sealed record QuantityEntry(Quantity Kind, Extent Allowed) : Entry
{
    private readonly (double Low, double High) allowed = BoundsOf(Allowed, Kind);
    private readonly (double Low, double High) usual;

    /// <summary>What is usual; beyond it is a warning. Null where there is none.</summary>
    public Extent? Usual
    {
        get;
        init => (field, usual) = (value, value is null ? default : BoundsOf(value, Kind));
    }

    /// <summary>True where the value, in SI, is allowed.</summary>
    public bool Allows(double value) => value >= allowed.Low && value <= allowed.High;

    /// <summary>True where the value, in SI, is usual, or nothing is said about what is.</summary>
    public bool IsUsual(double value) => Usual is null || (value >= usual.Low && value <= usual.High);

    /// <summary>A word that may stand instead of a quantity; empty for none.</summary>
    public string OrWord { get; init; } = "";

    /// <summary>A bound in SI.</summary>
    public double ValueOf(string bound) => ValueOf(bound, Kind);

    private static (double, double) BoundsOf(Extent extent, Quantity kind) => (ValueOf(extent.Low, kind), ValueOf(extent.High, kind));

    private static double ValueOf(string bound, Quantity kind) => QuantityText.Parse(bound, kind) is { Fault: null } read
        ? read.Value
        : throw new InvalidOperationException($"“{bound}” is not {UnitTable.Of(kind).Words}.");
}

/// <summary>A plain number: a factor or a share.</summary>
/// <param name="Low">Lowest allowed.</param>
/// <param name="High">Highest allowed.</param>
public sealed record RatioEntry(double Low, double High) : Entry;

/// <summary>A whole number of things.</summary>
/// <param name="Low">Lowest allowed.</param>
/// <param name="High">Highest allowed.</param>
public sealed record CountEntry(int Low, int High) : Entry;

/// <summary>Words of the person's own.</summary>
/// <param name="Longest">Longest text, characters.</param>
public sealed record TextEntry(int Longest) : Entry;

/// <summary>One of a list of words.</summary>
/// <param name="Words">The words.</param>
public sealed record WordEntry(ImmutableArray<string> Words) : Entry;

/// <summary>A word that something outside the document knows, for instance the id of a code edition; checked there.</summary>
/// <param name="Of">What the word names: code, profile, zone, owner-rules, family, time-zone.</param>
public sealed record OutsideWordEntry(string Of) : Entry;

/// <summary>The id of the item it stands in: 1 to 24 small letters, digits and hyphens.</summary>
public sealed record IdEntry : Entry;

/// <summary>The id of another item of the document.</summary>
/// <param name="Lists">Lists in which the id may be.</param>
public sealed record ReferenceEntry(ImmutableArray<string> Lists) : Entry;

/// <summary>The word false and nothing else.</summary>
public sealed record FalseEntry : Entry;

/// <summary>true or false.</summary>
public sealed record TruthEntry : Entry;

/// <summary>A group of fields.</summary>
public sealed record GroupEntry : Entry
{
    /// <summary>True where the fields inside are looked at, and their defaults used, though the group is not there.</summary>
    public bool IsAlwaysThere { get; init; }
}

/// <summary>Parts whose names depend on something else; read by whoever knows the names.</summary>
public sealed record OpenGroupEntry : Entry;

/// <summary>A list.</summary>
/// <param name="Fewest">Fewest items.</param>
/// <param name="Most">Most items.</param>
/// <param name="Item">What people call one item.</param>
public sealed record ListEntry(int Fewest, int Most, string Item) : Entry
{
    /// <summary>Why there must be so many, a sentence; empty where none are needed.</summary>
    public string WhyFewest { get; init; } = "";
}
