using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>
/// Who may use whom. A project's own references are these and no others; what it sees through them is its arrows' arrows.
/// Arrows never change direction: a new one is a decision, written here and in DEVELOPERS.md.
/// </summary>
public class ArrowsTests
{
    private static readonly Dictionary<string, string[]> Arrows = new()
    {
        ["Engine"] = [],
        ["Codes"] = ["Engine"],
        ["Exchange"] = ["Engine"],
        ["Pictures"] = [],
        ["Drawings"] = ["Engine", "Pictures"],
        ["Pdf"] = ["Pictures"],
        ["Sheets"] = ["Engine", "Exchange", "Drawings", "Pdf"],
        ["Archive"] = ["Engine", "Exchange"],
        ["Archive.PostgreSql"] = ["Archive"],
        ["Archive.Sqlite"] = ["Archive"],
        ["Issuing"] = ["Codes", "Exchange", "Sheets", "Archive"],
        ["Web"] = ["Issuing", "Archive.PostgreSql", "Archive.Sqlite"],
        ["Cli"] = ["Issuing", "Archive.PostgreSql", "Archive.Sqlite"],
    };

    private static readonly string[] WithoutPackages = ["Engine", "Codes", "Pictures", "Drawings"];

    [Fact]
    public void Projects_refer_to_each_other_along_the_arrows_only()
    {
        var projects = Repository.FilesUnder("src/", ".csproj").Select(ProjectFile.Read).ToList();

        Assert.Equal(Arrows.Count, projects.Count);
        Expect.NoBreach(Breaches(projects));
    }

    [Fact]
    public void The_program_does_not_refer_to_its_tests()
    {
        var projects = Repository.FilesUnder("src/", ".csproj").Select(ProjectFile.Read).ToList();

        Assert.NotEmpty(projects);
        Assert.DoesNotContain(projects.SelectMany(p => p.Projects), r => r.EndsWith(".Tests", StringComparison.Ordinal));
    }

    [Fact]
    public void The_recomputation_test_refers_to_no_code_of_the_program()
    {
        // It builds the command line tool first but sees nothing of it: it reads only what the tool prints.
        var text = Repository.Text("tests/JointPlanner.Recomputation.Tests/JointPlanner.Recomputation.Tests.csproj");

        var references = text.Split('\n').Where(l => l.Contains("<ProjectReference", StringComparison.Ordinal)).ToList();
        Assert.NotEmpty(references);
        Assert.All(references, l => Assert.Contains("ReferenceOutputAssembly=\"false\"", l, StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("Engine", "Codes", "JointPlanner.Engine refers to JointPlanner.Codes, which is not one of its arrows")]
    [InlineData("Drawings", "Exchange", "JointPlanner.Drawings refers to JointPlanner.Exchange, which is not one of its arrows")]
    public void An_arrow_too_many_is_found(string from, string to, string breach)
    {
        var projects = Arrows.Select(a => Project(a.Key, a.Key == from ? [.. a.Value, to] : a.Value)).ToList();

        Assert.Equal([breach], Breaches(projects));
    }

    [Fact]
    public void An_arrow_too_few_a_package_a_strange_project_and_a_missing_one_are_found()
    {
        var projects = Arrows.Where(a => a.Key != "Cli").Select(a => Project(a.Key, a.Key == "Codes" ? [] : a.Value)).ToList();
        projects[0] = projects[0] with { Packages = ["Some.Package"] };
        projects.Add(Project("Common", []));

        Assert.Equal(
            [
                "JointPlanner.Engine may use no package but uses Some.Package",
                "JointPlanner.Codes lacks its arrow to JointPlanner.Engine",
                "JointPlanner.Common has no place among the arrows",
                "JointPlanner.Cli is missing",
            ],
            Breaches(projects));
    }

    private static ProjectFile Project(string room, string[] arrows) => new(Full(room), [.. arrows.Select(Full)], []);

    private static string Full(string room) => "JointPlanner." + room;

    private static List<string> Breaches(IReadOnlyList<ProjectFile> projects)
    {
        var breaches = new List<string>();
        foreach (var project in projects)
        {
            var room = project.Name.Replace("JointPlanner.", "", StringComparison.Ordinal);
            if (!Arrows.TryGetValue(room, out var arrows))
            {
                breaches.Add($"{project.Name} has no place among the arrows");
                continue;
            }
            var allowed = arrows.Select(Full).ToList();
            breaches.AddRange(project.Projects.Except(allowed).Select(r => $"{project.Name} refers to {r}, which is not one of its arrows"));
            breaches.AddRange(allowed.Except(project.Projects).Select(r => $"{project.Name} lacks its arrow to {r}"));
            if (WithoutPackages.Contains(room))
            {
                breaches.AddRange(project.Packages.Select(p => $"{project.Name} may use no package but uses {p}"));
            }
        }
        breaches.AddRange(Arrows.Keys.Select(Full).Except(projects.Select(p => p.Name)).Select(n => $"{n} is missing"));
        return breaches;
    }
}
