using JointPlanner.Engine.Plans;

namespace JointPlanner.Cli.Compute;

/// <summary>Faults of an input as text: field, value, what is wrong, what is allowed, what to do.</summary>
internal static class FaultText
{
    /// <summary>The lines of all faults.</summary>
    /// <param name="file">The file they stand in.</param>
    /// <param name="faults">The faults.</param>
    public static IEnumerable<string> Lines(string file, IEnumerable<Fault> faults)
    {
        foreach (var fault in faults)
        {
            yield return $"{(fault.IsWarning ? "warning" : "fault")} in {file}, field {(fault.Path.Length > 0 ? fault.Path : "(the whole file)")}";
            if (fault.Value.Length > 0) yield return $"  value:   {fault.Value}";
            yield return $"  wrong:   {fault.Wrong}";
            yield return $"  allowed: {Bare(fault.Allowed)}";
            yield return $"  do:      {fault.Remedy}";
        }
    }

    /// <summary>Sentences of the readers begin with the word that stands before them here.</summary>
    private static string Bare(string allowed) =>
        allowed.StartsWith("Allowed: ", StringComparison.Ordinal) ? allowed["Allowed: ".Length..] : allowed;
}
