using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Codes.En1991Part1To5;

/// <summary>Figure 6.1 as offsets from shade air to uniform bridge temperature, in named profiles because the published readings of the figure differ.</summary>
internal static class ShadeOffsets
{
    private static readonly Operand ShadeMax = new("T_max,shade", "highest shade air temperature", Quantity.Temperature);
    private static readonly Operand ShadeMin = new("T_min,shade", "lowest shade air temperature", Quantity.Temperature);
    private static readonly Operand Offset = new("δ", "offset of figure 6.1 for this kind of deck", Quantity.TemperatureDifference);

    private static readonly Provenance Figure = new(Mark.Seen, "EN 1991-1-5", "2003 + AC:2009", "6.1.3.1, figure 6.1");

    /// <summary>Highest uniform temperature.</summary>
    public static readonly Formula HighestUniform = new(
        "en-1991-1-5.uniform-max", "T_e,max", "highest uniform bridge temperature", Quantity.Temperature, [ShadeMax, Offset],
        ShadeMax + Offset, Figure, new(50, 0.5,
            "Published: C. Sigmund, Eurocodes 0-1 Worked Examples, 2014, 34-Q, as quoted in an open-source finite-element library", 34, 16));

    /// <summary>Lowest uniform temperature.</summary>
    public static readonly Formula LowestUniform = new(
        "en-1991-1-5.uniform-min", "T_e,min", "lowest uniform bridge temperature", Quantity.Temperature, [ShadeMin, Offset],
        ShadeMin + Offset, Figure, new(-21, 0.5,
            "Published: C. Sigmund, Eurocodes 0-1 Worked Examples, 2014, 34-Q, as quoted in an open-source finite-element library", -18, -3));

    /// <summary>The profiles; the first is the default.</summary>
    public static readonly IReadOnlyList<Profile> Profiles =
    [
        new("generic", new(16, -3), new(4.5, 4.5), new(1.5, 8),
            new(Mark.Seen, "JCSS Probabilistic Model Code, part 2, thermal actions", "online edition", "restates EN 1991-1-5 figure 6.1, analytic offsets")),
        new("graph-reading", new(16, -3), new(4, 4), new(2, 8),
            new(Mark.Seen, "C. Sigmund, Eurocodes 0-1 Worked Examples", "2014", "34-Q and 35-S, read off figure 6.1, as quoted in an open-source finite-element library")),
        new("nl", new(16, -3), null, new(2, 8),
            new(Mark.Seen, "Dutch platform for joints and bearings, handbook on bearings", "online", "3.9.1")),
    ];

    /// <summary>The uniform range of a deck.</summary>
    public static Answer<TemperatureRange> Range(DeckKind kind, Plan plan, Derivation derivation)
    {
        var profile = plan.Basis.Profile.Length == 0 ? Profiles[0] : Profiles.FirstOrDefault(p => p.Name == plan.Basis.Profile);
        if (profile is null) return new Silent<TemperatureRange>($"there is no offset profile called {plan.Basis.Profile}");
        if (profile.Of(kind) is not { } offsets) return new Silent<TemperatureRange>($"the profile {profile.Name} has no offsets for this kind of deck");
        if (plan.Climate is not { ShadeMax: { } max, ShadeMin: { } min } climate)
            return new Silent<TemperatureRange>("it wants the highest and lowest shade air temperature, or effective temperatures given directly");
        if (max is < 30 or > 50 || min is < -50 or > 0)
            return new Silent<TemperatureRange>("figure 6.1 is drawn for highest shade temperatures from 30 to 50 °C and lowest from −50 to 0 °C only");
        var row = $"{profile.Name}, {kind}";
        var shadeMax = derivation.Given("climate/shade-max", ShadeMax.Symbol, ShadeMax.Meaning, Quantity.Temperature, max, climate.Source);
        var shadeMin = derivation.Given("climate/shade-min", ShadeMin.Symbol, ShadeMin.Meaning, Quantity.Temperature, min, climate.Source);
        var warmed = GivenTemperatures.WithWarming(shadeMax, plan, derivation);
        return new TemperatureRange(
            derivation.Use(LowestUniform, "", shadeMin, derivation.Table("δ", "offset to the lowest temperature", Quantity.TemperatureDifference, offsets.Min, profile.Source, row)),
            derivation.Use(HighestUniform, "", warmed, derivation.Table("δ", "offset to the highest temperature", Quantity.TemperatureDifference, offsets.Max, profile.Source, row)));
    }

    /// <summary>Offsets of one kind of deck, K: to the highest and to the lowest temperature.</summary>
    internal sealed record Offsets(double Max, double Min);

    /// <summary>A named reading of the figure.</summary>
    internal sealed record Profile(string Name, Offsets Steel, Offsets? Composite, Offsets Concrete, Provenance Source)
    {
        public Offsets? Of(DeckKind kind) => kind switch
        {
            DeckKind.Steel => Steel,
            DeckKind.Composite => Composite,
            DeckKind.Concrete => Concrete,
            _ => throw new ArgumentOutOfRangeException(nameof(kind)),
        };
    }
}
