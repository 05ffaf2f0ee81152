using System.Collections.Immutable;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>Every field of an owner's rule set, said once. Which figures a family reads, the family says itself.</summary>
public static class OwnerRuleFields
{
    private const int Name = DocumentLimits.NameLength, Note = DocumentLimits.NoteLength;

    /// <summary>Words of the rules by which the set value is chosen.</summary>
    public static readonly ImmutableArray<string> SettingRules = ["mid-window", "fixed-reference", "mid-range", "range-share"];

    private static Field Needed(string pattern, string name, Entry entry, string meaning) => new(pattern, name, entry, meaning) { IsRequired = true };

    private static Field Maybe(string pattern, string name, Entry entry, string meaning) => new(pattern, name, entry, meaning);

    private static IEnumerable<Field> Source(string pattern, bool isRequired) =>
    [
        new(pattern, "source", new GroupEntry(), "Where this comes from.") { IsRequired = isRequired },
        Needed($"{pattern}/mark", "how surely it is known", new WordEntry([.. Enum.GetValues<Mark>().Select(MemberWords.Of)]),
            "seen in the document, held from memory, own derivation, or given by the owner."),
        Needed($"{pattern}/document", "document", new TextEntry(Note), "The document."),
        Maybe($"{pattern}/edition", "edition", new TextEntry(Name), "Edition or date of the document."),
        Maybe($"{pattern}/place", "place", new TextEntry(Note), "Clause, table or page."),
        Maybe($"{pattern}/value-id", "id of the value", new TextEntry(Name), "Id under which an owner confirms a value held from memory."),
    ];

    /// <summary>The table.</summary>
    public static readonly FieldTable Table = new("owner-rules", 1,
    [
        Needed("schema", "schema", new WordEntry(["owner-rules/1"]), "What this file is."),
        Needed("id", "id of the rule set", new TextEntry(60), "Permanent id."),
        Needed("name", "name of the rule set", new TextEntry(Name), "Name for people."),
        Needed("version", "version", new TextEntry(Name), "Version as the owner numbers it."),
        .. Source("source", isRequired: true),

        Maybe("counting", "counting table", new ListEntry(0, 200, "entry of the counting table"), "What the owner counts, laid over the code's table."),
        Needed("counting/*/cause", "cause", new WordEntry(PlanFields.Causes), "The cause of movement."),
        Needed("counting/*/column", "judgement", new WordEntry(PlanFields.Columns), "By what the movement is judged."),
        Maybe("counting/*/factor", "factor", new RatioEntry(0, 10), "Factor on the movement from setting."),
        Maybe("counting/*/counted", "counted", new FalseEntry(), "false where the movement is not counted."),

        new("racking", "racking", new WordEntry(["one-way", "total-range"]), "How movement along the joint line is judged.")
            { Default = "one-way", DefaultReason = "the rule set says nothing: the larger one-way movement from setting" },
        new("uncertainty-factor", "uncertainty factor", new RatioEntry(0, 5), "Standard deviations in the reserve.")
            { IsRequired = true },
        Maybe("rounding", "step of rounding", new QuantityEntry(Quantity.Opening, new("0.01 mm", "50 mm")), "Step to which set values are rounded; that of the units shown where nothing is given."),

        new("setting-rule", "setting rule", new GroupEntry(), "How the set value is chosen within its window.") { IsRequired = true },
        Needed("setting-rule/kind", "kind of setting rule", new WordEntry(SettingRules), "How the set value is chosen."),
        Maybe("setting-rule/temperature", "reference temperature", new QuantityEntry(Quantity.Temperature, new("-60 °C", "60 °C")), "Of a fixed reference."),
        Maybe("setting-rule/opening", "reference opening", new QuantityEntry(Quantity.Opening, new("0 mm", "5 m")), "Normal opening at the reference temperature; the family's own where nothing is given."),

        new("use-within", "use within", new QuantityEntry(Quantity.Age, new("1 d", "3650 d")), "How long after its issue a calculation may be used to set joints.")
            { Default = "90 d", DefaultReason = "our proposal, not published" },
        .. PlanFields.Measuring("measuring-methods"),

        Maybe("families", "families", new ListEntry(0, 50, "family"), "Joint families that the owner allows, in order of preference."),
        Needed("families/*/family", "family", new WordEntry([.. JointFamilies.All.Select(f => f.Word)]), "Family of joint."),
        .. Source("families/*/source", isRequired: false),
        Maybe("families/*/replaces-code-limits", "replaces the code's limits", new TruthEntry(), "true where these limits stand in for the code's general bounds on the gap."),
        Maybe("families/*/figures", "figures", new OpenGroupEntry(), "Figures that hold for all sizes."),
        Maybe("families/*/notes", "notes on figures", new OpenGroupEntry(), "By which judgement and in which direction a figure holds, and its own source."),
        Maybe("families/*/size-series", "series of sizes", new GroupEntry(), "Sizes in equal steps."),
        Needed("families/*/size-series/from", "smallest size", new QuantityEntry(Quantity.Size, new("1 mm", "5 m")), "Smallest size."),
        Needed("families/*/size-series/to", "largest size", new QuantityEntry(Quantity.Size, new("1 mm", "5 m")), "Largest size."),
        Needed("families/*/size-series/step", "step of sizes", new QuantityEntry(Quantity.Size, new("0.1 mm", "1 m")), "Step between sizes."),
        Needed("families/*/size-series/figure", "figure of the series", new TextEntry(60), "The figure that the sizes are."),
        Maybe("families/*/sizes", "sizes", new ListEntry(0, 500, "size"), "Sizes from small to large."),
        Needed("families/*/sizes/*/name", "name of the size", new TextEntry(Name), "Name as it is ordered by, in generic terms."),
        Maybe("families/*/sizes/*/figures", "figures of the size", new OpenGroupEntry(), "Figures of this size; they cover those of the family."),
    ]);
}
