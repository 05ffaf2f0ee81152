using System.Collections.Immutable;

namespace JointPlanner.Engine.Plans;

/// <summary>
/// What a designer describes: the deck, where it stands and on what, its climate, its joints. All values SI; temperatures of
/// readings in °C. Lists are in station order once the plan is accepted.
/// </summary>
public sealed record Plan
{
    /// <summary>Number, name and place of the structure.</summary>
    public required Structure Structure { get; init; }
    /// <summary>The code edition and how its doubts are treated.</summary>
    public required BasisChoice Basis { get; init; }
    /// <summary>Temperatures of the site.</summary>
    public required Climate Climate { get; init; }
    /// <summary>Deck segments between joints.</summary>
    public required ImmutableArray<Segment> Segments { get; init; }
    /// <summary>Abutments, piers, towers.</summary>
    public required ImmutableArray<Support> Supports { get; init; }
    /// <summary>Bearing lines: one per segment and support (or carrying segment).</summary>
    public required ImmutableArray<BearingLine> Bearings { get; init; }
    /// <summary>Expansion joints.</summary>
    public required ImmutableArray<Joint> Joints { get; init; }
    /// <summary>Movements of causes that are given rather than computed.</summary>
    public ImmutableArray<GivenMovement> GivenMovements { get; init; } = [];
    /// <summary>Traffic; null where nothing is said of it.</summary>
    public LiveLoad? LiveLoad { get; init; }
    /// <summary>What the setting table shall cover.</summary>
    public SettingTableRequest SettingTable { get; init; } = new();
    /// <summary>How the temperature is found on the day of setting.</summary>
    public SettingDay SettingDay { get; init; } = new();
    /// <summary>Fields that nobody gave, with the reason of the value that stands in: path → sentence.</summary>
    public ImmutableSortedDictionary<string, string> Defaults { get; init; } = ImmutableSortedDictionary<string, string>.Empty;

    /// <summary>The segment with this id.</summary>
    /// <exception cref="InvalidOperationException">There is none; the plan was not accepted.</exception>
    public Segment SegmentOf(string id) => Segments.First(s => s.Id == id);

    /// <summary>True where the value at the path is a stated default.</summary>
    public bool IsDefault(string path) => Defaults.ContainsKey(path);

    /// <summary>The reason of the default at the path, or an empty text.</summary>
    public string DefaultReason(string path) => Defaults.GetValueOrDefault(path, "");
}

/// <summary>What the structure is called and where it stands.</summary>
/// <param name="Number">Owner's number.</param>
/// <param name="Name">Name.</param>
/// <param name="Place">Location in words.</param>
/// <param name="TimeZone">IANA time zone of the site.</param>
/// <param name="Altitude">Height above sea level, m; null where not given.</param>
public sealed record Structure(string Number, string Name, string Place, string TimeZone, double? Altitude);
