using System.Collections.Immutable;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.OwnerRules;

namespace JointPlanner.Issuing;

/// <summary>The owners' rule sets that an installation knows: one file each in a folder, read once.</summary>
public sealed class OwnerRuleShelf
{
    private readonly ImmutableSortedDictionary<string, OwnerRulesReading> sets;

    /// <summary>A shelf without any.</summary>
    public static readonly OwnerRuleShelf Empty = new([]);

    /// <summary>A shelf of readings.</summary>
    public OwnerRuleShelf(IEnumerable<OwnerRulesReading> readings) =>
        sets = readings.Where(r => r.Rules is not null).ToImmutableSortedDictionary(r => r.Rules!.Id, r => r, StringComparer.Ordinal);

    /// <summary>Reads every rule-set file of a folder.</summary>
    /// <exception cref="InvalidDataException">A file is no rule set; the message names file and first fault.</exception>
    public static OwnerRuleShelf Read(string folder) => new(Directory.EnumerateFiles(folder, "*.json").Order(StringComparer.Ordinal).Select(file =>
    {
        var reading = OwnerRulesReader.Read(File.ReadAllBytes(file));
        return reading.Rules is not null ? reading : throw new InvalidDataException(
            $"{Path.GetFileName(file)} is no owner's rule set: {reading.Faults[0].Path}: {reading.Faults[0].Wrong} {reading.Faults[0].Remedy}");
    }));

    /// <summary>Ids in order.</summary>
    public IReadOnlyCollection<string> Ids => [.. sets.Keys];

    /// <summary>The rule set with this id, or null.</summary>
    public OwnerRulesReading? Find(string id) => sets.GetValueOrDefault(id);

    /// <summary>Id and name of each, for choosing.</summary>
    public IEnumerable<(string Id, string Name)> Names => sets.Values.Select(r => (r.Rules!.Id, r.Rules.Name));

    /// <summary>The document of a rule set, by value for a package; null for none.</summary>
    public MapNode? DocumentOf(string id) => Find(id)?.Root;
}
