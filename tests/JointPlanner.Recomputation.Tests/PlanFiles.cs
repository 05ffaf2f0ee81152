namespace JointPlanner.Recomputation.Tests;

/// <summary>Where this build's program and the project's plan files lie, found from the test's own place.</summary>
internal static class PlanFiles
{
    // …/tests/<project>/bin/<configuration>/<framework>/
    private static readonly DirectoryInfo Here = new(AppContext.BaseDirectory.TrimEnd(Path.DirectorySeparatorChar));

    public static readonly string Root = Here.Parent!.Parent!.Parent!.Parent!.Parent!.FullName;

    public static readonly string Program = Path.Combine(
        Root, "src", "JointPlanner.Cli", "bin", Here.Parent!.Name, Here.Name, "joint-planner.dll");

    private static readonly string[] Folders = ["structures", "published"], Profiles = ["metric", "us"];

    /// <summary>Demo structures and published examples, each in both profiles.</summary>
    public static IEnumerable<(string Plan, string Profile)> InBothProfiles =>
        from folder in Folders
        from file in Directory.EnumerateFiles(Path.Combine(Root, "seed-data", folder), "*.json").Order(StringComparer.Ordinal)
        from profile in Profiles
        select ($"{folder}/{Path.GetFileName(file)}", profile);

    public static string PathOf(string plan) => Path.Combine(Root, "seed-data", plan);
}
