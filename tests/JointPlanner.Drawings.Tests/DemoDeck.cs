using JointPlanner.Engine.Plans;

namespace JointPlanner.Drawings.Tests;

/// <summary>Two invented segments over four supports, meeting at a joint in the second span.</summary>
internal static class DemoDeck
{
    internal static Plan Of(params double[] supports)
    {
        var meet = (supports[1] + supports[2]) / 2;
        return new Plan
        {
            Structure = new Structure("D-900", "Test Deck", "nowhere", "Etc/UTC", null),
            Basis = new BasisChoice { Code = "own" },
            Climate = new Climate(),
            Segments =
            [
                new Segment { Id = "s1", Start = supports[0], End = meet, Kind = DeckKind.Concrete, Depth = 2, AxialStiffness = 1e11 },
                new Segment { Id = "s2", Start = meet, End = supports[^1], Kind = DeckKind.Concrete, Depth = 2, AxialStiffness = 1e11 },
            ],
            Supports =
            [
                .. supports.Select((station, i) => new Support
                {
                    Id = $"p{i}", Mark = $"P{i}", Station = station, Height = 9,
                    Kind = i == 0 || i == supports.Length - 1 ? SupportKind.Abutment : SupportKind.Pier,
                }),
            ],
            Bearings =
            [
                .. supports.Select((station, i) => new BearingLine
                {
                    Id = $"b{i}", Segment = station < meet ? "s1" : "s2", On = $"p{i}", Station = station,
                    Kind = (BearingKind)(i % 3),
                }),
            ],
            Joints =
            [
                new Joint { Id = "j1", Mark = "J1", Near = "p0", Far = "s1", SettingTemperature = 15 },
                new Joint { Id = "j2", Mark = "J2", Near = "s1", Far = "s2", SettingTemperature = 15 },
            ],
        };
    }
}
