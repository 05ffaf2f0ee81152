using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Web.Rooms.Structure;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>What keeps a beginning from giving a setting table, sorted by the entry that it belongs to.</summary>
public sealed class BeginningFaults
{
    // The first place that a path belongs to takes it; the end of the path tells more than its start.
    private static readonly (string Field, Func<string, bool> Takes)[] Places =
    [
        ("name", path => path == "structure/name"), ("number", path => path == "structure/number"), ("place", path => path == "structure/place"),
        ("time-zone", path => path == "structure/time-zone"), ("code", path => path == "basis/code"), ("owner-rules", path => path == "basis/owner-rules"),
        ("pad-count", Ends("pads/count")), ("pad-modulus", Ends("shear-modulus")), ("pad-area", Ends("plan-area")), ("pad-thickness", Ends("elastomer-thickness")),
        ("skew", Ends("/skew")), ("deck-age", Ends("deck-age")), ("strain", Ends("/strain")), ("strain-source", Ends("shrinkage/source")),
        ("set-at", Ends("setting/temperature")), ("zone", path => path == "climate/zone"), ("lowest", Ends("-min")), ("highest", Ends("-max")), ("lowest", path => path.StartsWith("climate", StringComparison.Ordinal)),
        ("stations", path => path.StartsWith("supports", StringComparison.Ordinal) || path.StartsWith("segments", StringComparison.Ordinal)),
    ];

    private readonly ILookup<string, string> byField;

    private BeginningFaults(IEnumerable<(string Field, string Sentence)> faults) => byField = faults.Distinct().ToLookup(f => f.Field, f => f.Sentence);

    internal static readonly BeginningFaults None = new([]);

    /// <summary>How many sentences there are in all.</summary>
    internal int Count => byField.SelectMany(group => group).Count();

    /// <summary>What belongs to one entry.</summary>
    internal IReadOnlyList<string> At(string field) => [.. byField[field].Take(2)];

    /// <summary>What belongs to none of them.</summary>
    internal IReadOnlyList<string> Elsewhere => At("");

    /// <param name="beginning">What was typed.</param>
    /// <param name="desk">Reads and computes it.</param>
    /// <param name="hasZones">Whether the page asks for a climate zone and not for temperatures.</param>
    internal static BeginningFaults Of(PlanBeginning beginning, PlanDesk desk, bool hasZones)
    {
        var found = desk.Compute(beginning.ToDocument(), CancellationToken.None);
        // What only computing finds is told in the same go as what is merely empty.
        var further = found.Result ?? desk.Compute(beginning.Completed().ToDocument(), CancellationToken.None).Result;
        var faults = found.Faults.Where(f => !f.IsWarning).Select(f => (f.Path, Sentence: $"{f.Wrong} {f.Allowed} {f.Remedy}"));
        var findings = (further?.Findings ?? []).Where(f => f.Severity == Severity.Error).Select(f => (f.Path, Sentence: FindingText.Of(f, found.Profile)));
        var all = faults.Concat(findings).Select(f => (Field: Field(f.Path, hasZones), f.Sentence));
        // Without two stations there is no deck; what follows from that would only hide it.
        return new(beginning.StationTexts.Count >= 2 ? all : all.Where(f => f.Field is not ("stations" or "")).Append(("stations",
            $"“{beginning.Stations}” names {beginning.StationTexts.Count} supports. Give at least two stations, parted by semicolons, the unit at least behind the last.")));
    }

    private static string Field(string path, bool hasZones)
    {
        var field = Places.FirstOrDefault(place => place.Takes(path)).Field ?? "";
        return hasZones && field is "lowest" or "highest" ? "zone" : field;
    }

    private static Func<string, bool> Ends(string with) => path => path.EndsWith(with, StringComparison.Ordinal);
}
