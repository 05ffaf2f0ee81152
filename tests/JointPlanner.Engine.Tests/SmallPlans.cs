using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Tests;

/// <summary>Small plans for tests, in metres and °C; a test changes what it is about.</summary>
internal static class SmallPlans
{
    public static Support Abutment(string id, double station, SupportStiffness? stiffness = null) =>
        new() { Id = id, Station = station, Kind = SupportKind.Abutment, Stiffness = stiffness };

    public static Support Pier(string id, double station, SupportStiffness? stiffness = null) =>
        new() { Id = id, Station = station, Kind = SupportKind.Pier, Stiffness = stiffness };

    public static Segment Deck(string id, double start, double end, double axialStiffness = 1e11) =>
        new() { Id = id, Start = start, End = end, Kind = DeckKind.Steel, AxialStiffness = axialStiffness, Expansion = 12e-6 };

    public static BearingLine Fixed(string id, string segment, string on, double station) => Line(id, segment, on, station, BearingKind.Fixed);

    public static BearingLine Free(string id, string segment, string on, double station) => Line(id, segment, on, station, BearingKind.Free);

    /// <summary>A line of pads with the given stiffness, N/m.</summary>
    public static BearingLine Pads(string id, string segment, string on, double station, double stiffness) =>
        Line(id, segment, on, station, BearingKind.Elastomeric) with { Pads = new Pads(1, stiffness, 0.1, 0.1) };

    public static Joint Joint(string id, string near, string far, double skew = 0) =>
        new() { Id = id, Near = near, Far = far, SettingTemperature = 10, Skew = skew };

    public static Plan Of(Support[] supports, Segment[] segments, BearingLine[] bearings, params Joint[] joints) => new()
    {
        Structure = new("T-1", "Test deck", "nowhere", "Etc/UTC", null),
        Basis = new BasisChoice { Code = "test" },
        Climate = new Climate { EffectiveMin = -20, EffectiveMax = 40 },
        Supports = [.. supports],
        Segments = [.. segments],
        Bearings = [.. bearings],
        Joints = [.. joints],
    };

    private static BearingLine Line(string id, string segment, string on, double station, BearingKind kind) =>
        new() { Id = id, Segment = segment, On = on, Station = station, Kind = kind, SettingTemperature = 10 };
}
