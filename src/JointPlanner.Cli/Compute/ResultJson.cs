using System.Text.Json.Nodes;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing;

namespace JointPlanner.Cli.Compute;

/// <summary>A computed plan for machines: what would be stored beside an issued sheet, and what a person would be told.</summary>
internal static class ResultJson
{
    /// <summary>The calculation as an object.</summary>
    /// <param name="calculation">A calculation that has a result.</param>
    /// <param name="profile">Units of the sentences.</param>
    public static JsonObject Of(Calculation calculation, DisplayProfile profile)
    {
        var result = calculation.Result!;
        var package = calculation.Package([]).ToUtf8();
        return new JsonObject
        {
            ["structure"] = result.Plan.Structure.Number,
            ["code"] = calculation.Basis!.Id,
            ["code-revision"] = calculation.Basis.Revision,
            ["owner-rules"] = calculation.Owner?.Rules?.Id,
            ["can-be-issued"] = result.CanBeIssued,
            ["results"] = JsonNode.Parse(ResultsFile.ToUtf8(calculation.Stored(ContentHash.Of(package)))),
            ["findings"] = new JsonArray([
                .. result.Findings.Select(f => new JsonObject
                {
                    ["id"] = f.Id,
                    ["severity"] = MemberWords.Of(f.Severity),
                    ["field"] = f.Path,
                    ["sentence"] = FindingText.Of(f, profile),
                }),
            ]),
            ["defaults"] = new JsonArray([
                .. calculation.Reading.Defaults.Select(d => new JsonObject { ["field"] = d.Path, ["value"] = d.Text, ["reason"] = d.Reason }),
            ]),
            ["memory-values"] = new JsonArray([
                .. result.MemoryValues.Select(v => new JsonObject { ["id"] = v.ValueId, ["source"] = ProvenanceText.Of(v) }),
            ]),
        };
    }
}
