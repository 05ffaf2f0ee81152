using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>One joint as text: what moves it, what counts, what fits, how it is set.</summary>
/// <param name="profile">Units and digits.</param>
internal sealed class JointText(DisplayProfile profile)
{
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
        foreach (var m in movements)
            table.Add(
                Words.Of(m.Column), Say(m.OpensBy.Value, Quantity.Movement), Say(m.ClosesBy.Value, Quantity.Movement),
                string.Join("; ", m.Parts
                    .DistinctBy(p => p.Cause)
                    .Select(p => $"{Words.Of(p.Cause)} {NumberText.Of(p.Factor.Value, Quantity.Ratio, profile)}")
                    .Concat(m.LeftOut.Select(l => $"{Words.Of(l.Cause)} {(l.IsSilent ? "basis silent" : "not counted")}").Distinct())));
        return table.IsEmpty ? [] : ["  Movements that count when sizing, normal to the joint", .. table.Lines("    ")];
    }

    private string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
}
