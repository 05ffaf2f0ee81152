using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Plans;

/// <summary>Makes the plan from the values of its fields. What could not be read stands in it as NaN or an empty word; its path is among the unread ones.</summary>
internal sealed class PlanMaking
{
    private readonly PlanDocument document;
    private readonly FieldValues values;

    private PlanMaking(PlanDocument document, FieldValues values) => (this.document, this.values) = (document, values);

    public static Plan Of(PlanDocument document, FieldValues values) => new PlanMaking(document, values).Make();

    private Plan Make()
    {
        var supports = Items("supports", Support);
        var bearings = Items("bearings", (path, id) => Bearing(path, id, supports));
        var segments = Items("segments", (path, id) => Segment(path, id, supports));
        foreach (var bearing in bearings) NoteSetting(bearing, segments.FirstOrDefault(s => s.Id == bearing.Segment));
        return new Plan
        {
            Structure = new Structure(values.Text("structure/number"), values.Text("structure/name"), values.Text("structure/place"),
                values.Text("structure/time-zone"), values.NumberOrNone("structure/altitude")),
            Basis = Basis(),
            Climate = Climate(),
            Supports = supports,
            Segments = segments,
            Bearings = bearings,
            LiveLoad = values.HasGroup("live-load") ? LoadMaking.LiveLoad(values) : null,
            Joints = Items("joints", Joint),
            GivenMovements = Items("movements", (path, id) => new GivenMovement(id, values.Text($"{path}/joint"), Word<Cause>($"{path}/cause"),
                values.Number($"{path}/opens-by"), values.Number($"{path}/closes-by"), values.Text($"{path}/source"))),
            SettingTable = new SettingTableRequest
            {
                From = values.NumberOrNone("setting-table/from"),
                To = values.NumberOrNone("setting-table/to"),
                Step = values.Number("setting-table/step"),
                Ages = [.. values.Items("setting-table/ages").Select(values.Number)],
            },
            SettingDay = SettingDay(),
            Defaults = values.Defaults.ToImmutableSortedDictionary(d => d.Key, d => d.Value.Reason, StringComparer.Ordinal),
        };
    }

    private ImmutableArray<T> Items<T>(string list, Func<string, string, T> make) =>
        [.. values.Items(list).Select(path => make(path, path[(path.LastIndexOf('/') + 1)..]))];

    private BasisChoice Basis() => new()
    {
        Code = values.Text("basis/code"),
        Profile = values.Text("basis/profile"),
        OwnerRules = values.Text("basis/owner-rules"),
        Doubt = values.Has("basis/setting-doubt") ? Word<SettingDoubt>("basis/setting-doubt") : null,
        Safety = values.Has("basis/safety") ? Word<SafetyFormat>("basis/safety") : null,
        Answers = [.. values.Items("basis/answers").Select(path => new CountingAnswer(Word<Cause>($"{path}/cause"), Word<Column>($"{path}/column"),
            values.NumberOrNone($"{path}/factor"), values.Text($"{path}/source")))],
    };

    private Climate Climate() => new()
    {
        Source = values.Text("climate/source"),
        Zone = values.Text("climate/zone"),
        ShadeMax = values.NumberOrNone("climate/shade-max"),
        ShadeMin = values.NumberOrNone("climate/shade-min"),
        EffectiveMax = values.NumberOrNone("climate/effective-max"),
        EffectiveMin = values.NumberOrNone("climate/effective-min"),
        Warming = values.Number("climate/warming"),
    };

    private SettingDay SettingDay()
    {
        const string methods = "setting-day/methods", points = "setting-day/points";
        if (!document.Has(methods)) values.Default(methods, "the owner's", "no method of measuring is given: the owner's, else our proposal, not published");
        if (!document.Has(points)) values.Default(points, "one", "no points are given: one mean temperature of the structure, found by the person on site");
        return new SettingDay
        {
            Methods = values.Methods(methods),
            Points = Items(points, (path, id) => new MeasuringPoint(id, values.Text($"{path}/name"), values.Number($"{path}/weight"))),
        };
    }

    private Support Support(string path, string id)
    {
        var hasColumn = values.HasGroup($"{path}/column");
        if (hasColumn) values.Undefault($"{path}/stiffness");
        return new Support
        {
            Id = id,
            Mark = values.Text($"{path}/mark"),
            Station = values.Number($"{path}/station"),
            Kind = Word<SupportKind>($"{path}/kind"),
            Height = values.NumberOrNone($"{path}/height"),
            Movement = LoadMaking.Movement(values, $"{path}/movement"),
            Stiffness = hasColumn
                ? new ColumnStiffness(values.Number($"{path}/column/height"), values.Number($"{path}/column/modulus"), values.Number($"{path}/column/inertia"),
                    values.NumberOrNone($"{path}/column/foundation-along"), values.NumberOrNone($"{path}/column/foundation-turning"))
                : values.NumberOrNone($"{path}/stiffness") is { } stiffness ? new GivenStiffness(stiffness) : null,
        };
    }

    private Segment Segment(string path, string id, ImmutableArray<Support> supports)
    {
        var (start, end) = (values.Number($"{path}/start"), values.Number($"{path}/end"));
        var section = SectionMaking.Section(document, values, $"{path}/section");
        if (section is not null) values.Undefault($"{path}/axial-stiffness");
        return new Segment
        {
            Id = id,
            Mark = values.Text($"{path}/mark"),
            Start = start,
            End = end,
            Kind = Word<DeckKind>($"{path}/kind"),
            Depth = values.NumberOrNone($"{path}/depth") ?? section?.Depth ?? DefaultDepth(path, start, end, supports),
            AxialStiffness = values.Number($"{path}/axial-stiffness"),
            Expansion = values.NumberOrNone($"{path}/expansion"),
            Section = section,
            Gradient = SectionMaking.Gradient(values, $"{path}/gradient"),
            DeadLoad = LoadMaking.DeadLoad(values, $"{path}/dead-load"),
            Braking = LoadMaking.Braking(values, $"{path}/braking"),
            Creep = Shortening($"{path}/creep"),
            Shrinkage = Shortening($"{path}/shrinkage"),
            Concrete = ConcreteMaking.Of($"{path}/concrete", values),
        };
    }

    /// <summary>A twentieth of the longest span, for the drawing alone.</summary>
    private double DefaultDepth(string path, double start, double end, ImmutableArray<Support> supports)
    {
        double[] stations = [.. supports.Select(s => s.Station).Where(x => x > start && x < end).Order()];
        double[] points = [start, .. stations, end];
        var longest = points.Zip(points.Skip(1), (a, b) => b - a).Max();
        var unit = document.TextAt("display") == "us" ? Unit.Foot : Unit.Metre;
        var depth = unit.ToSi(Math.Round(unit.FromSi(longest / 20), 2));
        if (!(depth > 0)) return double.NaN;
        values.Default($"{path}/depth", QuantityText.Write(depth, unit), "a twentieth of the longest span, for the drawing alone");
        return depth;
    }

    private Shortening? Shortening(string path) => !values.HasGroup(path) ? null : new Shortening(
        values.Number($"{path}/strain"), values.Text($"{path}/source"),
        [.. values.Items($"{path}/development").Select(p => new DevelopmentPoint(values.Number($"{p}/age"), values.Number($"{p}/share")))]);

    private BearingLine Bearing(string path, string id, ImmutableArray<Support> supports)
    {
        var on = values.Text($"{path}/on");
        var below = supports.FirstOrDefault(s => s.Id == on);
        if (below is not null && values.NumberOrNone($"{path}/station") is null && document.TextAt($"supports/{on}/station") is { } station)
            values.Default($"{path}/station", station, "the station of its support");
        return new BearingLine
        {
            Id = id,
            Mark = values.Text($"{path}/mark"),
            Segment = values.Text($"{path}/segment"),
            On = on,
            Station = values.NumberOrNone($"{path}/station") ?? below?.Station ?? double.NaN,
            Kind = Word<BearingKind>($"{path}/kind"),
            Depth = values.NumberOrNone($"{path}/depth"),
            Pads = !values.HasGroup($"{path}/pads") ? null : new Pads(values.Whole($"{path}/pads/count"), values.Number($"{path}/pads/shear-modulus"),
                values.Number($"{path}/pads/plan-area"), values.Number($"{path}/pads/elastomer-thickness")),
            SettingTemperature = values.NumberOrNone($"{path}/setting/temperature"),
            SettingAge = values.NumberOrNone($"{path}/setting/deck-age"),
        };
    }

    /// <summary>States the setting state that stands in for one that nobody gave; where it may not stand in, a rule says so.</summary>
    private void NoteSetting(BearingLine bearing, Segment? deck)
    {
        var path = $"bearings/{bearing.Id}";
        if (bearing.SettingTemperature is null)
            values.Default($"{path}/setting/temperature", "as the joint", bearing.Kind is BearingKind.Fixed or BearingKind.Monolithic
                ? "a single fixed line does not travel: its setting state plays no part"
                : $"nothing is given: taken as tied at zero shear when the joint was set ({(deck is null ? "deck" : MemberWords.Of(deck.Kind))} deck)");
    }

    private Joint Joint(string path, string id) => new()
    {
        Id = id,
        Mark = values.Text($"{path}/mark"),
        Near = values.Text($"{path}/near"),
        Far = values.Text($"{path}/far"),
        Skew = values.Number($"{path}/skew"),
        SettingTemperature = values.Number($"{path}/setting/temperature"),
        TemperatureUncertainty = values.Number($"{path}/setting/temperature-uncertainty"),
        MeasureUncertainty = values.Number($"{path}/setting/measure-uncertainty"),
        RemainingUncertainty = values.Number($"{path}/setting/remaining-uncertainty"),
        NearAge = values.NumberOrNone($"{path}/setting/near-deck-age"),
        FarAge = values.NumberOrNone($"{path}/setting/far-deck-age"),
        LeastAge = values.NumberOrNone($"{path}/setting/least-deck-age"),
        ChosenFamily = values.Text($"{path}/choice/family"),
        ChosenSize = values.Text($"{path}/choice/size"),
        ChoiceReason = values.Text($"{path}/choice/reason"),
    };

    private T Word<T>(string path)
        where T : struct, Enum => MemberWords.Of<T>(values.Text(path));
}
