using JointPlanner.Engine;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing;

namespace JointPlanner.Cli.Compute;

/// <summary>A computed plan as text for people, in the order in which an engineer reads it.</summary>
/// <param name="calculation">A calculation that has a result.</param>
/// <param name="profile">Units and digits.</param>
internal sealed class ResultText(Calculation calculation, DisplayProfile profile)
{
    private readonly Result result = calculation.Result!;

    /// <summary>All lines.</summary>
    public IEnumerable<string> Lines()
    {
        var joints = new JointText(result, profile);
        return Head()
            .Concat(Section("Defaults used, because nobody gave a value", calculation.Reading.Defaults.Select(d => $"  {d.Path} = {d.Text}: {d.Reason}")))
            .Concat(Section("Deck segments", Segments()))
            .Concat(Section("Cross-sections", SectionText.Lines(result, profile)))
            .Concat(result.Joints.SelectMany(j => Section(JointText.Title(j), joints.Lines(j))))
            .Concat(Section("On the day of setting", Day()))
            .Concat(Section("Bearing travel from setting, up-station positive, without factors", Bearings()))
            .Concat(Section("Bearings under other causes, travel up-station and rotation rising up-station positive, without factors", BearingCauses()))
            .Concat(Section("Force of holding lines on the deck, up-station positive", Restraints()))
            .Concat(Section("Solved lengths and their checks by hand", HandChecks()))
            .Concat(Section("Findings", Findings()))
            .Concat(Section("Values from memory: check each against the licensed text; an owner confirms them by name before anything is issued",
                result.MemoryValues.Select(v => $"  {v.ValueId}: {ProvenanceText.Of(v)}")))
            .Concat(Section("Caution", Caution));
    }

    private IEnumerable<string> Head()
    {
        var (plan, structure, basis) = (result.Plan, result.Plan.Structure, calculation.Basis!);
        yield return $"{structure.Name} ({structure.Number}), {structure.Place}";
        var named = plan.Basis.Profile.Length > 0 ? $", parameters {plan.Basis.Profile}" : "";
        yield return $"Basis: {basis.Title}{named} ({basis.Id}, revision {basis.Revision})";
        yield return calculation.Owner?.Rules is not { } rules ? "Owner's rules: none; nothing is fitted." : $"Owner's rules: {rules.Name}, version {rules.Version} ({rules.Id})";
        yield return $"Before the day: {Words.Of(DeckTemperatures.DoubtOf(plan, basis))}; {Words.Of(DeckTemperatures.SafetyOf(plan, basis))}.";
        yield return $"Shown in {profile.Name}.";
    }

    private IEnumerable<string> Segments()
    {
        if (result.Segments.IsEmpty) return [];
        var table = new TextTable("segment", "deck", "#from", "#to", "#lowest", "#highest", "#doubt", "#expansion", "#stands still at");
        foreach (var s in result.Segments)
            table.Add(
                Named(s.Segment.Id, s.Segment.Mark), Words.Of(s.Segment.Kind), Say(s.Segment.Start, Quantity.Length), Say(s.Segment.End, Quantity.Length),
                Say(s.Temperature.Min, Quantity.Temperature), Say(s.Temperature.Max, Quantity.Temperature),
                Say(s.Temperature.DoubtAllowance, Quantity.TemperatureDifference), Say(s.Temperature.Expansion, Quantity.Expansion),
                s.ZeroMovementPoint is { } zero ? Say(zero, Quantity.Length) : "nowhere");
        return table.Lines("  ");
    }

    private IEnumerable<string> Day()
    {
        if (calculation.Day is not { } day) yield break;
        yield return day.Points.IsEmpty
            ? "  one mean temperature of the structure, found on site"
            : $"  mean temperature, weighted: {string.Join(", ", day.Points.Select(p => $"{p.Name} {Say(p.Weight, Quantity.Ratio)}"))}";
        foreach (var m in day.Methods) yield return $"  measured by {m.Name}: u(T) = {Say(m.TemperatureUncertainty, Quantity.TemperatureDifference)} ({m.Source})";
        yield return $"  one table for each method, in steps of {Say(profile.DayStep, Quantity.TemperatureDifference)}, stands in results.json (--json); use within {Say(day.UseWithin, Quantity.Age)} of issue";
    }

    private IEnumerable<string> Bearings()
    {
        if (result.Bearings.IsEmpty) return [];
        var table = new TextTable("line", "kind", "#hot, at start", "#cold, at start", "#hot, at end", "#cold, at end");
        foreach (var b in result.Bearings)
        {
            var line = result.Plan.Bearings.First(l => l.Id == b.Bearing);
            table.Add(
                Named(line.Id, line.Mark), Words.Of(line.Kind), Say(b.HotAtStart, Quantity.Movement), Say(b.ColdAtStart, Quantity.Movement),
                Say(b.HotAtEnd, Quantity.Movement), Say(b.ColdAtEnd, Quantity.Movement));
        }
        return table.Lines("  ");
    }

    private IEnumerable<string> BearingCauses()
    {
        if (result.BearingMovements.IsEmpty) return [];
        var table = new TextTable("line", "cause", "#travel, most", "#travel, least", "#rotation, most", "#rotation, least");
        foreach (var b in result.BearingMovements)
            table.Add(b.Bearing, Words.Of(b.Cause), Say(b.TravelMost, Quantity.Movement), Say(b.TravelLeast, Quantity.Movement),
                b.RotationMost is { } most ? Say(most, Quantity.Rotation) : "", b.RotationLeast is { } least ? Say(least, Quantity.Rotation) : "");
        return table.Lines("  ");
    }

    private IEnumerable<string> Restraints()
    {
        if (result.Restraints.IsEmpty) return [];
        var table = new TextTable("line", "#hot", "#cold, all shortening over");
        foreach (var r in result.Restraints) table.Add(r.Bearing, Say(r.Hot, Quantity.Force), Say(r.Cold, Quantity.Force));
        return table.Lines("  ");
    }

    private IEnumerable<string> HandChecks() => result.HandChecks.Select(c => c.ByHand is { } hand
        ? $"  {c.What}: solved {Say(c.Solved, c.Quantity)}, by hand {Say(hand, c.Quantity)}, {(c.Agrees ? "within" : "NOT within")} {Say(c.Band, c.Quantity)}"
        : $"  {c.What}: solved {Say(c.Solved, c.Quantity)}, no check by hand: {c.Reason}");

    private IEnumerable<string> Findings() => result.Findings.OrderByDescending(f => f.Severity)
        .Select(f => $"  {FindingText.Of(f.Severity)}{(f.Path.Length > 0 ? $" ({f.Path})" : "")}: {FindingText.Of(f, profile)}");

    private static readonly string[] Caution =
    [
        "  This tool assists a licensed engineer. The engineer of record, local codes and licensed practice decide.",
        "  On the day: traffic control, work at height, pinch points while the deck moves. Never loosen restraints of a loaded bearing from these numbers alone.",
    ];

    private static IEnumerable<string> Section(string heading, IEnumerable<string> lines)
    {
        var all = lines.ToArray();
        return all.Length == 0 ? [] : ["", heading, .. all];
    }

    private static string Named(string id, string mark) => mark.Length > 0 && mark != id ? $"{id} ({mark})" : id;

    private string Say(Number number, Quantity quantity) => Say(number.Value, quantity);

    private string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
}
