using System.Text.Json.Nodes;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Cli.Compute;

/// <summary>Faults for machines, with the same parts as for people.</summary>
internal static class FaultJson
{
    /// <summary>The faults as an array.</summary>
    public static JsonArray Of(IEnumerable<(string File, Fault Fault)> faults) =>
    [
        .. faults.Select(f => new JsonObject
        {
            ["id"] = f.Fault.Id,
            ["file"] = f.File,
            ["field"] = f.Fault.Path,
            ["value"] = f.Fault.Value,
            ["wrong"] = f.Fault.Wrong,
            ["allowed"] = f.Fault.Allowed,
            ["do"] = f.Fault.Remedy,
            ["is-warning"] = f.Fault.IsWarning,
        }),
    ];
}
