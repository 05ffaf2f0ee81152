using System.Collections.Immutable;
using System.Globalization;
using System.Text.RegularExpressions;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Plans.Rules;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Plans;

/// <summary>
/// Reads plans in three passes: the form of the document, each field, fields together. Each pass is complete and leaves out only what an
/// earlier one found broken, so a person sees every fault at once. Nothing is clamped; what stands in for a missing value is listed.
/// </summary>
/// <param name="known">Words known outside the plan; null for none.</param>
public sealed partial class PlanReader(KnownWords? known = null)
{
    private readonly KnownWords known = known ?? KnownWords.None;

    [GeneratedRegex(@"\{([^{}]+)\}")]
    private static partial Regex Place { get; }

    /// <summary>Reads a file's bytes.</summary>
    public PlanReading Read(ReadOnlySpan<byte> utf8) => Read(PlanDocument.Parse(utf8));

    /// <summary>Reads a stream, never more of it than a plan may have.</summary>
    public PlanReading Read(Stream stream) => Read(PlanDocument.Parse(stream));

    private PlanReading Read((PlanDocument? Document, ImmutableArray<Fault> Faults) parsed) =>
        parsed.Document is { } document ? Read(document) : new PlanReading(null, parsed.Faults, [], null);

    /// <summary>Reads a document as it stands on the screen.</summary>
    public PlanReading Read(PlanDocument document)
    {
        if (SchemaCheck.Of(PlanFields.Table, document.Root) is { } schema) return new PlanReading(null, [schema], [], document);
        var form = FormCheck.Of(PlanFields.Table, document.Root);
        var showsUs = document.TextAt("display") == "us";
        var fields = FieldReading.Of(PlanFields.Table, document.Root, form.Broken, showsUs, known.ByWhatTheyName(document.TextAt("basis/code") ?? ""));
        var together = FieldsTogether.Check(document, fields.Values, known);
        var plan = PlanMaking.Of(document, fields.Values);
        var faults = form.Faults.Concat(fields.Faults).Concat(together).Concat(Rules(document, plan, fields.Values, showsUs)).ToImmutableArray();
        return new PlanReading(faults.Any(f => !f.IsWarning) ? null : plan, faults, [.. fields.Values.Defaults.Values], document);
    }

    private static IEnumerable<Fault> Rules(PlanDocument document, Plan plan, FieldValues values, bool showsUs)
    {
        var unread = new HashSet<string>(values.Unread, StringComparer.Ordinal);
        foreach (var rule in PlanRule.All)
        {
            var check = new PlanUnderCheck(plan, unread);
            foreach (var breach in rule.Breaches(check).ToArray())
            {
                if (!breach.IsWarning) unread.Add(breach.Path);
                var typed = document.TextAt(breach.Path) is { } text ? PersonText.Shown(text) : "";
                yield return new Fault(breach.Id, breach.Path, typed, Said(breach.Wrong), Said(breach.Allowed), Said(breach.Remedy), breach.IsWarning);

                string Said(string sentence) => Place.Replace(sentence, place =>
                    int.TryParse(place.Groups[1].Value, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && number < breach.Numbers.Count
                        ? Number(breach.Numbers[number].Quantity, breach.Numbers[number].Value, showsUs)
                        : TextAt(document, values, place.Groups[1].Value) ?? "nothing");
            }
        }
    }

    private static string? TextAt(PlanDocument document, FieldValues values, string path) =>
        document.TextAt(path) is { } text ? PersonText.Shown(text) : values.Defaults.GetValueOrDefault(path)?.Text;

    private static string Number(Quantity quantity, double value, bool showsUs)
    {
        var kind = UnitTable.Of(quantity);
        var unit = showsUs ? kind.Us : kind.Metric;
        return QuantityText.Write(unit.ToSi(double.Parse(unit.FromSi(value).ToString("G6", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)), unit);
    }
}
