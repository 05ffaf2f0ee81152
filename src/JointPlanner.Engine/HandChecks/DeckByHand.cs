using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.HandChecks;

/// <summary>Applies the elementary checks to one segment of a plan.</summary>
public sealed class DeckByHand
{
    private readonly Plan plan;
    private readonly Segment segment;
    private readonly Derivation derivation;
    private readonly Func<string, Number?> supportStiffness;
    private readonly Func<BearingLine, Number> padStiffness;

    /// <summary>Checks for one segment.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="segment">The segment.</param>
    /// <param name="supportStiffness">Stiffness of a support by id; null for unyielding.</param>
    /// <param name="padStiffness">Stiffness of an elastomeric line.</param>
    /// <param name="derivation">Where the steps go.</param>
    public DeckByHand(
        Plan plan, Segment segment, Func<string, Number?> supportStiffness, Func<BearingLine, Number> padStiffness, Derivation derivation)
    {
        (this.plan, this.segment, this.supportStiffness, this.padStiffness, this.derivation) =
            (plan, segment, supportStiffness, padStiffness, derivation);
        ZeroPoint = Find();
    }

    /// <summary>Zero-movement point by hand; null where no elementary formula applies.</summary>
    public Number? ZeroPoint { get; }

    /// <summary>Why there is none.</summary>
    public string WhyNone { get; private set; } = "";

    /// <summary>Expansion length of a joint for this segment by hand; null where no elementary formula applies.</summary>
    public Number? LengthAt(Joint joint)
    {
        if (ZeroPoint is not { } zero) return null;
        var isUpper = joint.Near == segment.Id;
        if (isUpper == (joint.Far == segment.Id)) return null;
        var length = isUpper
            ? derivation.Use(ZeroPointByHand.ToUpperEnd, "", GivenValues.End(plan, segment, derivation), zero)
            : derivation.Use(ZeroPointByHand.ToLowerEnd, "", zero, GivenValues.Start(plan, segment, derivation));
        var other = isUpper ? joint.Far : joint.Near;
        if (LineOn(other) is not { } line || supportStiffness(other) is not { } support || StiffnessOf(line) is not { } k) return length;
        var station = GivenValues.Station(plan, line, derivation);
        var distance = isUpper
            ? derivation.Use(ZeroPointByHand.ToUpperEnd, "", station, zero)
            : derivation.Use(ZeroPointByHand.ToLowerEnd, "", zero, station);
        return derivation.Use(ZeroPointByHand.LessBackwall, Keys.ExpansionLengthByHand(joint.Id, segment.Id), length,
            derivation.Use(ZeroPointByHand.BackwallFollows, "", distance, k, support));
    }

    private Number? Find()
    {
        var lines = plan.Bearings.Where(b => b.Segment == segment.Id && b.Kind != BearingKind.Free).ToArray();
        if (plan.Bearings.Any(b => b.Kind != BearingKind.Free && (b.On == segment.Id || (b.Segment == segment.Id && plan.Segments.Any(s => s.Id == b.On)))))
            return None("the segment is tied to another segment");
        if (lines.Any(b => b.Kind == BearingKind.Monolithic)) return None("a column is built into the segment");
        var unyielding = lines.Where(b => b.Kind == BearingKind.Fixed && supportStiffness(b.On) is null).ToArray();
        if (unyielding.Length > 1) return None("more than one unyielding line holds the segment");
        if (unyielding.Length == 1) return GivenValues.Station(plan, unyielding[0], derivation);
        if (lines.Length == 0) return None("no line holds the segment");

        var stiffnesses = lines.Select(b => StiffnessOf(b)!.Value).ToArray();
        var moments = lines.Select((b, i) =>
            derivation.Use(ZeroPointByHand.LineMoment, "", stiffnesses[i], GivenValues.Station(plan, b, derivation))).ToArray();
        return derivation.Use(ZeroPointByHand.Balance, Keys.ZeroMovementPointByHand(segment.Id),
            derivation.Use(ZeroPointByHand.Moments, "", moments), derivation.Use(ZeroPointByHand.Lines, "", stiffnesses));

        Number? None(string why)
        {
            WhyNone = why;
            return null;
        }
    }

    private BearingLine? LineOn(string support) =>
        plan.Bearings.FirstOrDefault(b => b.Segment == segment.Id && b.On == support && b.Kind != BearingKind.Free);

    private Number? StiffnessOf(BearingLine line) => (line.Kind, supportStiffness(line.On)) switch
    {
        (BearingKind.Fixed, var support) => support,
        (_, null) => padStiffness(line),
        (_, { } support) => derivation.Use(ZeroPointByHand.Series, "", padStiffness(line), support),
    };
}
