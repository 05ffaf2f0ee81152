using JointPlanner.Web.Rooms.Structure;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Words to choose from where a structure begins, with their names for people.</summary>
internal static class BeginningWords
{
    internal static readonly IReadOnlyList<(string, string)> Decks = [("composite", "steel with concrete deck"), ("concrete", "concrete"), ("steel", "steel")];
    internal static readonly IReadOnlyList<(string, string)> Others = [("free", "sliding"), ("elastomeric", "elastomeric pads")];

    internal static IReadOnlyList<(string, string)> Codes(PlanDesk desk) => [.. (desk.Known.Bases ?? []).Select(b => (b.Id, b.Title))];

    internal static IReadOnlyList<(string, string)> Rules(PlanDesk desk) => [.. desk.RuleNames, ("", "none: movements only")];

    /// <summary>Climate zones of a code; empty where it asks for none.</summary>
    internal static IReadOnlyList<(string, string)> Zones(PlanDesk desk, string code) =>
        desk.Known.Bases?.FirstOrDefault(b => b.Id == code)?.ClimateZones is { Count: > 0 } zones ? [("", "choose"), .. zones.Select(z => (z, z))] : [];
}
