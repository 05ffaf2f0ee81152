using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>The few entries with which a structure begins; from them follows a whole plan, every part of which can be changed afterwards.</summary>
public sealed class PlanBeginning
{
    /// <summary>Name.</summary>
    public string Name { get; set; } = "";
    /// <summary>Owner's number.</summary>
    public string Number { get; set; } = "";
    /// <summary>Place in words.</summary>
    public string Place { get; set; } = "";
    /// <summary>IANA time zone.</summary>
    public string Zone { get; set; } = "Etc/UTC";
    /// <summary>Units shown: metric or us.</summary>
    public string Display { get; set; } = "metric";
    /// <summary>Id of the code edition.</summary>
    public string Code { get; set; } = "";
    /// <summary>Id of the owner's rule set.</summary>
    public string OwnerRules { get; set; } = "";
    /// <summary>Stations of the supports, separated by semicolons or lines.</summary>
    public string Stations { get; set; } = "";
    /// <summary>Number of the support with the fixed bearings, counted from 1.</summary>
    public int FixedAt { get; set; } = 1;
    /// <summary>Kind of the other bearings.</summary>
    public string OtherBearings { get; set; } = "free";
    /// <summary>Kind of deck.</summary>
    public string Deck { get; set; } = "composite";
    /// <summary>Climate zone in the code's word.</summary>
    public string ClimateZone { get; set; } = "";
    /// <summary>Lowest temperature: effective or shade, by <see cref="IsShade"/>.</summary>
    public string Lowest { get; set; } = "";
    /// <summary>Highest temperature.</summary>
    public string Highest { get; set; } = "";
    /// <summary>True where the temperatures are of shade air.</summary>
    public bool IsShade { get; set; }
    /// <summary>Temperature at which the joints are expected to be set.</summary>
    public string SettingTemperature { get; set; } = "";
    /// <summary>Shortening still to come of a concrete deck: strain.</summary>
    public string Shrinkage { get; set; } = "";
    /// <summary>Where the strain comes from.</summary>
    public string ShrinkageSource { get; set; } = "";
    /// <summary>Age of a concrete deck when joints and bearings are set.</summary>
    public string DeckAge { get; set; } = "";

    /// <summary>The stations as typed.</summary>
    public IReadOnlyList<string> StationTexts => Stations.Split([';', '\n'], StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);

    /// <summary>True where the deck shortens.</summary>
    public bool Shortens => Shrinkage.Length > 0;

    /// <summary>The plan.</summary>
    public PlanDocument ToDocument()
    {
        var plan = PlanDocument.Empty
            .With("structure/name", Name).With("structure/number", Number).With("structure/place", Place).With("structure/time-zone", Zone).With("display", Display)
            .With("basis/code", Code).With("basis/owner-rules", OwnerRules)
            .With("climate/zone", ClimateZone).With($"climate/{(IsShade ? "shade" : "effective")}-min", Lowest).With($"climate/{(IsShade ? "shade" : "effective")}-max", Highest);
        var stations = StationTexts;
        (plan, var deck) = plan.WithItem("segments", "s");
        var segment = Id(deck);
        plan = plan.With($"{deck}/start", stations[0]).With($"{deck}/end", stations[^1]).With($"{deck}/kind", Deck);
        if (Shortens) plan = plan.With($"{deck}/shrinkage/strain", Shrinkage).With($"{deck}/shrinkage/source", ShrinkageSource);
        var supports = new List<string>();
        for (var i = 0; i < stations.Count; i++)
        {
            var isEnd = i == 0 || i == stations.Count - 1;
            (plan, var support) = plan.WithItem("supports", isEnd ? "a" : "p");
            supports.Add(Id(support));
            plan = plan.With($"{support}/mark", $"{(isEnd ? "Abutment" : "Pier")} {i + 1}").With($"{support}/station", stations[i]).With($"{support}/kind", isEnd ? "abutment" : "pier");
            (plan, var bearing) = plan.WithItem("bearings", "b");
            plan = plan.With($"{bearing}/segment", segment).With($"{bearing}/on", supports[i]).With($"{bearing}/kind", i + 1 == FixedAt ? "fixed" : OtherBearings)
                .With($"{bearing}/setting/temperature", SettingTemperature).With($"{bearing}/setting/deck-age", Shortens ? DeckAge : null);
        }

        plan = WithJoint(plan, supports[0], segment, "far");
        return WithJoint(plan, segment, supports[^1], "near");
    }

    private PlanDocument WithJoint(PlanDocument plan, string near, string far, string deckSide)
    {
        var (with, joint) = plan.WithItem("joints", "j");
        return with.With($"{joint}/mark", Id(joint).ToUpperInvariant()).With($"{joint}/near", near).With($"{joint}/far", far)
            .With($"{joint}/setting/temperature", SettingTemperature).With($"{joint}/setting/{deckSide}-deck-age", Shortens ? DeckAge : null);
    }

    private static string Id(string path) => path[(path.LastIndexOf('/') + 1)..];
}
