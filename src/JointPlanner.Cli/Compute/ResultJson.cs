using System.Text.Json.Nodes;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Cli.Compute;

/// <summary>A computed plan for machines: every result by key in SI, findings, and what is held from memory.</summary>
internal static class ResultJson
{
    /// <summary>The result as an object.</summary>
    public static JsonObject Of(Result result, CodeBasis basis, OwnerRuleSet? rules, DisplayProfile profile) => new()
    {
        ["structure"] = result.Plan.Structure.Number,
        ["code"] = basis.Id,
        ["code-revision"] = basis.Revision,
        ["owner-rules"] = rules?.Id,
        ["can-be-issued"] = result.CanBeIssued,
        ["results"] = Results(result),
        ["findings"] = new JsonArray([
            .. result.Findings.Select(f => new JsonObject
            {
                ["id"] = f.Id,
                ["severity"] = Exchange.Documents.MemberWords.Of(f.Severity),
                ["field"] = f.Path,
                ["sentence"] = FindingText.Of(f, profile),
            }),
        ]),
        ["memory-values"] = new JsonArray([
            .. result.MemoryValues.Select(v => new JsonObject { ["id"] = v.ValueId, ["source"] = ProvenanceText.Of(v) }),
        ]),
    };

    private static JsonObject Results(Result result)
    {
        var results = new JsonObject();
        foreach (var (key, step) in result.ByKey().OrderBy(r => r.Key, StringComparer.Ordinal))
            results[key] = new JsonObject
            {
                ["value"] = step.Value,
                ["quantity"] = step.Quantity.Id,
                ["formula"] = step.Origin is FormulaOrigin f ? f.Formula.Id : null,
            };
        return results;
    }
}
