using JointPlanner.Codes.AashtoLrfdCreep;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;
using static JointPlanner.Engine.Bases.Cause;
using static JointPlanner.Engine.Bases.Column;

namespace JointPlanner.Codes.AashtoLrfd7Us;

/// <summary>
/// AASHTO LRFD Bridge Design Specifications, 7th edition, US units: Procedure A for temperature, the gap limits of 14.5.3.2 and the
/// factors of Table 3.4.1-1. Table values are held from memory; each says so.
/// </summary>
public sealed class AashtoLrfd7UsBasis : CodeBasis
{
    private const string Document = "AASHTO LRFD Bridge Design Specifications";
    private const string Edition = "7th edition, 2014, US units";

    /// <inheritdoc/>
    public override string Id => "aashto-lrfd-7-us";

    /// <inheritdoc/>
    public override string Title => "AASHTO LRFD, 7th edition, US units";

    /// <inheritdoc/>
    public override IReadOnlyList<string> ClimateZones => ["moderate", "cold"];

    /// <inheritdoc/>
    public override IReadOnlyList<SafetyFormat> SafetyFormats => [SafetyFormat.Factor];

    /// <inheritdoc/>
    public override Answer<TemperatureRange> UniformTemperature(DeckKind kind, Plan plan, Derivation derivation)
    {
        if (GivenTemperatures.Of(plan, derivation) is { } given) return given;
        if (ProcedureA.Find(plan.Climate.Zone, kind) is not { } row)
            return new Silent<TemperatureRange>("Procedure A wants a climate zone, moderate or cold; or give effective temperatures, for instance from the maps of Procedure B");
        var source = Memory("Table 3.12.2.1-1", "aashto-lrfd-7-us/procedure-a");
        return new TemperatureRange(
            derivation.Table("T_min", "lowest design temperature, Procedure A", Quantity.Temperature, Unit.Fahrenheit.ToSi(row.Min), source, row.Name),
            GivenTemperatures.WithWarming(
                derivation.Table("T_max", "highest design temperature, Procedure A", Quantity.Temperature, Unit.Fahrenheit.ToSi(row.Max), source, row.Name),
                plan, derivation));
    }

    /// <inheritdoc/>
    public override Answer<Number> ExpansionCoefficient(DeckKind kind, Derivation derivation) => kind switch
    {
        DeckKind.Concrete => derivation.Table("α", "coefficient of expansion, normal-weight concrete", Quantity.Expansion,
            Unit.PerFahrenheit.ToSi(6.0e-6),
            new Provenance(Mark.Seen, "Missouri DOT Engineering Policy Guide 751.13", "revision of 7 Feb 2014", "restates the concrete value of LRFD 5.4.2.2"), "concrete"),
        _ => derivation.Table("α", "coefficient of expansion, steel", Quantity.Expansion,
            Unit.PerFahrenheit.ToSi(6.5e-6),
            new Provenance(Mark.Seen, "Missouri DOT Engineering Policy Guide 751.13", "revision of 7 Feb 2014", "restates the steel value of LRFD 6.4.1"), "steel"),
    };

    /// <inheritdoc/>
    public override Answer<TemperatureDifferences> TemperatureDifference(SectionProperties section, Derivation derivation) => TemperatureGradients.Of(section, derivation);

    /// <inheritdoc/>
    public override Answer<LoadModel> LiveLoad(LiveLoad traffic, Derivation derivation) => Hl93.Of(traffic, derivation);

    /// <inheritdoc/>
    public override CountingTable Counting(SafetyFormat format)
    {
        var movement = new Provenance(Mark.Seen, "Colorado DOT Bridge Design Manual, Appendix A Example 5", "Jan 2018",
            "larger γ_TU of LRFD Table 3.4.1-1 applied to joint movement with reference to 14.5.3.2");
        var service = Memory("Table 3.4.1-1, service combinations", "aashto-lrfd-7-us/gamma-tu-service");
        var shortening = Memory("Table 3.4.1-3, normal concrete superstructure deformation", "aashto-lrfd-7-us/gamma-cr-sh");
        var table = CountingTable.Empty;
        foreach (var column in new[] { GapStrength, SealRange, Racking })
            table = table.With(Cause.UniformTemperature, column, new Counted(1.20) { Source = movement });
        table = table.With(Cause.UniformTemperature, GapService, new Counted(1.00) { Source = service })
            .With(Cause.UniformTemperature, BearingTravel, new Counted(1.00) { Source = service });
        foreach (var cause in new[] { Creep, Shrinkage })
            foreach (var column in new[] { GapService, GapStrength, SealRange, Racking, BearingTravel })
                table = table.With(cause, column, new Counted(1.0) { Source = shortening });
        // γ_TG: none at strength; in service 1.0 without live load, the larger of its two values.
        var gradient = Memory("Table 3.4.1-1, γ_TG", "aashto-lrfd-7-us/gamma-tg");
        return table.With(Cause.TemperatureDifference, GapStrength, new NotCounted { Source = gradient })
            .With(Cause.TemperatureDifference, GapService, new Counted(1.0) { Source = gradient });
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Limit> SingleGapLimits(DeckKind near, DeckKind far, Derivation derivation)
    {
        var seen = new Provenance(Mark.Seen, "Missouri DOT Engineering Policy Guide 751.13", "revision of 7 Feb 2014", "restates the limits of W, LRFD 14.5.3.2");
        var limits = new List<Limit>
        {
            new("greatest gap in the direction of travel at the factored extreme",
                derivation.Table("W_max", "greatest surface gap along travel", Quantity.Opening, Unit.InchUnit.ToSi(4.0), seen, "single gap"),
                Bound.Upper, Measure.Along, GapStrength, seen),
        };
        if (near != DeckKind.Concrete || far != DeckKind.Concrete)
            limits.Add(new("least gap in the direction of travel at the factored extreme, steel superstructure",
                derivation.Table("W_min", "least surface gap along travel", Quantity.Opening, Unit.InchUnit.ToSi(1.0), seen, "steel superstructure"),
                Bound.Lower, Measure.Along, GapStrength, seen));
        return limits;
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Limit> ModularGapLimits(Derivation derivation)
    {
        var source = Memory("14.5.3.2", "aashto-lrfd-7-us/modular-gap");
        return
        [
            new("greatest gap of each cell in the direction of travel at the factored extreme",
                derivation.Table("W_max", "greatest gap of one cell along travel", Quantity.Opening, Unit.InchUnit.ToSi(3.0), source, "multiple gaps"),
                Bound.Upper, Measure.Along, GapStrength, source),
        ];
    }

    /// <inheritdoc/>
    public override Answer<CreepModel> CreepModel { get; } = new From2005To2014Model();

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "Inputs published: Colorado DOT Bridge Design Manual, Appendix A Example 5, Jan 2018 (seen); results are our own arithmetic";

    private static Provenance Memory(string place, string valueId) => new(Mark.Memory, Document, Edition, place, valueId);
}
