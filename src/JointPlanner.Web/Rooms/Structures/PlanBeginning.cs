using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>The few entries with which a structure begins; from them follows a whole plan, every part of which can be changed afterwards.</summary>
public sealed record PlanBeginning
{
    /// <summary>Name.</summary>
    public string Name { get; set; } = "";
    /// <summary>Owner's number.</summary>
    public string Number { get; set; } = "";
    /// <summary>Place in words.</summary>
    public string Place { get; set; } = "";
    /// <summary>IANA time zone; empty where nobody said.</summary>
    public string Zone { get; set; } = "";
    /// <summary>Units shown: metric or us.</summary>
    public string Display { get; set; } = "metric";
    /// <summary>Id of the code edition.</summary>
    public string Code { get; set; } = "";
    /// <summary>Id of the owner's rule set.</summary>
    public string OwnerRules { get; set; } = "";
    /// <summary>Stations of the supports, as <see cref="StationList"/> reads them.</summary>
    public string Stations { get; set; } = "";
    /// <summary>Number of the support with the fixed bearings, counted from 1.</summary>
    public int FixedAt { get; set; } = 1;
    /// <summary>Kind of the other bearings.</summary>
    public string OtherBearings { get; set; } = "free";
    /// <summary>Pads in each elastomeric line.</summary>
    public string PadCount { get; set; } = "";
    /// <summary>Shear modulus of the pads.</summary>
    public string PadModulus { get; set; } = "";
    /// <summary>Plan area of one pad.</summary>
    public string PadArea { get; set; } = "";
    /// <summary>Elastomer thickness of a pad.</summary>
    public string PadThickness { get; set; } = "";
    /// <summary>Kind of deck.</summary>
    public string Deck { get; set; } = "composite";
    /// <summary>Skew of the joints; empty for none.</summary>
    public string Skew { get; set; } = "";
    /// <summary>Climate zone in the code's word.</summary>
    public string ClimateZone { get; set; } = "";
    /// <summary>Lowest temperature: effective or shade, by <see cref="IsShade"/>.</summary>
    public string Lowest { get; set; } = "";
    /// <summary>Highest temperature.</summary>
    public string Highest { get; set; } = "";
    /// <summary>True where the temperatures are of shade air.</summary>
    public bool IsShade { get; set; } = true;
    /// <summary>Temperature at which the joints are expected to be set.</summary>
    public string SettingTemperature { get; set; } = "";
    /// <summary>Shortening still to come of a concrete deck: strain.</summary>
    public string Shrinkage { get; set; } = "";
    /// <summary>Where the strain comes from.</summary>
    public string ShrinkageSource { get; set; } = "";
    /// <summary>Age of a concrete deck when joints and bearings are set.</summary>
    public string DeckAge { get; set; } = "";

    /// <summary>The stations as typed, one by one, each with its unit.</summary>
    public IReadOnlyList<string> StationTexts => StationList.Of(Stations);

    /// <summary>True where the deck shortens.</summary>
    public bool Shortens => Deck == "concrete" && Shrinkage.Length > 0;

    /// <summary>What the supports are called.</summary>
    public IReadOnlyList<string> Marks => [.. StationTexts.Select((_, i) => $"{(IsEnd(i) ? "Abutment" : "Pier")} {i + 1}")];

    private bool HasPads => OtherBearings == "elastomeric";

    /// <summary>The same with something in each empty place that a computation needs only to begin, so that it finds what else is missing.</summary>
    public PlanBeginning Completed() => this with
    {
        Name = Or(Name, "name"),
        Number = Or(Number, "number"),
        Place = Or(Place, "place"),
        SettingTemperature = Or(SettingTemperature, "10 °C"),
    };

    /// <summary>The same with something in each place that the drawing does not need, so that it can be drawn before all is typed.</summary>
    public PlanBeginning ForDrawing() => this with
    {
        Name = "drawing",
        Number = "drawing",
        Place = "drawing",
        SettingTemperature = "10 °C",
        OtherBearings = "free",
        Skew = "",
        Shrinkage = "",
        ClimateZone = "",
        Lowest = "",
        Highest = "",
        Zone = "",
    };

    /// <summary>Puts a text back into the entry of the page that it was typed into.</summary>
    public void Put(string path, string text)
    {
        switch (path)
        {
            case "new/name": Name = text; break;
            case "new/number": Number = text; break;
            case "new/place": Place = text; break;
            case "new/time-zone": Zone = text; break;
            case "new/stations": Stations = text; break;
            case "new/pad-count": PadCount = text; break;
            case "new/pad-modulus": PadModulus = text; break;
            case "new/pad-area": PadArea = text; break;
            case "new/pad-thickness": PadThickness = text; break;
            case "new/skew": Skew = text; break;
            case "new/strain": Shrinkage = text; break;
            case "new/strain-source": ShrinkageSource = text; break;
            case "new/deck-age": DeckAge = text; break;
            case "new/lowest": Lowest = text; break;
            case "new/highest": Highest = text; break;
            case "new/set-at": SettingTemperature = text; break;
            default: break;
        }
    }

    /// <summary>The plan.</summary>
    public PlanDocument ToDocument()
    {
        var end = IsShade ? "shade" : "effective";
        var plan = PlanDocument.Empty
            .With("structure/name", Name).With("structure/number", Number).With("structure/place", Place).With("structure/time-zone", Zone).With("display", Display)
            .With("basis/code", Code).With("basis/owner-rules", OwnerRules)
            .With("climate/zone", ClimateZone).With($"climate/{end}-min", Lowest).With($"climate/{end}-max", Highest);
        var stations = StationTexts;
        (plan, var deck) = plan.WithItem("segments", "s");
        var segment = Id(deck);
        plan = plan.With($"{deck}/mark", "Deck").With($"{deck}/start", stations is [var first, ..] ? first : null).With($"{deck}/end", stations is [.., var last] ? last : null).With($"{deck}/kind", Deck);
        if (Shortens) plan = plan.With($"{deck}/shrinkage/strain", Shrinkage).With($"{deck}/shrinkage/source", ShrinkageSource);
        var supports = new List<string>();
        for (var i = 0; i < stations.Count; i++)
        {
            (plan, var support) = plan.WithItem("supports", IsEnd(i) ? "a" : "p");
            supports.Add(Id(support));
            plan = plan.With($"{support}/mark", Marks[i]).With($"{support}/station", stations[i]).With($"{support}/kind", IsEnd(i) ? "abutment" : "pier");
            plan = WithBearing(plan, segment, supports[i], i + 1 == FixedAt);
        }

        if (supports.Count < 2) return plan;
        plan = WithJoint(plan, supports[0], segment, "far");
        return WithJoint(plan, segment, supports[^1], "near");
    }

    private PlanDocument WithBearing(PlanDocument plan, string segment, string support, bool isFixed)
    {
        var (with, bearing) = plan.WithItem("bearings", "b");
        with = with.With($"{bearing}/segment", segment).With($"{bearing}/on", support).With($"{bearing}/kind", isFixed ? "fixed" : OtherBearings)
            .With($"{bearing}/setting/temperature", SettingTemperature).With($"{bearing}/setting/deck-age", Shortens ? DeckAge : null);
        if (isFixed || !HasPads) return with;
        return with.With($"{bearing}/pads/count", PadCount).With($"{bearing}/pads/shear-modulus", PadModulus)
            .With($"{bearing}/pads/plan-area", PadArea).With($"{bearing}/pads/elastomer-thickness", PadThickness);
    }

    private PlanDocument WithJoint(PlanDocument plan, string near, string far, string deckSide)
    {
        var (with, joint) = plan.WithItem("joints", "j");
        return with.With($"{joint}/mark", Id(joint).ToUpperInvariant()).With($"{joint}/near", near).With($"{joint}/far", far).With($"{joint}/skew", Skew)
            .With($"{joint}/setting/temperature", SettingTemperature).With($"{joint}/setting/{deckSide}-deck-age", Shortens ? DeckAge : null);
    }

    private bool IsEnd(int support) => support == 0 || support == StationTexts.Count - 1;

    private static string Or(string text, string standIn) => text.Length > 0 ? text : standIn;

    private static string Id(string path) => path[(path.LastIndexOf('/') + 1)..];
}
