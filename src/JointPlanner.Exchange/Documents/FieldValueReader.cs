using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Documents;

/// <summary>What one value of a document says.</summary>
/// <param name="Number">Its number in SI, where it is one.</param>
/// <param name="Text">Its text, where it is one.</param>
/// <param name="Faults">What is wrong or unusual; path and value are filled in by the caller.</param>
public sealed record FieldValue(double? Number, string? Text, IReadOnlyList<Fault> Faults);

/// <summary>Reads one value by what its field asks.</summary>
public static class FieldValueReader
{
    /// <summary>Reads a value.</summary>
    /// <param name="field">The field.</param>
    /// <param name="part">What stands there.</param>
    /// <param name="showsUs">True where a bare number was more likely meant in US units.</param>
    /// <param name="outsideWords">Words known outside the document, by what they name.</param>
    public static FieldValue Read(
        Field field, DocumentNode part, bool showsUs, IReadOnlyDictionary<string, IReadOnlyCollection<string>> outsideWords) => field.Entry switch
        {
            QuantityEntry entry => Quantity(field, entry, part, showsUs),
            RatioEntry entry => Ratio(field, entry, part),
            CountEntry entry => Count(field, entry, part),
            FalseEntry => part is TruthNode { Value: false } ? new(0, "false", []) : Wrong(field, "field.not-false", "Only false may stand here."),
            TruthEntry => part is TruthNode { Value: { } truth } ? new(truth ? 1 : 0, truth ? "true" : "false", []) : Wrong(field, "field.not-truth", $"{field.Name}: true or false belongs here."),
            _ when part is not TextNode => Wrong(field, "field.not-text", $"{field.Name}: a text in quotation marks belongs here."),
            _ => Words(field, ((TextNode)part).Text, outsideWords),
        };

    /// <summary>What a field allows, a sentence.</summary>
    public static string AllowedBy(Field field) => field.Entry switch
    {
        QuantityEntry entry => QuantityRange.Allowed(entry, null),
        RatioEntry r => FormattableString.Invariant($"Allowed: a plain number from {r.Low} to {r.High}."),
        CountEntry c => FormattableString.Invariant($"Allowed: a whole number from {c.Low} to {c.High}."),
        TextEntry t => FormattableString.Invariant($"Allowed: a text of 1 to {t.Longest} characters on one line."),
        WordEntry w => $"Allowed: {string.Join(", ", w.Words)}.",
        IdEntry => "Allowed: 1 to 24 of the characters a–z, 0–9 and hyphen.",
        ReferenceEntry r => $"Allowed: the id of one of the {string.Join(" or ", r.Lists)}.",
        FalseEntry => "Allowed: false.",
        TruthEntry => "Allowed: true or false.",
        OutsideWordEntry o => $"Allowed: a known {o.Of.Replace('-', ' ')}.",
        _ => "Allowed: a group of fields.",
    };

    private static FieldValue Quantity(Field field, QuantityEntry entry, DocumentNode part, bool showsUs)
    {
        var kind = UnitTable.Of(entry.Kind);
        var likely = showsUs ? kind.Us : kind.Metric;
        var isPlainNumber = kind.Units.Contains(Unit.One);
        if (part is not (TextNode or NumberNode)) return Wrong(field, "field.not-quantity", $"{field.Name}: {kind.Words} with its unit belongs here.");
        var text = part is TextNode t ? t.Text : ((NumberNode)part).Text;
        if (part is NumberNode && !isPlainNumber)
            return Wrong(field, "quantity.bare-number", $"{field.Name}: {text} has no unit.", $"Probably meant \"{text} {likely.Name}\": write it so, in quotation marks.");
        if (part is TextNode && entry.OrWord.Length > 0 && text == entry.OrWord) return new(null, entry.OrWord, []);
        var read = QuantityText.Parse(text, entry.Kind, likely);
        if (read.Fault is { } fault)
        {
            var near = entry.OrWord.Length > 0 && part is TextNode && Nearest.Of(text, [entry.OrWord]) is { } word ? $" Or did you mean “{word}”?" : "";
            return new(null, null, [new Fault(fault.Id, "", "", $"{field.Name}: {fault.Wrong}", QuantityRange.Allowed(entry, null), fault.Remedy + near)]);
        }
        return QuantityRange.Check(field, entry, read);
    }

    private static FieldValue Ratio(Field field, RatioEntry entry, DocumentNode part)
    {
        if (part is TextNode { Text: var text })
            return QuantityText.Parse(text, Engine.Formulas.Quantity.Ratio) is { Fault: null, Unit: var unit } read && unit == Unit.One
                ? Wrong(field, "field.number-as-text", $"{field.Name}: a plain number belongs here, without quotation marks.", $"Write {QuantityText.Write(read.Value)}.")
                : Wrong(field, "field.not-a-number", $"{field.Name}: “{PersonText.Shown(text)}” is not a plain number.");
        if (Value(part) is not { } value) return Wrong(field, "field.not-a-number", $"{field.Name}: a plain number belongs here.");
        return value >= entry.Low && value <= entry.High ? new(value, null, []) : OutOfRange(field, value);
    }

    private static FieldValue Count(Field field, CountEntry entry, DocumentNode part)
    {
        if (Value(part) is not { } value || value != Math.Truncate(value))
            return Wrong(field, "field.not-whole", $"{field.Name}: a whole number belongs here, without quotation marks.");
        return value >= entry.Low && value <= entry.High ? new(value, null, []) : OutOfRange(field, value);
    }

    private static double? Value(DocumentNode part) =>
        part is NumberNode number && double.TryParse(number.Text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value)
            ? value
            : null;

    private static FieldValue Words(Field field, string text, IReadOnlyDictionary<string, IReadOnlyCollection<string>> outsideWords)
    {
        var longest = field.Entry is TextEntry entry ? entry.Longest : DocumentLimits.NameLength;
        if (PersonText.HasForbidden(text))
            return Wrong(field, "text.characters", $"{field.Name}: the text holds a control character, a line break or a mark that turns the writing direction.",
                "Type the text anew, on one line.");
        if (text.Length > longest)
            return Wrong(field, "text.too-long", FormattableString.Invariant($"{field.Name}: the text has {text.Length} characters."),
                FormattableString.Invariant($"Shorten it to {longest} characters."));
        if (text.Trim().Length == 0)
            return field.IsRequired || field.Entry is not TextEntry ? Wrong(field, "text.empty", $"{field.Name}: the text is empty.") : new(null, "", []);
        return field.Entry switch
        {
            WordEntry words => Known(field, text, words.Words),
            OutsideWordEntry outside when outsideWords.TryGetValue(outside.Of, out var known) => Known(field, text, known),
            ReferenceEntry or IdEntry when !ItemAddresses.IsId(text) => Wrong(field, "id.shape", $"{field.Name}: “{text}” cannot be an id.",
                "Write the id of an item as it stands there."),
            _ => new(null, text, []),
        };
    }

    private static FieldValue Known(Field field, string text, IReadOnlyCollection<string> words)
    {
        if (words.Contains(text)) return new(null, text, []);
        var nearest = Nearest.Of(text, words);
        var allowed = words.Count == 0 ? "Allowed: none is known." : words.Count <= 40 ? $"Allowed: {string.Join(", ", words)}." : AllowedBy(field);
        return new(null, null, [new Fault("field.unknown-word", "", "", $"{field.Name}: “{text}” is not known.", allowed,
            nearest is null ? "Choose one of them." : $"Did you mean “{nearest}”?")]);
    }

    private static FieldValue OutOfRange(Field field, double value) =>
        Wrong(field, "field.range", $"{field.Name}: {QuantityText.Write(value)} is out of range.", "Correct the number.");

    private static FieldValue Wrong(Field field, string id, string wrong, string remedy = "") =>
        new(null, null, [new Fault(id, "", "", wrong, AllowedBy(field), remedy.Length > 0 ? remedy : field.Hint.Length > 0 ? $"Write it so: {field.Hint}." : "Correct it.")]);
}
