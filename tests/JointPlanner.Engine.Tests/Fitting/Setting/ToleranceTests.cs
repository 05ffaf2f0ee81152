using CsCheck;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

/// <summary>A value set as far off as its printed tolerance, on a deck as far off in temperature as its uncertainty, still lies in the window of that temperature.</summary>
public sealed class ToleranceTests
{
    private const int Cases = 4000;

    private sealed record Case(
        double Rate, double Max, double Share, double Skew, double Factor, double Least, double Range, double Shrinks, double Brakes,
        double UTemperature, double UMeasure, int Step, int Rule, bool IsTight)
    {
        public double Temperature => -20 + (Share * (Max + 20));
        public SettingRule SettingRule => Rule switch
        {
            0 => new FixedReference(10, Least + (Range / 2)),
            1 => new MidRange(),
            2 => new RangeShare(),
            _ => new MidWindow(),
        };
        public double RoundingStep => Step switch { 0 => 0.001, 1 => 0.005, 2 => 0.0254 / 8, _ => 0.0254 / 16 };
    }

    private sealed record Made(Case Case, JointDemand Demand, SizeFit Size, SettingManner Manner, SettingRow Row);

    private static readonly Gen<Case> Generated =
        from rate in Gen.Double[-2e-3, 2e-3]
        from max in Gen.Double[25, 50]
        from share in Gen.Double[0, 1]
        from skew in Gen.Double[-50, 50]
        from factor in Gen.Double[1, 1.5]
        from least in Gen.Double[0.005, 0.03]
        from range in Gen.Double[0.02, 0.25]
        from shrinks in Gen.Double[0, 0.02]
        from brakes in Gen.Double[0, 0.004]
        from uTemperature in Gen.Double[0, 3]
        from uMeasure in Gen.Double[0, 0.002]
        from step in Gen.Int[0, 3]
        from rule in Gen.Int[0, 5]
        from tight in Gen.Int[0, 9]
        let wide = new Case(rate, max, share, skew, factor, least, range, shrinks, brakes, uTemperature, uMeasure, step, rule, false)
        select tight < 2 ? Tightened(wide) : wide;

    /// <summary>A joint that hardly moves, with a window of a few tenths of a millimetre: what only fine steps and gauges can set.</summary>
    private static Case Tightened(Case c) => c with
    {
        Rate = c.Rate * 0.003,
        Range = c.Range * 0.01,
        Shrinks = 0,
        Brakes = 0,
        UMeasure = c.UMeasure * 0.2,
        IsTight = true,
    };

    private static readonly List<Made> Rows = [.. Make()];

    [Fact]
    public void The_printed_tolerance_holds_a_standard_deviation_of_temperature_away_either_way()
    {
        foreach (var (c, demand, size, manner, row) in Rows.Where(r => r.Row.Set is not null))
            foreach (var temperature in new[] { c.Temperature - c.UTemperature, c.Temperature, c.Temperature + c.UTemperature })
            {
                var window = SettingWindow.At(size.Limits, Movements(demand, manner.Counting, Occasion.Setting, temperature));
                foreach (var opening in Openings(row, demand.CosSkew.Value))
                    Assert.True(opening >= window.Least.Value - 1e-12 && opening <= window.Greatest.Value + 1e-12,
                        $"{opening} m at {temperature} °C is outside {window.Least.Value} to {window.Greatest.Value}: {c}");
            }
    }

    [Fact]
    public void Every_value_given_has_a_tolerance_on_both_sides_in_whole_steps()
    {
        Assert.All(Rows.Where(r => r.Row.Set is not null), r =>
        {
            var tolerance = RoundingLadder.OfTolerance(r.Row.Step!.Value);
            Assert.True(r.Row.Minus!.Value.Value > 0 && r.Row.Plus!.Value.Value > 0);
            Assert.Equal(Math.Round(r.Row.Minus.Value.Value / tolerance), r.Row.Minus.Value.Value / tolerance, 1e-6);
            Assert.Equal(Math.Round(r.Row.Set!.Value.Value / r.Row.Step.Value), r.Row.Set.Value.Value / r.Row.Step.Value, 1e-6);
        });
    }

    [Fact]
    public void A_value_or_a_reason_stands_in_every_row_and_never_both() =>
        Assert.All(Rows, r => Assert.NotEqual(r.Row.Set is null, r.Row.Refusal is null));

    // Without this the properties above could hold for want of cases.
    [Fact]
    public void The_cases_cover_what_can_happen()
    {
        AtLeast(Cases / 3, "have a value", r => r.Row.Set is not null);
        AtLeast(5, "are rounded otherwise along the road", r => r.Row.Along is { } a && a.Step != r.Row.Step);
        AtLeast(20, "take a finer step", r => r.Row.Step < r.Case.RoundingStep && !r.Row.ByGauge);
        AtLeast(10, "are made by gauge", r => r.Row.ByGauge);
        AtLeast(Cases / 5, "are skewed", r => r.Row.Along is not null && Math.Abs(r.Case.Skew) > 10);
        AtLeast(Cases / 10, "open when warmed", r => r.Row.Set is not null && r.Case.Rate < 0);
        AtLeast(20, "show mid-window beside a rule that fails", r => r.Row.MidWindow is not null);
        AtLeast(20, "have no window", r => r.Row.Refusal?.Id == "setting-no-window");
        AtLeast(20, "have too narrow a window", r => r.Row.Refusal?.Id == "setting-window-too-narrow");
        AtLeast(20, "have a rule outside the window", r => r.Row.Refusal?.Id == "setting-rule-outside-window");

        static void AtLeast(int wanted, string what, Func<Made, bool> isSo)
        {
            var count = Rows.Count(isSo);
            Assert.True(count >= wanted, $"{count} rows {what}, {wanted} are wanted");
        }
    }

    private static IEnumerable<double> Openings(SettingRow row, double cos)
    {
        yield return row.Set!.Value.Value - row.Minus!.Value.Value;
        yield return row.Set.Value.Value;
        yield return row.Set.Value.Value + row.Plus!.Value.Value;
        if (row.Along is not { } along) yield break;
        yield return (along.Set.Value - along.Minus.Value) * cos;
        yield return (along.Set.Value + along.Plus.Value) * cos;
    }

    private static IEnumerable<Made> Make()
    {
        var random = new PCG(1, 20261201);
        var d = new Derivation(keepsSteps: false);
        for (var i = 0; i < Cases; i++)
        {
            var c = Generated.Generate(random, null, out _);
            var joint = Joint(c.Temperature, Degrees(c.Skew)) with { TemperatureUncertainty = c.UTemperature, MeasureUncertainty = c.UMeasure };
            var demand = Demand(d, joint, [Thermal(d, c.Rate, -20, c.Max)],
                Other(d, Cause.Shrinkage, c.Shrinks), Other(d, Cause.Braking, c.Brakes, c.Brakes, isIrreversible: false));
            var size = Size(null, Limit("least", Bound.Lower, c.Least), Limit("greatest", Bound.Upper, c.Least + c.Range),
                Limit("greatest along", Bound.Upper, (c.Least + c.Range) * 1.2, Column.GapStrength, Measure.Along),
                Limit("installation", Bound.Lower, c.Least + (c.IsTight ? 0 : 0.010), judgedBy: null));
            var manner = Manner(Counts(c.Factor), c.SettingRule, step: c.RoundingStep);
            yield return new Made(c, demand, size, manner, SettingRows.At(new Number(-1, c.Temperature), demand, size, manner, d));
        }
    }
}
