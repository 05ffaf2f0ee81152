using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine;

/// <summary>
/// The fine tables that people on site set by, one for each method of measuring. They are made when a calculation is frozen and not at each
/// change of the plan: what they say follows from the same rows as the table of the sheet.
/// </summary>
public static class SettingDays
{
    /// <summary>Methods of measuring: the plan's own, else the owner's, else what is proposed.</summary>
    public static ImmutableArray<MeasuringMethod> Methods(Plan plan, OwnerRuleSet rules) =>
        !plan.SettingDay.Methods.IsEmpty ? plan.SettingDay.Methods
        : !rules.MeasuringMethods.IsEmpty ? rules.MeasuringMethods
        : MeasuringMethod.Proposed;

    /// <summary>How many rows the tables of all joints have together.</summary>
    /// <param name="result">What was computed.</param>
    /// <param name="owner">The owner's rules.</param>
    /// <param name="step">Step between rows, K.</param>
    public static int RowCount(Result result, Owner owner, double step) => Methods(result.Plan, owner.Rules).Length
        * result.Joints.Where(j => j.Table is not null).Sum(j => j.Table!.Ages.Length * Temperatures(j.Table, step).Count);

    /// <summary>The tables of each joint that a size was chosen for.</summary>
    /// <param name="result">What was computed.</param>
    /// <param name="owner">The owner's rules.</param>
    /// <param name="step">Step between rows, K.</param>
    public static ImmutableArray<JointDay> Of(Result result, Owner owner, double step) =>
        [.. result.Joints.Where(j => j.Table is not null).Select(j => OfJoint(result, owner, j, step))];

    private static JointDay OfJoint(Result result, Owner owner, JointResult joint, double step)
    {
        var (table, size) = (joint.Table!, joint.Fit!.Chosen!);
        var manner = SettingManner.Of(owner.Rules, result.Counting, owner.SettingStep);
        var temperatures = Temperatures(table, step);
        var withoutSteps = new Derivation(keepsSteps: false);
        var demands = new JointDemands(result.Plan, joint.Joint, joint.ExpansionLengths, id => result.Segments.First(s => s.Segment.Id == id).Temperature,
            [.. joint.Demand.Others.Where(o => ComputedCauses.ByFrame(result.Plan, joint.Joint, o.Cause))], result.Strains);
        var byAge = table.Ages.Select(age => age == joint.Demand.DeckAge ? joint.Demand : demands.At(age, withoutSteps)).ToArray();
        var tables = Methods(result.Plan, owner.Rules).Select(method => new MethodTable(method, table with
        {
            Rows =
            [
                .. from demand in byAge
                   let measured = demand with { Joint = demand.Joint with { TemperatureUncertainty = method.TemperatureUncertainty } }
                   from t in temperatures
                   select SettingRows.At(new Number(-1, t), measured, size, manner, withoutSteps),
            ],
        }));
        var columns = size.Limits.Select(l => l.JudgedBy).OfType<Column>().Distinct().Order();
        return new JointDay(joint.Joint.Id, [.. tables],
            [.. from column in columns from demand in byAge select MovementToCome.Of(demand, result.Counting, column)]);
    }

    private static IReadOnlyList<double> Temperatures(SettingTable table, double step) =>
        TableTemperatures.Of(new SettingTableRequest { Step = step }, table.Min.Value, table.Max.Value);
}

/// <summary>What is needed to set one joint on the day.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Tables">One table for each method of measuring.</param>
/// <param name="ToCome">Movement still to come, for each column that a limit of the size is judged by, at each deck age.</param>
public sealed record JointDay(string Joint, ImmutableArray<MethodTable> Tables, ImmutableArray<MovementToCome> ToCome);

/// <summary>A setting table for one method of measuring.</summary>
/// <param name="Method">The method.</param>
/// <param name="Table">The table; its design row is that of the sheet.</param>
public sealed record MethodTable(MeasuringMethod Method, SettingTable Table);
