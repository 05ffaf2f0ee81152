using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>Reads an owner's rule set, with the same strictness and the same manner of faults as a plan.</summary>
public sealed class OwnerRulesReader
{
    private readonly FieldValues values;
    private readonly MapNode root;
    private readonly List<Fault> faults;

    private OwnerRulesReader(MapNode root, FieldValues values, IEnumerable<Fault> faults) => (this.root, this.values, this.faults) = (root, values, [.. faults]);

    /// <summary>Reads a file's bytes.</summary>
    public static OwnerRulesReading Read(ReadOnlySpan<byte> utf8) => Read(DocumentParser.Parse(utf8));

    /// <summary>Reads a stream, never more of it than a rule set may have.</summary>
    public static OwnerRulesReading Read(Stream stream) => Read(DocumentParser.Parse(stream));

    private static OwnerRulesReading Read(ParsedDocument parsed) => parsed.Root is { } root ? Read(root) : new(null, parsed.Faults, null);

    /// <summary>Reads a document.</summary>
    public static OwnerRulesReading Read(MapNode root)
    {
        if (SchemaCheck.Of(OwnerRuleFields.Table, root) is { } schema) return new(null, [schema], root);
        var form = FormCheck.Of(OwnerRuleFields.Table, root);
        var fields = FieldReading.Of(OwnerRuleFields.Table, root, form.Broken);
        var reader = new OwnerRulesReader(root, fields.Values, form.Faults.Concat(fields.Faults));
        var rules = reader.Make();
        return new(reader.faults.Any(f => !f.IsWarning) ? null : rules, [.. reader.faults], root);
    }

    private OwnerRuleSet Make()
    {
        var source = Source("source") ?? Provenance.By("");
        return new OwnerRuleSet
        {
            Id = values.Text("id"),
            Name = values.Text("name"),
            Version = values.Text("version"),
            Source = source,
            Counting = Counting(source),
            RackingIsTotalRange = values.Text("racking") == "total-range",
            UncertaintyFactor = values.Number("uncertainty-factor"),
            RoundingStep = values.NumberOrNone("rounding"),
            SettingRule = Rule(),
            MeasuringMethods = values.Methods("measuring-methods"),
            UseWithin = values.Number("use-within"),
            Families = Families(source),
        };
    }

    private Provenance? Source(string path)
    {
        if (!values.HasGroup(path)) return null;
        var mark = MemberWords.Of<Mark>(values.Text($"{path}/mark"));
        if (mark == Mark.Memory && !values.Has($"{path}/value-id") && !values.Unread.Contains($"{path}/value-id") && values.Has($"{path}/mark"))
            faults.Add(new("source.no-value-id", $"{path}/value-id", "", "A value held from memory has no id under which an owner could confirm it.",
                "Allowed: a text that names the value, for instance owner/strip-seal-openings.", "Give the id, or say where the value was seen."));
        return new Provenance(mark, values.Text($"{path}/document"), values.Text($"{path}/edition"), values.Text($"{path}/place"), values.Text($"{path}/value-id"));
    }

    private CountingTable Counting(Provenance source)
    {
        var table = CountingTable.Empty;
        var seen = new HashSet<(string, string)>();
        foreach (var path in values.Items("counting"))
        {
            var (cause, column) = (values.Text($"{path}/cause"), values.Text($"{path}/column"));
            var (hasFactor, isUncounted) = (values.Has($"{path}/factor"), values.Has($"{path}/counted"));
            if (hasFactor == isUncounted && !values.Unread.Contains($"{path}/factor") && !values.Unread.Contains($"{path}/counted"))
                faults.Add(new("counting.no-answer", $"{path}/factor", "", hasFactor ? "The entry gives a factor and says that the movement is not counted." : "The entry gives no factor and does not say that the movement is not counted.",
                    "Allowed: either a factor, or “counted”: false.", "Give one of the two."));
            if (cause.Length == 0 || column.Length == 0) continue;
            if (!seen.Add((cause, column)))
                faults.Add(new("counting.repeated", $"{path}/column", column, $"There is an entry for {cause}, {column} already.", "Allowed: one entry for each.", "Take one of them out."));
            table = table.With(MemberWords.Of<Cause>(cause), MemberWords.Of<Column>(column),
                hasFactor ? new Counted(values.Number($"{path}/factor")) { Source = source } : new NotCounted { Source = source });
        }
        return table;
    }

    private SettingRule Rule()
    {
        var kind = values.Text("setting-rule/kind");
        var hasTemperature = values.Has("setting-rule/temperature");
        if (kind == "fixed-reference" && !hasTemperature && !values.Unread.Contains("setting-rule/temperature"))
            faults.Add(new("setting-rule.no-temperature", "setting-rule/temperature", "", "A fixed reference has no temperature.", "Allowed: a temperature.", "Give the temperature at which the reference opening holds."));
        foreach (var path in new[] { "setting-rule/temperature", "setting-rule/opening" })
            if (kind.Length > 0 && kind != "fixed-reference" && values.Has(path))
                faults.Add(new("setting-rule.unused", path, "", $"The rule {kind} uses no reference.", "Allowed: with fixed-reference only.", "Take it out, or choose fixed-reference."));
        return kind switch
        {
            "fixed-reference" => new FixedReference(values.Number("setting-rule/temperature"), values.NumberOrNone("setting-rule/opening")),
            "mid-range" => new MidRange(),
            "range-share" => new RangeShare(),
            _ => new MidWindow(),
        };
    }

    private ImmutableArray<FamilyRules> Families(Provenance source)
    {
        var families = ImmutableArray.CreateBuilder<FamilyRules>();
        var list = root["families"] as ListNode;
        var paths = values.Items("families");
        for (var i = 0; i < paths.Count; i++)
        {
            if (list?.Items[i] is not MapNode node) continue;
            var word = values.Text($"{paths[i]}/family");
            if (word.Length == 0) continue;
            if (families.Any(f => f.Family == word))
                faults.Add(new("families.repeated", $"{paths[i]}/family", word, $"There are rules for {word} already.", "Allowed: each family once.", "Put the two together."));
            var reading = new FamilyReading(values, paths[i], node, word);
            families.Add(reading.Make(Source($"{paths[i]}/source") ?? source, Source));
            faults.AddRange(reading.Faults);
        }
        return families.ToImmutable();
    }
}
