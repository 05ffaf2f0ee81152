using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Counting;

/// <summary>
/// What one joint must take from setting at one temperature and deck age, column by column of the counting table. Every column is
/// computed once, when it is first asked for. Segments are not set off against each other: the closing of one counts in full beside the
/// opening of another.
/// </summary>
public sealed class CountedMovements
{
    private readonly CountingTable counting;
    private readonly Dictionary<Column, ColumnMovement> columns = [];
    private readonly Dictionary<Column, (List<Number> Closing, List<Number> Opening, ImmutableArray<CountedPart> Parts, ImmutableArray<LeftOutPart> LeftOut)> parts = [];
    private readonly Dictionary<bool, RackingMovement> rackings = [];
    private readonly Dictionary<Limit, Number> normals = new(ReferenceEqualityComparer.Instance);
    private ImmutableArray<(Number Min, Number Max)> ends;

    /// <summary>The movements of a demand from setting at a temperature.</summary>
    /// <param name="demand">What the joint must take, without factors.</param>
    /// <param name="counting">How each cause counts: the code's table with the owner's and the designer's entries over it.</param>
    /// <param name="occasion">Sizing or setting.</param>
    /// <param name="temperature">Temperature of the structure at setting, °C.</param>
    /// <param name="derivation">Where the steps go.</param>
    public CountedMovements(JointDemand demand, CountingTable counting, Occasion occasion, Number temperature, Derivation derivation)
    {
        this.counting = counting;
        (Demand, Occasion, Temperature, Derivation) = (demand, occasion, temperature, derivation);
    }

    /// <summary>What the joint must take, without factors.</summary>
    public JointDemand Demand { get; }
    /// <summary>Sizing or setting.</summary>
    public Occasion Occasion { get; }
    /// <summary>Temperature of the structure at setting, °C.</summary>
    public Number Temperature { get; }
    /// <summary>Where the steps go.</summary>
    public Derivation Derivation { get; }
    /// <summary>Columns asked for so far.</summary>
    public IReadOnlyCollection<ColumnMovement> Asked => columns.Values;

    /// <summary>What counts in a column, normal to the joint.</summary>
    public ColumnMovement In(Column column)
    {
        if (columns.TryGetValue(column, out var known)) return known;
        var (closing, opening, counted, leftOut) = Parts(column);
        return columns[column] = new ColumnMovement(column,
            Projected(CountingFormulas.Closing, Keys.CountedClosing(Demand.Joint.Id, Occasion, column), Demand.CosSkew, closing),
            Projected(CountingFormulas.Opening, Keys.CountedOpening(Demand.Joint.Id, Occasion, column), Demand.CosSkew, opening),
            counted, leftOut);
    }

    /// <summary>A limit normal to the joint.</summary>
    public Number Normal(Limit limit)
    {
        if (limit.Measure == Measure.Normal) return limit.Value;
        if (normals.TryGetValue(limit, out var known)) return known;
        return normals[limit] = Derivation.Use(CountingFormulas.AlongToNormal, "", limit.Value, Demand.CosSkew);
    }

    /// <summary>How far the joint still closes toward a lower limit, or opens toward an upper one; null at installation, where nothing is set against it.</summary>
    public Number? Toward(Limit limit) => limit.JudgedBy is not { } column ? null
        : limit.Bound == Bound.Lower ? In(column).ClosesBy : In(column).OpensBy;

    /// <summary>Movement along the joint line, by the racking column.</summary>
    /// <param name="isTotalRange">True to judge by the total range, false by the larger one-way value from setting.</param>
    public RackingMovement Racking(bool isTotalRange)
    {
        if (rackings.TryGetValue(isTotalRange, out var known)) return known;
        var (closing, opening, _, _) = Parts(Column.Racking);
        var closes = Projected(CountingFormulas.RackingClosing, "", Demand.SinSkew, closing);
        var opens = Projected(CountingFormulas.RackingOpening, "", Demand.SinSkew, opening);
        var demand = Derivation.Use(isTotalRange ? CountingFormulas.RackingTotal : CountingFormulas.RackingOneWay,
            Keys.Racking(Demand.Joint.Id, Occasion), closes, opens);
        return rackings[isTotalRange] = new RackingMovement(closes, opens, demand);
    }

    private (List<Number> Closing, List<Number> Opening, ImmutableArray<CountedPart> Parts, ImmutableArray<LeftOutPart> LeftOut) Parts(Column column)
    {
        if (parts.TryGetValue(column, out var known)) return known;
        var counted = ImmutableArray.CreateBuilder<CountedPart>();
        var leftOut = ImmutableArray.CreateBuilder<LeftOutPart>();
        AddThermal(column, counted, leftOut);
        AddOthers(column, counted, leftOut);
        return parts[column] = (
            [.. counted.Where(p => p.ClosesBy is not null).Select(p => p.ClosesBy!.Value)],
            [.. counted.Where(p => p.OpensBy is not null).Select(p => p.OpensBy!.Value)],
            counted.ToImmutable(), leftOut.ToImmutable());
    }

    private void AddThermal(Column column, ImmutableArray<CountedPart>.Builder counted, ImmutableArray<LeftOutPart>.Builder leftOut)
    {
        var entry = counting[Cause.UniformTemperature, column];
        Number? factor = null;
        for (var i = 0; i < Demand.Thermal.Length; i++)
        {
            var part = Demand.Thermal[i];
            var rate = Occasion == Occasion.Sizing ? part.Rate : part.WindowRate;
            if (rate.Value == 0) continue;
            var (closing, opening) = rate.Value > 0
                ? (CountingFormulas.ClosingByWarming, CountingFormulas.OpeningByCooling)
                : (CountingFormulas.ClosingByCooling, CountingFormulas.OpeningByWarming);
            var (min, max) = Ends()[i];
            var (hot, cold) = rate.Value > 0 ? (max, min) : (min, max);
            if (entry is Counted c)
            {
                factor ??= Factor(c, Cause.UniformTemperature, column);
                counted.Add(new CountedPart(Cause.UniformTemperature, part.Segment, factor.Value,
                    Derivation.Use(closing, "", factor.Value, rate, hot, Temperature),
                    Derivation.Use(opening, "", factor.Value, rate, Temperature, cold)));
            }
            else
            {
                leftOut.Add(LeftOut(entry, Cause.UniformTemperature, column,
                    closing.Compute(1, rate.Value, hot.Value, Temperature.Value),
                    opening.Compute(1, rate.Value, Temperature.Value, cold.Value)));
            }
        }
    }

    private void AddOthers(Column column, ImmutableArray<CountedPart>.Builder counted, ImmutableArray<LeftOutPart>.Builder leftOut)
    {
        foreach (var part in Demand.Others)
        {
            if (part.ClosesBy.Value == 0 && part.OpensBy.Value == 0) continue;
            var entry = counting[part.Cause, column];
            if (entry is not Counted c)
            {
                leftOut.Add(LeftOut(entry, part.Cause, column, part.ClosesBy.Value, part.OpensBy.Value));
                continue;
            }

            var factor = Factor(c, part.Cause, column);
            counted.Add(new CountedPart(part.Cause, "", factor,
                part.ClosesBy.Value > 0 ? Derivation.Use(CountingFormulas.OtherClosing, "", factor, part.ClosesBy) : null,
                part.OpensBy.Value > 0 ? Derivation.Use(CountingFormulas.OtherOpening, "", factor, part.OpensBy) : null));
        }
    }

    /// <summary>Ends of the range of each segment; widened by the doubt allowance when sizing.</summary>
    private ImmutableArray<(Number Min, Number Max)> Ends() => !ends.IsDefault
        ? ends
        : ends = [.. Demand.Thermal.Select(p => Occasion == Occasion.Setting || p.DoubtAllowance.Value == 0
            ? (p.Min, p.Max)
            : (Derivation.Use(CountingFormulas.MinWithDoubt, "", p.Min, p.DoubtAllowance),
               Derivation.Use(CountingFormulas.MaxWithDoubt, "", p.Max, p.DoubtAllowance)))];

    private Number Projected(Formula formula, string key, Number direction, List<Number> along) => along.Count > 0
        ? Derivation.Use(formula, key, [direction, .. along])
        : Derivation.Table(formula.Symbol, formula.Meaning, formula.Quantity, 0, Provenance.Derived("no cause that counts moves this joint that way"), "nil");

    private Number Factor(Counted entry, Cause cause, Column column) => !Derivation.KeepsSteps ? new Number(-1, entry.Factor) : Derivation.Table(
        "γ", $"factor on the movement by {Keys.Said(cause)} for {Keys.Said(column)}", Quantity.Ratio, entry.Factor,
        entry.Source ?? Provenance.By("counting table"), $"{Keys.Word(cause)}, {Keys.Word(column)}");

    private static LeftOutPart LeftOut(CountingEntry entry, Cause cause, Column column, double closesBy, double opensBy) =>
        new(cause, column, closesBy, opensBy, entry is SilentEntry, entry.Source);
}
