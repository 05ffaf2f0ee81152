using System.Text.Json.Nodes;

namespace JointPlanner.Cli.Tests;

/// <summary>The project's plan files, and altered copies of them in a folder of their own.</summary>
public sealed class SeedData : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-").FullName;

    public static readonly string Root = RootOf(new DirectoryInfo(AppContext.BaseDirectory));

    public static string Structure(string name) => Path.Combine(Root, "seed-data", "structures", name + ".json");

    public static string OwnerRules(string id) => Path.Combine(Root, "seed-data", "owner-rules", id + ".json");

    /// <summary>A copy of the composite demo bridge with a change; its rules lie where the program looks for them.</summary>
    public string Altered(Action<JsonNode> change)
    {
        var plan = JsonNode.Parse(File.ReadAllText(Structure("sorrel-creek-crossing")))!;
        change(plan);
        return Written(plan.ToJsonString());
    }

    /// <summary>A file with this text.</summary>
    public string Written(string text)
    {
        Directory.CreateDirectory(Path.Combine(folder, "owner-rules"));
        File.Copy(OwnerRules("demonstration-metric"), Path.Combine(folder, "owner-rules", "demonstration-metric.json"), overwrite: true);
        var path = Path.Combine(folder, "plan.json");
        File.WriteAllText(path, text);
        return path;
    }

    public void Dispose() => Directory.Delete(folder, recursive: true);

    private static string RootOf(DirectoryInfo? folder)
    {
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) folder = folder.Parent;
        return folder?.FullName ?? throw new InvalidOperationException("The tests run outside the project's tree.");
    }
}
