using JointPlanner.Codes.En1992Part1To1Of2004;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;
using static JointPlanner.Engine.Bases.Cause;
using static JointPlanner.Engine.Bases.Column;

namespace JointPlanner.Codes.En1991Part1To5;

/// <summary>EN 1991-1-5:2003 with AC:2009 and the movement rules that go with it: uniform temperature from shade air by named offset profiles.</summary>
public sealed class En1991Part1To5Basis : CodeBasis
{
    private const string Document = "EN 1991-1-5";
    private const string Edition = "2003 + AC:2009";

    /// <inheritdoc/>
    public override string Id => "en-1991-1-5-2003";

    /// <inheritdoc/>
    public override string Title => "EN 1991-1-5:2003 + AC:2009";

    /// <inheritdoc/>
    public override IReadOnlyList<string> Profiles => [.. ShadeOffsets.Profiles.Select(p => p.Name)];

    /// <inheritdoc/>
    public override IReadOnlyList<SettingDoubt> Doubts => [SettingDoubt.Specified, SettingDoubt.Unspecified, SettingDoubt.None];

    /// <inheritdoc/>
    public override IReadOnlyList<SafetyFormat> SafetyFormats => [SafetyFormat.Degrees, SafetyFormat.Factor, SafetyFormat.None];

    /// <inheritdoc/>
    public override Answer<TemperatureRange> UniformTemperature(DeckKind kind, Plan plan, Derivation derivation) =>
        GivenTemperatures.Of(plan, derivation) is { } given ? given : ShadeOffsets.Range(kind, plan, derivation);

    /// <inheritdoc/>
    public override Answer<Number> ExpansionCoefficient(DeckKind kind, Derivation derivation) => kind == DeckKind.Concrete
        ? derivation.Table("α", "coefficient of expansion, concrete", Quantity.Expansion, 10e-6,
            Memory("Annex C, table C.1", "en-1991-1-5-2003/alpha-concrete"), "concrete")
        : derivation.Table("α", "coefficient of expansion for length, steel and composite", Quantity.Expansion, 12e-6,
            Memory("Annex C, table C.1; for composite EN 1994-2, 5.4.2.5(3)", "en-1991-1-5-2003/alpha-steel"), "steel, composite");

    /// <inheritdoc/>
    public override Answer<Number> DoubtAllowance(SettingDoubt doubt, Derivation derivation) =>
        derivation.Table("S", "allowance on both ends for the temperature at setting", Quantity.TemperatureDifference,
            doubt == SettingDoubt.Specified ? 10 : 20, Memory("6.1.3.3(3), note 2", "en-1991-1-5-2003/setting-doubt"),
            doubt == SettingDoubt.Specified ? "setting temperature specified" : "setting temperature not specified");

    /// <inheritdoc/>
    public override Answer<Number> SafetyDegrees(Derivation derivation) =>
        derivation.Table("ΔT_γ", "safety degrees on both ends", Quantity.TemperatureDifference, 5,
            new Provenance(Mark.Memory, "EN 1993-2", "2006", "Annex A", "en-1991-1-5-2003/safety-degrees"), "all decks");

    /// <inheritdoc/>
    public override Answer<TemperatureDifferences> TemperatureDifference(SectionProperties section, Derivation derivation) => LinearDifferences.Of(section, derivation);

    /// <inheritdoc/>
    public override Answer<LoadModel> LiveLoad(LiveLoad traffic, Derivation derivation) => LoadModel1.Of(traffic, derivation);

    /// <inheritdoc/>
    public override CountingTable Counting(SafetyFormat format)
    {
        var partial = new Provenance(Mark.Seen, "an open-source finite-element library restating EN 1990 Annex A2", "", "γ_Q thermal, set B");
        var degrees = Provenance.Derived("safety is in degrees, so the movement carries no factor");
        var permanent = Provenance.Derived("long-term movement from setting counted in full, once");
        var strength = format == SafetyFormat.Factor ? 1.5 : 1.0;
        var table = CountingTable.Empty;
        foreach (var column in new[] { GapService, SealRange, Racking, BearingTravel })
            table = table.With(Cause.UniformTemperature, column, new Counted(1.0) { Source = degrees });
        table = table.With(Cause.UniformTemperature, GapStrength, new Counted(strength) { Source = format == SafetyFormat.Factor ? partial : degrees });
        foreach (var cause in new[] { Creep, Shrinkage })
            foreach (var column in new[] { GapService, GapStrength, SealRange, Racking, BearingTravel })
                table = table.With(cause, column, new Counted(1.0) { Source = permanent });
        // Either combination of 6.1.5 may govern, and at a joint beside a fixed bearing it is the one with the full difference.
        var together = Provenance.Derived("6.1.5 reduces either the difference or the uniform part beside the other; both in full bound either combination");
        foreach (var column in new[] { GapService, SealRange, Racking, BearingTravel, BearingRotation })
            table = table.With(Cause.TemperatureDifference, column, new Counted(1.0) { Source = together });
        table = table.With(Cause.TemperatureDifference, GapStrength, new Counted(strength) { Source = together });
        var settlement = new Provenance(Mark.Seen, "an open-source finite-element library restating EN 1990 Annex A2", "", "settlement, linear analysis, set B");
        foreach (var cause in new[] { DeadLoad, Substructure })
            foreach (var column in new[] { GapService, SealRange, Racking, BearingTravel, BearingRotation })
                table = table.With(cause, column, new Counted(1.0) { Source = permanent });
        return table.With(Substructure, GapStrength, new Counted(1.2) { Source = settlement });
    }

    /// <inheritdoc/>
    public override Answer<CreepModel> CreepModel { get; } = new En1992Part1To1Of2004Model();

    /// <inheritdoc/>
    public override string PublishedExamples =>
        "Published: C. Sigmund, Eurocodes 0-1 Worked Examples, 2014, 34-Q and 35-S, as quoted in an open-source finite-element library; Dutch platform for joints and bearings, handbook on bearings 3.9.1 (seen)";

    private static Provenance Memory(string place, string valueId) => new(Mark.Memory, Document, Edition, place, valueId);
}
