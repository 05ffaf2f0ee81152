using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>The solved model as text: enough to type into any frame program.</summary>
internal static class ModelText
{
    public static IEnumerable<string> Lines(Result result, DisplayProfile profile)
    {
        if (result.Model is not { } listing) yield break;
        var model = listing.Model;
        var nodes = new TextTable("point", "#station", "moves");
        foreach (var n in model.Nodes) nodes.Add(n.Name, Say(n.Station, Quantity.Length), n.Bends ? "along, vertical, turning" : "along");
        foreach (var line in nodes.Lines("  ")) yield return line;
        var members = new TextTable("member from", "to", "#length", "#EA", "#EI");
        foreach (var m in model.Members)
            members.Add(m.From.Name, m.To.Name, Say(m.Length, Quantity.Length), m.AxialStiffness > 0 ? Say(m.AxialStiffness, Quantity.AxialStiffness) : "",
                m.BendingStiffness > 0 ? Say(m.BendingStiffness, Quantity.BendingStiffness) : "");
        foreach (var line in members.Lines("  ")) yield return line;
        var springs = new TextTable("spring", "way", "from", "#height", "to", "#height", "#stiffness");
        foreach (var s in model.Springs)
            springs.Add(s.Name, Words.Of(s.Direction), s.From.Name, Say(s.FromHeight, Quantity.Size), s.To?.Name ?? "ground", s.To is null ? "" : Say(s.ToHeight, Quantity.Size),
                Say(s.Stiffness, s.Direction == Direction.Turning ? Quantity.RotationalStiffness : Quantity.Stiffness));
        if (!springs.IsEmpty)
            foreach (var line in springs.Lines("  ")) yield return line;
        foreach (var link in model.Links) yield return $"  link {link.Name}: {string.Join(" ", link.Terms.Select((t, i) => Term(t, i == 0)))} = 0, or what the ground moves there";
        foreach (var (cause, state, numbers) in listing.States)
            yield return FormattableString.Invariant($"  acted: {Words.Of(cause)}, {state}, numbers in steps {string.Join(" ", numbers.Select(n => FormattableString.Invariant($"[{n.Step + 1}]")))}");

        string Term((int Freedom, double Factor) term, bool isFirst)
        {
            var (node, direction) = model.OwnerOf(term.Freedom);
            var size = Math.Abs(term.Factor);
            var factor = direction == Direction.Turning && size != 1 ? Say(size, Quantity.Size) + " · " : "";
            return $"{(term.Factor < 0 ? "− " : isFirst ? "" : "+ ")}{factor}{node.Name} {Words.Of(direction)}";
        }

        string Say(double value, Quantity quantity) => NumberText.WithUnit(value, quantity, profile);
    }
}
