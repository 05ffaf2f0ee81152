using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.AashtoLrfd7Us;

/// <summary>Table 3.12.2.1-1, held from memory: design temperatures by climate and governing material, °F. A concrete deck on steel girders counts as steel.</summary>
internal static class ProcedureA
{
    private static readonly Row[] Rows =
    [
        new("moderate", IsConcrete: false, 0, 120), new("moderate", IsConcrete: true, 10, 80),
        new("cold", IsConcrete: false, -30, 120), new("cold", IsConcrete: true, 0, 80),
    ];

    public static Row? Find(string zone, DeckKind kind) =>
        Rows.FirstOrDefault(r => r.Zone == zone && r.IsConcrete == (kind == DeckKind.Concrete));

    /// <summary>One row.</summary>
    internal sealed record Row(string Zone, bool IsConcrete, double Min, double Max)
    {
        public string Name => $"{Zone} climate, {(IsConcrete ? "concrete" : "steel")}";
    }
}
