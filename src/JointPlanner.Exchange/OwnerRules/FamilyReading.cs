using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>Reads the rules of one joint family: the family itself says which figures it knows and of which kind they are.</summary>
internal sealed class FamilyReading
{
    private const int MostSizes = 500;

    private readonly FieldValues values;
    private readonly string path;
    private readonly MapNode node;
    private readonly JointFamily family;
    private readonly List<Fault> faults = [];

    public FamilyReading(FieldValues values, string path, MapNode node, string word) =>
        (this.values, this.path, this.node, family) = (values, path, node, JointFamilies.Named(word)!);

    public IReadOnlyList<Fault> Faults => faults;

    public FamilyRules Make(Provenance source, Func<string, Provenance?> sourceAt)
    {
        var figures = FigureReading.Of(family, $"{path}/figures", node["figures"] as MapNode, faults);
        var sizes = Sizes();
        foreach (var (size, sizePath) in sizes) Complete(figures, size, sizePath);
        Rising(sizes);
        if (sizes.Length == 0 && !values.Unread.Any(u => u.StartsWith($"{path}/size", StringComparison.Ordinal)))
            faults.Add(new("families.no-sizes", $"{path}/sizes", "", $"There are no sizes of {family.Name}.", "Allowed: sizes, or a series of sizes.", "Give the sizes, or take the family out."));
        return new FamilyRules
        {
            Family = family.Word,
            Source = source,
            Figures = figures,
            Notes = FigureReading.Notes(family, $"{path}/notes", node["notes"] as MapNode, faults),
            ReplacesCodeLimits = values.Text($"{path}/replaces-code-limits") == "true",
            Sizes = [.. sizes.Select(s => s.Size)],
        };
    }

    private ImmutableArray<(FamilySize Size, string Path)> Sizes()
    {
        var hasSeries = values.HasGroup($"{path}/size-series");
        var paths = values.Items($"{path}/sizes");
        if (hasSeries && paths.Count > 0)
            faults.Add(new("families.two-size-lists", $"{path}/size-series", "", "Both sizes and a series of sizes are given.", "Allowed: one of the two.", "Take one of them out."));
        if (hasSeries) return [.. Series().Select(size => (size, $"{path}/size-series"))];
        var list = node["sizes"] as ListNode;
        return
        [
            .. paths.Select((p, i) => (new FamilySize(values.Text($"{p}/name"),
                FigureReading.Of(family, $"{p}/figures", (list?.Items[i] as MapNode)?["figures"] as MapNode, faults)), p)),
        ];
    }

    private IEnumerable<FamilySize> Series()
    {
        var (from, to, step) = (values.Number($"{path}/size-series/from"), values.Number($"{path}/size-series/to"), values.Number($"{path}/size-series/step"));
        var word = values.Text($"{path}/size-series/figure");
        if (word.Length > 0 && family.Figures.All(f => f.Word != word || f.Quantity.Dimension != Unit.Metre.Dimension))
        {
            var words = family.Figures.Where(f => f.Quantity.Dimension == Unit.Metre.Dimension).Select(f => f.Word).ToArray();
            var nearest = Nearest.Of(word, words);
            faults.Add(new("figures.unknown", $"{path}/size-series/figure", word, $"“{PersonText.Shown(word)}” is not a figure of {family.Name} that sizes can go by.", $"Allowed: {string.Join(", ", words)}.",
                nearest is null ? "Choose one of them." : $"Did you mean “{nearest}”?"));
            yield break;
        }
        if (word.Length == 0 || !(step > 0) || !double.IsFinite(from) || !double.IsFinite(to)) yield break;
        var count = Math.Round((to - from) / step, 6);
        if (count < 0 || count != Math.Round(count) || count > MostSizes)
        {
            faults.Add(new("families.series", $"{path}/size-series/to", "", "The series does not lead from its smallest to its largest size in whole steps.",
                FormattableString.Invariant($"Allowed: the smallest size and a whole number of steps, up to {MostSizes}."), "Correct the largest size or the step."));
            yield break;
        }
        var unit = QuantityText.Parse(((node["size-series"] as MapNode)?["from"] as TextNode)?.Text ?? "", Quantity.Size).Unit ?? Unit.Millimetre;
        for (var i = 0; i <= (int)count; i++)
        {
            // Sizes are named in the unit of the series; 0.1 + 0.2 must not show.
            var size = unit.ToSi(Math.Round(unit.FromSi(from + (i * step)), 6));
            yield return new FamilySize(QuantityText.Write(size, unit), ImmutableSortedDictionary<string, double>.Empty.Add(word, size));
        }
    }

    private void Complete(ImmutableSortedDictionary<string, double> common, FamilySize size, string sizePath)
    {
        foreach (var figure in family.Figures.Where(f => f.IsRequired && !size.Figures.ContainsKey(f.Word) && !common.ContainsKey(f.Word)))
        {
            var at = sizePath.EndsWith("/size-series", StringComparison.Ordinal) ? $"{path}/figures/{figure.Word}" : $"{sizePath}/figures/{figure.Word}";
            // Said once for all sizes of a series, and not beside a misspelling that was said already.
            if (faults.Any(f => f.Path == at || f.Path == $"{path}/figures/{figure.Word}" || (f.Id == "figures.unknown" && f.Remedy.Contains($"“{figure.Word}”", StringComparison.Ordinal)))) continue;
            faults.Add(new("figures.missing", at, "", $"Size {size.Name} of {family.Name} has no {figure.Word}: {figure.Meaning}.", FigureReading.Allowed(figure), "Give it for the size, or once for the family."));
        }
        var all = common.SetItems(size.Figures);
        foreach (var (word, least) in all)
        {
            if (!word.StartsWith("least-", StringComparison.Ordinal) || !all.TryGetValue("greatest-" + word["least-".Length..], out var greatest) || !(least >= greatest)) continue;
            var at = size.Figures.ContainsKey(word) ? $"{sizePath}/figures/{word}" : $"{path}/figures/{word}";
            if (faults.All(f => f.Path != at))
                faults.Add(new("figures.out-of-order", at, "", $"The {word} of {family.Name} is not below its greatest.", "Allowed: less than the greatest.", "Correct one of the two."));
        }
    }

    private void Rising(ImmutableArray<(FamilySize Size, string Path)> sizes)
    {
        var word = family.SizeFigure.Word;
        for (var i = 1; i < sizes.Length; i++)
            if (sizes[i - 1].Size.Figures.TryGetValue(word, out var before) && sizes[i].Size.Figures.TryGetValue(word, out var size) && size <= before)
                faults.Add(new("families.sizes-fall", $"{sizes[i].Path}/figures/{word}", "", $"Size {sizes[i].Size.Name} is not larger than size {sizes[i - 1].Size.Name} before it.",
                    "Allowed: sizes from small to large.", "Put the sizes in order, each once."));
    }
}
