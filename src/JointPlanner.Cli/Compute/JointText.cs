using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Counting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>One joint as text: what moves it, what counts, what fits, how it is set.</summary>
/// <param name="result">The whole result.</param>
/// <param name="profile">Units and digits.</param>
internal sealed class JointText(Result result, DisplayProfile profile)
{
    private readonly IReadOnlyDictionary<string, Step> byKey = result.ByKey();

    /// <summary>Heading of a joint.</summary>
    public static string Title(JointResult joint) =>
        $"Joint {joint.Joint.Id}{(joint.Joint.Mark.Length > 0 ? $" ({joint.Joint.Mark})" : "")}, between {joint.Joint.Near} and {joint.Joint.Far}";

    /// <summary>Lines under the heading.</summary>
    public IEnumerable<string> Lines(JointResult joint)
    {
        yield return $"  skew {Say(joint.Joint.Skew, Quantity.Angle)}, expected to be set at {Say(joint.Joint.SettingTemperature, Quantity.Temperature)}";
        foreach (var (segment, length) in joint.ExpansionLengths)
            yield return $"  expansion length of segment {segment.Id}, uniform strain: {Say(length.Value, Quantity.Length)}";
        foreach (var line in Movements(joint)) yield return line;
        foreach (var line in Counted(joint)) yield return line;
        foreach (var line in new FitText(profile).Lines(joint)) yield return line;
        foreach (var line in new SettingText(profile).Lines(joint)) yield return line;
    }

    private IEnumerable<string> Movements(JointResult joint)
    {
        var table = new TextTable("cause", "#opens by", "#closes by", "");
        foreach (var m in joint.Movements)
            table.Add(
                Words.Of(m.Cause), Say(m.OpensBy.Value, Quantity.Movement), Say(m.ClosesBy.Value, Quantity.Movement),
                joint.NotCounted.Contains(m) ? "not counted, by rule" : "");
        foreach (var cause in joint.NotIncluded) table.Add(Words.Of(cause), "", "", "not included: give it, or zero and why");
        return table.IsEmpty ? [] : ["  Movements from setting, along the deck, without factors", .. table.Lines("    ")];
    }

    /// <summary>By column of the counting table, for the size that was taken or else the first one tried.</summary>
    private IEnumerable<string> Counted(JointResult joint)
    {
        var movements = (joint.Fit?.Chosen ?? joint.Fit?.Families.SelectMany(f => f.Sizes).FirstOrDefault())?.Movements ?? [];
        var table = new TextTable("judged by", "#opens by", "#closes by", "factors");
        // Racking runs along the joint line; its own line follows.
        foreach (var m in movements.Where(m => m.Column != Column.Racking))
            table.Add(
                Words.Of(m.Column), Say(m.OpensBy.Value, Quantity.Movement), Say(m.ClosesBy.Value, Quantity.Movement),
                string.Join("; ", m.Parts
                    .DistinctBy(p => p.Cause)
                    .Select(p => $"{Words.Of(p.Cause)} {NumberText.Of(p.Factor.Value, Quantity.Ratio, profile)}")
                    .Concat(m.LeftOut.Select(l => $"{Words.Of(l.Cause)} {(l.IsSilent ? "basis silent" : "not counted")}").Distinct())));
        if (table.IsEmpty) return [];
        string[] racking = byKey.TryGetValue(Keys.Racking(joint.Joint.Id, Occasion.Sizing), out var step)
            ? [$"  Racking that counts when sizing, along the joint: {Say(step.Value, Quantity.Movement)}"]
            : [];
        return ["  Movements that count when sizing, normal to the joint", .. table.Lines("    "), .. racking];
    }

    private string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
}
