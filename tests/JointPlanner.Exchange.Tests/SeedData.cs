namespace JointPlanner.Exchange.Tests;

/// <summary>Finds the project's own seed data from wherever the tests run.</summary>
internal static class SeedData
{
    public static string Folder { get; } = Find();

    public static IEnumerable<string> Plans() =>
        Directory.GetFiles(Path.Combine(Folder, "structures"), "*.json").Concat(Directory.GetFiles(Path.Combine(Folder, "published"), "*.json")).Order(StringComparer.Ordinal);

    public static IEnumerable<string> OwnerRules() => Directory.GetFiles(Path.Combine(Folder, "owner-rules"), "*.json").Order(StringComparer.Ordinal);

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln")))
                return Path.Combine(folder.FullName, "seed-data");
        throw new InvalidOperationException("The tests do not run inside the project.");
    }
}
