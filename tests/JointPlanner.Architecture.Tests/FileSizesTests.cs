using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>Files stay short enough to be read: a long one has a reason that stands here, and no reason is good for a thousand lines.</summary>
public class FileSizesTests
{
    private static readonly Dictionary<string, string> Reasons = [];

    [Fact]
    public void No_file_is_long_without_a_reason()
    {
        var files = Repository.Files.Where(IsSource).Select(f => (f, LinesOf(Repository.Text(f)))).ToList();

        Assert.True(files.Count > 50, $"only {files.Count} files");
        Expect.NoBreach(Breaches(files, Reasons));
    }

    [Fact]
    public void Long_files_and_reasons_grown_stale_are_found()
    {
        (string, int)[] files = [("A.cs", 300), ("B.cs", 301), ("C.cs", 999), ("D.cs", 1001), ("P.razor", 81), ("Q.razor", 80), ("P.razor.cs", 151), ("Q.razor.cs", 150)];
        var reasons = new Dictionary<string, string> { ["C.cs"] = "a table", ["D.cs"] = "a table", ["A.cs"] = "once was long", ["Z.cs"] = "gone" };

        Assert.Equal(
            [
                "B.cs has 301 lines, 300 are allowed without a reason",
                "D.cs has 1001 lines, 1000 are allowed with the best of reasons",
                "P.razor has 81 lines, 80 are allowed without a reason",
                "P.razor.cs has 151 lines, 150 are allowed without a reason",
                "A.cs needs no reason any more",
                "Z.cs needs no reason any more",
            ],
            Breaches(files, reasons));
    }

    private static bool IsSource(string file) =>
        (file.EndsWith(".cs", StringComparison.Ordinal) && !file.Contains("/Migrations/", StringComparison.Ordinal)) || file.EndsWith(".razor", StringComparison.Ordinal);

    private static int LinesOf(string text) => text.Split('\n').Length - (text.EndsWith('\n') ? 1 : 0);

    private static int AllowedFor(string file) =>
        file.EndsWith(".razor", StringComparison.Ordinal) ? 80 : file.EndsWith(".razor.cs", StringComparison.Ordinal) ? 150 : 300;

    private static List<string> Breaches(IReadOnlyList<(string Name, int Lines)> files, Dictionary<string, string> reasons)
    {
        var breaches = new List<string>();
        foreach (var (name, lines) in files)
        {
            if (lines > 1000)
            {
                breaches.Add($"{name} has {lines} lines, 1000 are allowed with the best of reasons");
            }
            else if (lines > AllowedFor(name) && !reasons.ContainsKey(name))
            {
                breaches.Add($"{name} has {lines} lines, {AllowedFor(name)} are allowed without a reason");
            }
        }
        breaches.AddRange(reasons.Keys.Where(r => !files.Any(f => f.Name == r && f.Lines > AllowedFor(r))).Select(r => $"{r} needs no reason any more"));
        return breaches;
    }
}
