using CsCheck;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.HandChecks;
using JointPlanner.Engine.Plans;
using static JointPlanner.Engine.Tests.SmallPlans;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>What must hold of every deck, whatever its numbers: closed forms and symmetry, own arithmetic.</summary>
public sealed class DeckPropertyTests
{
    private static readonly Gen<(double[] Spans, double[] Pads, double?[] Piers, double Axial)> Decks =
        from count in Gen.Int[1, 6]
        from spans in Gen.Double[10, 80].Array[count]
        from pads in Gen.Double[0.5e6, 30e6].Array[count + 1]
        from piers in Gen.Double[5e6, 500e6].Nullable(0.4).Array[count + 1]
        from axial in Gen.Double[5e9, 5e11]
        select (spans, pads, piers, axial);

    [Fact]
    public void Both_end_joints_share_the_whole_length_less_what_the_restraint_takes() => Decks.Sample(d =>
    {
        var plan = Build(d);
        var (near, far) = (LengthAt(plan, "j1"), LengthAt(plan, "j2"));
        Assert.InRange(near + far, 0, d.Spans.Sum() * (1 + 1e-9));
    }, seed: "0000000000002", iter: 1000);

    [Fact]
    public void A_stiff_deck_on_pads_and_yielding_piers_agrees_with_the_hand_check() => Decks.Sample(d =>
    {
        var plan = Build(d with { Axial = 1e16 });
        var derivation = new Derivation();
        var lengths = ExpansionLengths.Of(plan, derivation);
        var hand = new DeckByHand(plan, plan.Segments[0], lengths.Deck.StiffnessOf, b => lengths.Deck.StiffnessOf(b.Id)!.Value, derivation);
        foreach (var joint in plan.Joints)
            Assert.Equal(hand.LengthAt(joint)!.Value.Value, lengths.Of(joint).Sum(l => l.Length.Value), 1e-3);
    }, seed: "0000000000003", iter: 1000);

    [Fact]
    public void Turning_the_stationing_round_changes_no_joint() => Decks.Sample(d =>
    {
        var turned = (d.Spans.Reverse().ToArray(), d.Pads.Reverse().ToArray(), d.Piers.Reverse().ToArray(), d.Axial);
        Assert.Equal(LengthAt(Build(d), "j1"), LengthAt(Build(turned), "j2"), 1e-9 * d.Spans.Sum());
        Assert.Equal(LengthAt(Build(d), "j2"), LengthAt(Build(turned), "j1"), 1e-9 * d.Spans.Sum());
    }, seed: "0000000000004", iter: 1000);

    [Fact]
    public void The_forces_of_all_bearing_lines_balance() => Decks.Sample(d =>
    {
        var plan = Build(d);
        var lengths = ExpansionLengths.Of(plan, new Derivation());
        var warmed = lengths.Solver.Strained(_ => 1e-4);
        var forces = lengths.Deck.Model.Springs
            .Where(s => s.To is null || plan.Bearings.Any(b => b.Id == s.Name))
            .Where(s => plan.Bearings.Any(b => b.Id == s.Name))
            .Select(s => s.Stiffness * (warmed.Of(s.From) - (s.To is null ? 0 : warmed.Of(s.To)))).ToArray();
        Assert.InRange(Math.Abs(forces.Sum()), 0, 1e-9 * d.Axial * 1e-4);
    }, seed: "0000000000005", iter: 1000);

    private static Plan Build((double[] Spans, double[] Pads, double?[] Piers, double Axial) d)
    {
        var stations = new double[d.Spans.Length + 1];
        for (var i = 0; i < d.Spans.Length; i++) stations[i + 1] = stations[i] + d.Spans[i];
        var supports = stations.Select((x, i) => Pier($"s{i}", x, d.Piers[i] is { } k ? new GivenStiffness(k) : null)).ToArray();
        var bearings = stations.Select((x, i) => Pads($"b{i}", "deck", $"s{i}", x, d.Pads[i])).ToArray();
        return Of(supports, [Deck("deck", 0, stations[^1], d.Axial)], bearings,
            Joint("j1", "s0", "deck"), Joint("j2", "deck", $"s{d.Spans.Length}"));
    }

    private static double LengthAt(Plan plan, string joint) =>
        ExpansionLengths.Of(plan, new Derivation()).Of(plan.Joints.First(j => j.Id == joint)).Sum(l => l.Length.Value);
}
