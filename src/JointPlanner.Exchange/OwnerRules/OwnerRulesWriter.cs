using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>Writes a rule set as a file that reads back to the same values; a series of sizes is written out size by size.</summary>
public static class OwnerRulesWriter
{
    /// <summary>The file in UTF-8.</summary>
    /// <param name="rules">The rules.</param>
    /// <param name="showsUs">True for inches and °F, false for millimetres and °C.</param>
    public static byte[] ToUtf8(OwnerRuleSet rules, bool showsUs) => DocumentWriter.ToUtf8(OwnerRuleFields.Table, Document(rules, showsUs));

    private static MapNode Document(OwnerRuleSet rules, bool showsUs)
    {
        var document = Map(
            ("schema", Text(OwnerRuleFields.Table.Schema)), ("id", Text(rules.Id)), ("name", Text(rules.Name)), ("version", Text(rules.Version)),
            ("source", Source(rules.Source)),
            ("counting", new ListNode([.. rules.Counting.Entries.OrderBy(e => e.Key).Where(e => e.Value is not SilentEntry).Select(e => Counting(e.Key, e.Value))])),
            ("racking", Text(rules.RackingIsTotalRange ? "total-range" : "one-way")),
            ("uncertainty-factor", Number(rules.UncertaintyFactor)),
            ("setting-rule", Rule(rules.SettingRule, showsUs)),
            ("use-within", Of(rules.UseWithin, Quantity.Age, showsUs)),
            ("measuring-methods", new ListNode([.. rules.MeasuringMethods.Select(m => Map(("id", Text(m.Id)), ("name", Text(m.Name)),
                ("temperature-uncertainty", Of(m.TemperatureUncertainty, Quantity.TemperatureDifference, showsUs)), ("source", Text(m.Source))))])),
            ("families", new ListNode([.. rules.Families.Select(f => Family(f, showsUs))])));
        return rules.RoundingStep is { } step ? document.With("rounding", Of(step, Quantity.Opening, showsUs)) : document;
    }

    private static MapNode Counting((Cause Cause, Column Column) key, CountingEntry entry) => Map(
        ("cause", Text(MemberWords.Of(key.Cause))), ("column", Text(MemberWords.Of(key.Column))),
        entry is Counted counted ? ("factor", Number(counted.Factor)) : ("counted", new TruthNode(false)));

    private static MapNode Rule(SettingRule rule, bool showsUs)
    {
        if (rule is not FixedReference reference)
            return Map(("kind", Text(rule switch { MidRange => "mid-range", RangeShare => "range-share", _ => "mid-window" })));
        var map = Map(("kind", Text("fixed-reference")), ("temperature", Of(reference.Temperature, Quantity.Temperature, showsUs)));
        return reference.Opening is { } opening ? map.With("opening", Of(opening, Quantity.Opening, showsUs)) : map;
    }

    private static MapNode Family(FamilyRules rules, bool showsUs)
    {
        var map = Map(("family", Text(rules.Family)), ("source", Source(rules.Source)));
        if (rules.ReplacesCodeLimits) map = map.With("replaces-code-limits", new TruthNode(true));
        if (!rules.Figures.IsEmpty) map = map.With("figures", Figures(rules.Family, rules.Figures, showsUs));
        if (!rules.Notes.IsEmpty) map = map.With("notes", new MapNode([.. rules.Notes.Select(n => KeyValuePair.Create(n.Key, (DocumentNode)Note(n.Value)))]));
        return map.With("sizes", new ListNode([.. rules.Sizes.Select(s => Map(("name", Text(s.Name)), ("figures", Figures(rules.Family, s.Figures, showsUs))))]));
    }

    private static MapNode Figures(string family, ImmutableSortedDictionary<string, double> figures, bool showsUs)
    {
        var known = JointFamilies.Named(family)?.Figures ?? throw new ArgumentException($"There is no family {family}.", nameof(family));
        return new MapNode([.. figures.Select(f => KeyValuePair.Create(f.Key, Of(f.Value, known.First(k => k.Word == f.Key).Quantity, showsUs)))]);
    }

    private static MapNode Note(FigureNote note)
    {
        var map = MapNode.Empty;
        if (note.JudgedBy is { } column) map = map.With("judged-by", Text(MemberWords.Of(column)));
        if (note.Measure is { } measure) map = map.With("measure", Text(MemberWords.Of(measure)));
        return note.Source is { } source ? map.With("source", Source(source)) : map;
    }

    private static MapNode Source(Provenance source)
    {
        var map = Map(("mark", Text(MemberWords.Of(source.Mark))), ("document", Text(source.Document)));
        foreach (var (word, text) in new[] { ("edition", source.Edition), ("place", source.Place), ("value-id", source.ValueId) })
            if (text.Length > 0)
                map = map.With(word, Text(text));
        return map;
    }

    private static DocumentNode Of(double si, Quantity kind, bool showsUs)
    {
        if (kind == Quantity.Ratio || kind == Quantity.Count) return Number(si);
        var row = UnitTable.Of(kind);
        return Text(QuantityText.Write(si, showsUs ? row.Us : row.Metric));
    }

    private static TextNode Text(string text) => new(text);

    private static NumberNode Number(double value) => new(QuantityText.Write(value));

    private static MapNode Map(params (string Name, DocumentNode Part)[] parts) => new([.. parts.Select(p => KeyValuePair.Create(p.Name, p.Part))]);
}
