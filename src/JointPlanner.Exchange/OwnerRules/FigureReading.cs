using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>Reads figures of a joint family by the words and kinds that the family itself states.</summary>
internal static class FigureReading
{
    private static readonly Dictionary<string, IReadOnlyCollection<string>> NoOutsideWords = [];

    private static readonly FieldTable NoteTable = new("note", 1,
    [
        new("judged-by", "judgement", new WordEntry([.. Enum.GetValues<Column>().Select(MemberWords.Of)]), "Column of the counting table whose movements are set against the figure."),
        new("measure", "direction", new WordEntry([.. Enum.GetValues<Measure>().Select(MemberWords.Of)]), "Direction in which the figure is measured."),
        new("source", "source of the figure", new GroupEntry(), "Where the figure comes from."),
        .. new[] { "mark", "document", "edition", "place", "value-id" }.Select(word => OwnerRuleFields.Table.Find($"source/{word}")!),
    ]);

    public static ImmutableSortedDictionary<string, double> Of(JointFamily family, string path, MapNode? node, List<Fault> faults)
    {
        var figures = ImmutableSortedDictionary.CreateBuilder<string, double>(StringComparer.Ordinal);
        foreach (var (word, part) in Known(family, path, node, faults))
        {
            var figure = family.Figures.First(f => f.Word == word);
            var read = FieldValueReader.Read(FieldOf(figure), part, showsUs: false, NoOutsideWords);
            faults.AddRange(read.Faults.Select(f => f with { Path = $"{path}/{word}", Value = FormCheck.Shown(part) }));
            if (read.Number is { } value) figures[word] = value;
        }
        return figures.ToImmutable();
    }

    public static ImmutableSortedDictionary<string, FigureNote> Notes(JointFamily family, string path, MapNode? node, List<Fault> faults)
    {
        var notes = ImmutableSortedDictionary.CreateBuilder<string, FigureNote>(StringComparer.Ordinal);
        foreach (var (word, part) in Known(family, path, node, faults))
        {
            if (part is not MapNode note)
            {
                faults.Add(new("form.not-a-group", $"{path}/{word}", FormCheck.Shown(part), "A group of fields belongs here.", "Allowed: { … } with judged-by, measure and source.", "Write the group, or take this out."));
                continue;
            }
            var form = FormCheck.Of(NoteTable, note);
            var fields = FieldReading.Of(NoteTable, note, form.Broken);
            faults.AddRange(form.Faults.Concat(fields.Faults).Select(f => f with { Path = $"{path}/{word}/{f.Path}" }));
            var values = fields.Values;
            notes[word] = new FigureNote(
                values.Has("judged-by") ? MemberWords.Of<Column>(values.Text("judged-by")) : null,
                values.Has("measure") ? MemberWords.Of<Measure>(values.Text("measure")) : null,
                values.HasGroup("source") ? new Provenance(MemberWords.Of<Mark>(values.Text("source/mark")), values.Text("source/document"), values.Text("source/edition"), values.Text("source/place"), values.Text("source/value-id")) : null);
        }
        return notes.ToImmutable();
    }

    public static string Allowed(FamilyFigure figure) => FieldValueReader.AllowedBy(FieldOf(figure));

    private static IEnumerable<KeyValuePair<string, DocumentNode>> Known(JointFamily family, string path, MapNode? node, List<Fault> faults)
    {
        if (node is null) yield break;
        foreach (var repeated in node.Repeated.Distinct())
            faults.Add(new("form.repeated", $"{path}/{PersonText.Shown(repeated)}", PersonText.Shown(repeated), $"“{PersonText.Shown(repeated)}” stands here more than once.", "Allowed: each name once in its group.", "Take out all but one."));
        foreach (var entry in node.Entries)
        {
            if (family.Figures.Any(f => f.Word == entry.Key))
            {
                if (!node.Repeated.Contains(entry.Key)) yield return entry;
                continue;
            }
            var nearest = Nearest.Of(entry.Key, family.Figures.Select(f => f.Word));
            var shown = PersonText.Shown(entry.Key);
            faults.Add(new("figures.unknown", $"{path}/{shown}", shown, $"“{shown}” is not a figure of {family.Name}.", $"Allowed: {string.Join(", ", family.Figures.Select(f => f.Word))}.",
                nearest is null ? "Take it out." : $"Did you mean “{nearest}”?"));
        }
    }

    private static Field FieldOf(FamilyFigure figure)
    {
        Entry entry = figure.Quantity == Quantity.Ratio ? new RatioEntry(0, 10)
            : figure.Quantity == Quantity.Count ? new CountEntry(1, 100)
            : figure.Quantity == Quantity.Angle ? new QuantityEntry(Quantity.Angle, new("0°", "90°"))
            : figure.Quantity.Dimension == Unit.Metre.Dimension ? new QuantityEntry(figure.Quantity, new("0 mm", "10 m"))
            : throw new InvalidOperationException($"No range is set for figures of kind {figure.Quantity}.");
        return new Field(figure.Word, figure.Meaning, entry, figure.Meaning);
    }
}
