using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Causes;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Combining;

/// <summary>Puts together what one joint must take, from its expansion lengths, the temperatures and the other causes.</summary>
public sealed class JointDemands
{
    private static readonly Operand Skew = new("β", "skew of the joint", Quantity.Angle);
    private static readonly Operand Sine = new("s", "sine of the skew", Quantity.Ratio);

    private static readonly Provenance Axes = Provenance.Derived("joint axes of a skewed line: normal = along·cos β, racking = along·sin β");

    /// <summary>cos β.</summary>
    public static readonly Formula Cosine = new(
        "skew.cosine", "cos β", "share of an along-deck movement that is normal to the joint", Quantity.Ratio, [Skew], Cos(Skew), Axes,
        new(0.965926, 1e-6, "own arithmetic: 15°", 15 * Math.PI / 180));

    /// <summary>|sin β|.</summary>
    public static readonly Formula SineOfSkew = new(
        "skew.sine", "|sin β|", "share of an along-deck movement that is racking", Quantity.Ratio, [Skew],
        Larger(Sin(Skew), -1 * Sin(Skew)), Axes, new(0.258819, 1e-6, "own arithmetic: 15°", -15 * Math.PI / 180));

    private readonly Plan plan;
    private readonly Joint joint;
    private readonly ImmutableArray<(Segment Segment, Number Length)> lengths;
    private readonly Func<string, SegmentTemperature> temperatureOf;
    private readonly ImmutableArray<OtherPart> byFrame;
    private readonly RemainingStrains strains;

    /// <summary>Demands of one joint.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="joint">The joint.</param>
    /// <param name="lengths">Its expansion lengths.</param>
    /// <param name="temperatureOf">Temperatures of a segment.</param>
    /// <param name="byFrame">What the causes computed by the frame do to it.</param>
    /// <param name="strains">What the segments still shorten by.</param>
    public JointDemands(
        Plan plan, Joint joint, ImmutableArray<(Segment Segment, Number Length)> lengths, Func<string, SegmentTemperature> temperatureOf,
        ImmutableArray<OtherPart> byFrame, RemainingStrains strains) =>
        (this.plan, this.joint, this.lengths, this.temperatureOf, this.byFrame, this.strains) =
        (plan, joint, lengths, temperatureOf, byFrame, strains);

    /// <summary>The demand at a deck age at setting; null for the age that the joint's setting state gives.</summary>
    public JointDemand At(double? deckAge, Derivation derivation)
    {
        var path = $"joints/{joint.Id}";
        var skew = GivenValues.Of(plan, derivation, $"{path}/skew", "β", Skew.Meaning, Quantity.Angle, joint.Skew);
        return new JointDemand
        {
            Joint = joint,
            DeckAge = deckAge ?? SettingAge,
            Thermal = [.. lengths.Select(l => Thermal(l.Segment, l.Length, derivation))],
            Others = [.. Shortenings(deckAge, derivation), .. byFrame, .. Given(derivation)],
            CosSkew = derivation.Use(Cosine, "", skew),
            SinSkew = derivation.Use(SineOfSkew, "", skew),
        };
    }

    /// <summary>Deck age of the joint's setting state: the near deck's, else the far deck's; null where neither is given.</summary>
    public double? SettingAge => joint.NearAge ?? joint.FarAge;

    private ThermalPart Thermal(Segment segment, Number length, Derivation derivation)
    {
        var t = temperatureOf(segment.Id);
        var rate = derivation.Use(UniformTemperature.Rate, "", t.Expansion, length);
        var window = t.BestEstimate is { } best && best.Value > t.Expansion.Value
            ? derivation.Use(UniformTemperature.Rate, "", derivation.Use(UniformTemperature.WindowExpansion, "", t.Expansion, best), length)
            : rate;
        return new ThermalPart(segment.Id, rate, window, t.Min, t.Max, t.DoubtAllowance);
    }

    private IEnumerable<OtherPart> Shortenings(double? deckAge, Derivation derivation)
    {
        foreach (var cause in RemainingStrains.Causes)
        {
            var parts = new List<(Number Opens, Number Closes)>();
            foreach (var (segment, length) in lengths.Where(l => RemainingStrains.Has(cause, l.Segment)))
                if (strains.Of(cause, segment, AgeOf(segment, deckAge, derivation), derivation) is { } remaining)
                    parts.Add((derivation.Use(ShorteningMovements.Opens, "", remaining, length), derivation.Use(ShorteningMovements.Closes, "", remaining, length)));
            if (parts.Count == 0) continue;
            yield return new OtherPart(cause,
                derivation.Use(ShorteningMovements.SumOpens, Keys.OpensBy(joint.Id, cause), [.. parts.Select(p => p.Opens)]),
                derivation.Use(ShorteningMovements.SumCloses, Keys.ClosesBy(joint.Id, cause), [.. parts.Select(p => p.Closes)]),
                IsIrreversible: true);
        }
    }

    /// <summary>Deck age of a segment at setting; when another age is asked for, all decks are older or younger by the same time.</summary>
    private Number AgeOf(Segment segment, double? asked, Derivation derivation)
    {
        var (path, own) = segment.Id == joint.Far && joint.FarAge is { } far
            ? ("far-deck-age", far)
            : joint.NearAge is { } near ? ("near-deck-age", near) : ("far-deck-age", joint.FarAge ?? 0);
        if (asked is not { } age)
            return GivenValues.Of(plan, derivation, $"joints/{joint.Id}/setting/{path}", "t", $"deck age of segment {segment.Id} at setting", Quantity.Age, own);
        var shifted = Math.Max(0, own + age - (SettingAge ?? age));
        return GivenValues.Of(plan, derivation, $"joints/{joint.Id}/setting/{path}/tabulated", "t", $"deck age of segment {segment.Id} at setting", Quantity.Age, shifted);
    }

    private IEnumerable<OtherPart> Given(Derivation derivation) =>
        plan.GivenMovements.Where(m => m.Joint == joint.Id).Select(m => new OtherPart(m.Cause,
            derivation.Given($"movements/{m.Id}/opens-by", "Δ_opens", $"joint {joint.Id} opens by, {Keys.Word(m.Cause)}", Quantity.Movement, m.OpensBy, m.Source),
            derivation.Given($"movements/{m.Id}/closes-by", "Δ_closes", $"joint {joint.Id} closes by, {Keys.Word(m.Cause)}", Quantity.Movement, m.ClosesBy, m.Source),
            IsIrreversible: m.Cause is Cause.Creep or Cause.Shrinkage or Cause.Prestress or Cause.DeadLoad));
}
