using System.Text.Json;

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>The folder of one installation of the demonstration, thrown away afterwards.</summary>
public sealed class SiteFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("joint-planner-e2e-").FullName;

    /// <summary>Key file of a demo signer; its password is the person's.</summary>
    public string KeyFile(string account) => System.IO.Path.Combine(Path, $"demo-{account}.pfx");

    /// <summary>Password of a demo person.</summary>
    public string Password(string account) =>
        JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(System.IO.Path.Combine(Path, "demo-people.json")))![account];

    public void Dispose()
    {
        if (Directory.Exists(Path)) Directory.Delete(Path, recursive: true);
    }
}
