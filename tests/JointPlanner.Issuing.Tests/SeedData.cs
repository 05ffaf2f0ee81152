using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Issuing.Tests;

/// <summary>The plans and rule sets that ship with the program.</summary>
internal static class SeedData
{
    public static readonly string Folder = Find();

    public static readonly OwnerRuleShelf Shelf = OwnerRuleShelf.Read(Path.Combine(Folder, "owner-rules"));

    public static string[] Structures => [.. Directory.GetFiles(Path.Combine(Folder, "structures"), "*.json").Order(StringComparer.Ordinal)];

    public static TheoryData<string> StructureNames => [.. Structures.Select(f => Path.GetFileNameWithoutExtension(f)!)];

    public static PlanDocument Structure(string name) => Plan(Path.Combine("structures", name + ".json"));

    public static PlanDocument Published(string name) => Plan(Path.Combine("published", name + ".json"));

    public static string RulesText(string id) => File.ReadAllText(Path.Combine(Folder, "owner-rules", id + ".json"));

    /// <summary>The shelf with one rule set changed.</summary>
    public static OwnerRuleShelf ShelfWith(string id, Func<string, string> change)
    {
        var text = change(RulesText(id));
        Assert.NotEqual(RulesText(id), text);
        var reading = OwnerRulesReader.Read(System.Text.Encoding.UTF8.GetBytes(text));
        Assert.Empty(reading.Faults.Where(f => !f.IsWarning).Select(f => $"{f.Path}: {f.Wrong}"));
        return new OwnerRuleShelf([reading]);
    }

    private static PlanDocument Plan(string file)
    {
        var (document, faults) = PlanDocument.Parse(File.ReadAllBytes(Path.Combine(Folder, file)));
        return document ?? throw new InvalidDataException(faults[0].Wrong);
    }

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) return Path.Combine(folder.FullName, "seed-data");
        throw new DirectoryNotFoundException("No folder above the tests holds JointPlanner.sln.");
    }
}
