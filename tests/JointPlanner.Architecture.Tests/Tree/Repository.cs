using System.Diagnostics;

namespace JointPlanner.Architecture.Tests.Tree;

/// <summary>The checked-out tree: where it lies and which files git tracks in it, as paths from its root with forward slashes.</summary>
public static class Repository
{
    private static readonly Lazy<IReadOnlyList<string>> Listed = new(ListTracked);

    public static string Root { get; } = FindRoot();

    /// <summary>Tracked files that exist, plus new ones that git does not ignore: what a commit made now would hold.</summary>
    public static IReadOnlyList<string> Files => Listed.Value;

    public static IReadOnlyList<string> FilesUnder(string folder, params string[] extensions) =>
        [.. Files.Where(f => f.StartsWith(folder, StringComparison.Ordinal) && extensions.Any(e => f.EndsWith(e, StringComparison.Ordinal)))];

    public static string Text(string file) => File.ReadAllText(Path.Combine(Root, file));

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln")))
            {
                return folder.FullName;
            }
        }
        throw new InvalidOperationException("These tests run from the tree they check: no JointPlanner.sln above " + AppContext.BaseDirectory);
    }

    private static List<string> ListTracked()
    {
        // The tree may belong to another account than the one that runs the tests; git is only asked for names.
        var start = new ProcessStartInfo("git", ["-c", "safe.directory=*", "-c", "core.quotepath=off", "ls-files", "-z", "--cached", "--others", "--exclude-standard"])
        {
            WorkingDirectory = Root,
            RedirectStandardOutput = true,
        };
        using var git = Process.Start(start) ?? throw new InvalidOperationException("git did not start");
        var names = git.StandardOutput.ReadToEnd();
        git.WaitForExit();
        if (git.ExitCode != 0)
        {
            throw new InvalidOperationException($"git could not list the files of {Root}: exit code {git.ExitCode}");
        }
        return [.. names.Split('\0', StringSplitOptions.RemoveEmptyEntries).Distinct().Where(f => File.Exists(Path.Combine(Root, f))).Order(StringComparer.Ordinal)];
    }
}
