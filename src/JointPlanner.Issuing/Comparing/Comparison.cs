using System.Collections.Immutable;
using System.Globalization;
using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Issuing.Comparing;

/// <summary>In what two frozen calculations differ, from their stored packages and results alone.</summary>
public static class Comparison
{
    /// <summary>Compares.</summary>
    /// <param name="before">The earlier one: usually what was issued last.</param>
    /// <param name="after">The later one.</param>
    public static Differences Of(StoredCalculation before, StoredCalculation after) =>
        Of(before, after, Calculation.Of(after.Package).Result);

    /// <summary>Compares, with the later one's steps at hand.</summary>
    /// <param name="before">The earlier one.</param>
    /// <param name="after">The later one.</param>
    /// <param name="computed">What the later package computes to here: it says what each key means and how much rounding its result may carry.</param>
    internal static Differences Of(StoredCalculation before, StoredCalculation after, Result? computed)
    {
        var (then, now) = (before.Package, after.Package);
        var numbers = new NumberComparison(computed);
        return new Differences
        {
            Inputs = Texts(then.Plan.Root, now.Plan.Root, PlanFields.Table),
            Basis =
            [
                .. Facts(then, before.Results).Zip(Facts(now, after.Results))
                    .Where(p => p.First.Value != p.Second.Value).Select(p => new TextDifference("", p.First.Name, Given(p.First.Value), Given(p.Second.Value))),
            ],
            OwnerRules = Texts(then.OwnerRules, now.OwnerRules, OwnerRuleFields.Table),
            Confirmations = Confirmed(then, now),
            Choices = Choices(before.Results, after.Results),
            Results = numbers.Results(before.Results, after.Results),
            Tables = numbers.Tables(before.Results, after.Results),
            Findings = NumberComparison.Findings(before.Results, after.Results),
            Compared = numbers.Compared,
            WithinRounding = numbers.WithinRounding,
        };
    }

    private static ImmutableArray<TextDifference> Texts(DocumentNode? before, DocumentNode? after, FieldTable fields)
    {
        var (then, now) = (DocumentLeaves.Of(before), DocumentLeaves.Of(after));
        return
        [
            .. then.Keys.Union(now.Keys)
                .Select(path => new TextDifference(path, fields.At(path)?.Name ?? path[(path.LastIndexOf('/') + 1)..], then.GetValueOrDefault(path), now.GetValueOrDefault(path)))
                .Where(d => d.Before != d.After),
        ];
    }

    private static IEnumerable<(string Name, string Value)> Facts(CalculationPackage package, StoredResults results) =>
    [
        ("code edition", Catalogue.Find(package.CodeId)?.Title ?? package.CodeId),
        ("correction of the code folder", package.CodeRevision.ToString(CultureInfo.InvariantCulture)),
        ("program", package.EngineVersion), ("program of the results", results.Engine), ("units of the sheet", package.Units),
        ("step of rounding, m", package.RoundingStep.ToString("R", CultureInfo.InvariantCulture)), ("climate record, SHA-256", package.ClimateRecord),
    ];

    private static ImmutableArray<TextDifference> Confirmed(CalculationPackage before, CalculationPackage after)
    {
        var (then, now) = (before.Confirmations.ToDictionary(c => c.ValueId, Sentence), after.Confirmations.ToDictionary(c => c.ValueId, Sentence));
        return
        [
            .. then.Keys.Union(now.Keys).Order(StringComparer.Ordinal)
                .Select(id => new TextDifference("", id, then.GetValueOrDefault(id), now.GetValueOrDefault(id))).Where(d => d.Before != d.After),
        ];
    }

    private static ImmutableArray<TextDifference> Choices(StoredResults before, StoredResults after)
    {
        var (then, now) = (before.Joints.ToDictionary(j => j.Joint, Device), after.Joints.ToDictionary(j => j.Joint, Device));
        return
        [
            .. then.Keys.Union(now.Keys).Select(joint => new TextDifference($"joints/{joint}", $"joint {joint}", then.GetValueOrDefault(joint), now.GetValueOrDefault(joint)))
                .Where(d => d.Before != d.After),
        ];
    }

    private static string Device(StoredJoint joint) => joint.Family.Length == 0 ? "none" : $"{joint.Family}, {joint.Size}";

    private static string Sentence(Confirmation c) =>
        string.Create(CultureInfo.InvariantCulture, $"{string.Join(", ", new[] { c.Document, c.Edition, c.Place }.Where(p => p.Length > 0))}: {c.Person}, {c.Date:yyyy-MM-dd}");

    private static string? Given(string value) => value.Length == 0 ? null : value;
}
