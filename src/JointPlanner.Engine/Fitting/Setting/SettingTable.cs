using System.Collections.Immutable;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Openings to set by temperature and deck age, for one joint and the size chosen. Openings are normal to the joint; along the road = normal / cos β.</summary>
/// <param name="Joint">Id of the joint.</param>
/// <param name="Rate">k = Σα·L·cos β, how much the normal opening closes per degree of warming, m/K, without factor; negative where warming opens.</param>
/// <param name="Min">Lowest temperature at which a value is given, °C.</param>
/// <param name="Max">Highest, °C.</param>
/// <param name="LeastAge">Least deck age at which the joint may be set, s; null for none.</param>
/// <param name="Ages">Deck ages tabulated, s; one null entry where age plays no part.</param>
/// <param name="Rows">Rows by age, then temperature.</param>
public sealed record SettingTable(
    string Joint, Number Rate, Number Min, Number Max, double? LeastAge, ImmutableArray<double?> Ages, ImmutableArray<SettingRow> Rows)
{
    /// <summary>The row at the joint's expected setting temperature and age, the one whose steps the sheet derives.</summary>
    public required SettingRow Design { get; init; }

    /// <summary>Makes a row once more, into a derivation of the asker's; null for a table that was made without its joint.</summary>
    internal Func<SettingRow, Derivation, SettingRow>? Remake { get; init; }

    /// <summary>A row of this table with the steps that lead to its numbers. The numbers are the row's own, bit for bit.</summary>
    /// <param name="row">A row of this table.</param>
    /// <param name="derivation">Goes on from the steps of the calculation that this table belongs to.</param>
    /// <exception cref="InvalidOperationException">The table was made without its joint.</exception>
    public SettingRow Explained(SettingRow row, Derivation derivation) =>
        Remake is { } remake ? remake(row, derivation) : throw new InvalidOperationException("This table does not know the joint that it was made for.");

    /// <summary>The table of one joint. Steps are kept for the design row; the other rows go through the same formulas without keeping theirs.</summary>
    /// <param name="design">What the joint must take when set at its own deck age.</param>
    /// <param name="temperatures">Temperatures to tabulate, °C.</param>
    /// <param name="ages">Further deck ages to tabulate, s; they play no part where the decks at the joint do not shorten.</param>
    /// <param name="demandAt">What the joint must take when set at another deck age; computed without steps.</param>
    /// <param name="size">The size chosen.</param>
    /// <param name="manner">How values are chosen, rounded and guarded.</param>
    /// <param name="derivation">Where the steps of the design row go.</param>
    public static SettingTable Of(
        JointDemand design, IReadOnlyList<double> temperatures, IReadOnlyList<double> ages, Func<double, JointDemand> demandAt,
        SizeFit size, SettingManner manner, Derivation derivation)
    {
        var joint = design.Joint;
        var temperature = derivation.Given($"joints/{joint.Id}/setting/temperature", "T_set", "structure temperature at setting, as expected",
            Quantity.Temperature, joint.SettingTemperature);
        var row = SettingRows.At(temperature, design, size, manner, derivation);
        if (RuleOpening.For(manner.Rule, size.ReferenceOpening) != manner.Rule)
            derivation.Note(SettingRefusals.NoReference(joint.Id, size.Family));
        if (row.Refusal is { } refusal) derivation.Note(refusal with { Severity = Severity.BlocksIssue });

        var withoutSteps = new Derivation(keepsSteps: false);
        ImmutableArray<double?> tabulated = design.DeckAge is null ? [null] : [.. ages.Append(design.DeckAge.Value).Distinct().Order()];
        var rows = ImmutableArray.CreateBuilder<SettingRow>(tabulated.Length * temperatures.Count);
        foreach (var age in tabulated)
        {
            var demand = age == design.DeckAge ? design : demandAt(age!.Value);
            foreach (var t in temperatures)
                rows.Add(SettingRows.At(new Number(-1, t), demand, size, manner, withoutSteps));
        }

        var ends = RuleOpening.Temperatures(design, derivation)
            ?? (new Number(-1, temperatures.DefaultIfEmpty(temperature.Value).Min()), new Number(-1, temperatures.DefaultIfEmpty(temperature.Value).Max()));
        var rate = RuleOpening.Rate(design, Counting.Occasion.Setting, derivation);
        return new SettingTable(joint.Id, rate, ends.Min, ends.Max, joint.LeastAge, tabulated, rows.ToImmutable()) { Design = row };
    }
}
