using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Setting;

public sealed class RuleOpeningTests
{
    private readonly Derivation d = new();

    // From memory, check against the licensed text: WSDOT BDM 9.1.3. The printed figures round intermediates, hence 0.02 in.
    [Theory]
    [InlineData(40, 1.97)]
    [InlineData(64, 1.80)]
    [InlineData(80, 1.69)]
    public void The_3_in_seal_of_the_200_ft_deck_is_set_at_the_printed_openings(double fahrenheit, double inches)
    {
        var demand = PublishedJoints.CompressionSeal200Ft(d);
        var seal = Fit(demand, PublishedJoints.CompressionSealRules(), d).Chosen!;
        var opening = RuleOpening.At(new FixedReference(F(64), null), seal.Limits, seal.ReferenceOpening, Movements(demand, Counts(), Occasion.Setting, F(fahrenheit)));

        Assert.Equal(inches, opening!.Value.Value / In(1), 0.02);
    }

    // Regression check, own arithmetic, not published: 300 ft, α 6.5e-6 per °F, skew 20°, 2.000 in normal at 60 °F, by reference and rounding alone.
    [Theory]
    [InlineData(20, 2.8796, 2.875, 2.875, 3.0644)]
    [InlineData(30, 2.6597, 2.625, 2.6875, 2.8304)]
    [InlineData(40, 2.4398, 2.5, 2.4375, 2.5964)]
    [InlineData(50, 2.2199, 2.25, 2.25, 2.3624)]
    [InlineData(60, 2.0000, 2, 2, 2.1284)]
    [InlineData(70, 1.7801, 1.75, 1.75, 1.8944)]
    [InlineData(80, 1.5602, 1.5, 1.5625, 1.6604)]
    [InlineData(90, 1.3403, 1.375, 1.3125, 1.4264)]
    [InlineData(100, 1.1204, 1.125, 1.125, 1.1924)]
    public void A_reference_opening_is_carried_by_the_thermal_slope_and_rounded_last(
        double fahrenheit, double normal, double toEighth, double toSixteenth, double along)
    {
        var demand = Reference();
        var opening = RuleOpening.At(new FixedReference(F(60), In(2)), [], null, Movements(demand, Counts(1.2), Occasion.Setting, F(fahrenheit)))!.Value;

        Assert.Equal(normal, opening.Value / In(1), 0.00005);
        Assert.Equal(along, opening.Value / demand.CosSkew.Value / In(1), 0.00005);
        Assert.Equal(toEighth, SettingFormulas.Rounded.Compute(opening.Value, In(2), In(0.125)) / In(1), 1e-9);
        Assert.Equal(toSixteenth, SettingFormulas.Rounded.Compute(opening.Value, In(2), In(0.0625)) / In(1), 1e-9);
    }

    // The same example, own arithmetic.
    [Fact]
    public void The_slope_is_normal_to_the_joint_and_without_factor() => Assert.Equal(0.0219888,
        Unit.InchPerFahrenheit.FromSi(RuleOpening.Rate(Reference(), Occasion.Setting, d).Value), 0.00000005);

    // Published: FHWA technical advisory on pavement joints, pp. 32-34, example A (seen): 1 in seal between 20 and 55 % compression,
    // 14 to 90 °F; set at 80 °F at 0.5 in, at 40 °F at 0.68 in.
    [Theory]
    [InlineData(80, 0.5)]
    [InlineData(40, 0.68)]
    public void The_working_range_may_be_spread_over_the_temperatures(double fahrenheit, double inches)
    {
        var demand = Demand(d, Joint(F(60)), [Thermal(d, 0.8 * In(720) * PerF(5.5e-6), F(14), F(90))]);
        var limits = new[] { Limit("least", Bound.Lower, In(0.45)), Limit("greatest", Bound.Upper, In(0.80)), Limit("installation", Bound.Lower, In(0.6), judgedBy: null) };
        var opening = RuleOpening.At(new RangeShare(), limits, null, Movements(demand, Counts(), Occasion.Setting, F(fahrenheit)));

        Assert.Equal(inches, opening!.Value.Value / In(1), 0.005);
    }

    [Fact]
    public void Mid_range_stands_in_the_middle_when_half_of_the_irreversible_movement_is_over()
    {
        var demand = Demand(d, Joint(20, Degrees(30)), [Thermal(d, 1e-3, -10, 40)], Other(d, Cause.Creep, opens: 0.020),
            Other(d, Cause.Braking, opens: 0.007, closes: 0.007, isIrreversible: false), Other(d, Cause.Substructure, opens: 0, closes: 0.004));
        var limits = new[] { Limit("least", Bound.Lower, 0.010), Limit("greatest", Bound.Upper, 0.110), Limit("installation", Bound.Lower, 0.040, judgedBy: null) };
        var opening = RuleOpening.At(new MidRange(), limits, null, Movements(demand, Counts(1.2), Occasion.Setting, 20));
        var cos = Math.Cos(Degrees(30));

        Assert.Equal(0.060 - (1e-3 * cos * (20 - 15)) - (0.5 * cos * (0.020 - 0.004)), opening!.Value.Value, 1e-12);
    }

    [Fact]
    public void A_reference_that_neither_rule_nor_size_gives_falls_back_to_the_middle_of_the_window()
    {
        Assert.IsType<MidWindow>(RuleOpening.For(new FixedReference(10, null), null));
        Assert.IsType<FixedReference>(RuleOpening.For(new FixedReference(10, null), new Number(-1, 0.05)));
        Assert.IsType<FixedReference>(RuleOpening.For(new FixedReference(10, 0.05), null));
    }

    private JointDemand Reference() => Demand(d, Joint(F(60), Degrees(20)), [Thermal(d, PerF(6.5e-6) * In(3600), F(0), F(120))]);
}
