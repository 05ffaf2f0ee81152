using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>One joint from its expansion lengths to its setting table.</summary>
internal sealed class JointCalculation(Plan plan, CodeBasis basis, Owner? owner, CountingTable counting, RemainingStrains strains, Derivation derivation)
{
    public JointResult Of(
        Joint joint, ImmutableArray<(Segment Segment, Number Length)> lengths, Func<string, SegmentTemperature> temperatureOf, ImmutableArray<OtherPart> byFrame)
    {
        var set = SettingState(joint);
        var demands = new JointDemands(plan, joint, lengths, temperatureOf, byFrame, strains);
        var demand = demands.At(null, derivation);
        var movements = JointMovements.Of(demand, set, derivation);
        var missing = IncludedCauses.Missing(plan, joint, [.. lengths.Select(l => l.Segment)], counting);
        if (!missing.IsEmpty)
            derivation.Note(new("causes-not-included", Severity.BlocksIssue, $"joints/{joint.Id}",
                $"Not included at joint {joint.Id}: {string.Join(", ", missing.Select(Keys.Said))}. Give each as a movement with its source, zero where none acts and why."));

        var fit = owner is null ? null : JointFitting.Of(demand, owner.Rules, counting, CodeLimits(joint), derivation);
        var table = fit?.Chosen is { } size ? Table(demand, demands, size) : null;
        return new JointResult(joint, lengths, movements, missing, NotCounted(movements), demand, fit, table);
    }

    /// <summary>Notes the joint's own setting state, with what stands in by default; the rooms that use a value find its step by its path.</summary>
    private Number SettingState(Joint joint)
    {
        var path = $"joints/{joint.Id}/setting";
        Note("temperature-uncertainty", "u_T", "standard deviation of the temperature of the structure", Quantity.TemperatureDifference, joint.TemperatureUncertainty);
        Note("measure-uncertainty", "u_m", "standard deviation of the measured gap", Quantity.Movement, joint.MeasureUncertainty);
        Note("remaining-uncertainty", "u_r", "standard deviation of the movement still to come", Quantity.Movement, joint.RemainingUncertainty);
        return Note("temperature", "T_set", "structure temperature at setting, as expected", Quantity.Temperature, joint.SettingTemperature);

        Number Note(string word, string symbol, string meaning, Quantity quantity, double value) =>
            GivenValues.Of(plan, derivation, $"{path}/{word}", symbol, meaning, quantity, value);
    }

    private SettingTable Table(JointDemand demand, JointDemands demands, SizeFit size)
    {
        var manner = SettingManner.Of(owner!.Rules, counting, owner.SettingStep);
        var set = demand.Joint.SettingTemperature;
        var temperatures = TableTemperatures.Of(plan.SettingTable,
            demand.Thermal.Select(p => p.Min.Value).DefaultIfEmpty(set).Max(), demand.Thermal.Select(p => p.Max.Value).DefaultIfEmpty(set).Min());
        var withoutSteps = new Derivation(keepsSteps: false);
        return SettingTable.Of(demand, temperatures, plan.SettingTable.Ages, age => demands.At(age, withoutSteps), size, manner, derivation) with
        {
            Remake = (row, going) => SettingRows.At(
                going.Given($"setting-table/row/{demand.Joint.Id}", "T", "structure temperature of this row", Quantity.Temperature, row.Temperature, "row of the setting table"),
                row.DeckAge is { } age && age != demand.DeckAge ? demands.At(age, going) : demand, size, manner, going),
        };
    }

    private CodeGapLimits CodeLimits(Joint joint)
    {
        var near = KindOf(joint.Near) ?? KindOf(joint.Far)!.Value;
        var far = KindOf(joint.Far) ?? near;
        return new CodeGapLimits([.. basis.SingleGapLimits(near, far, derivation)], [.. basis.ModularGapLimits(derivation)]);
    }

    private DeckKind? KindOf(string body) => plan.Segments.FirstOrDefault(s => s.Id == body)?.Kind;

    private ImmutableArray<CauseMovement> NotCounted(ImmutableArray<CauseMovement> movements) =>
        [.. movements.Where(m => counting[m.Cause, Column.GapService] is NotCounted && m.OpensBy.Value + m.ClosesBy.Value > 0)];
}
