namespace JointPlanner.Cli.Tests.Admin;

/// <summary>The database's administration on SQLite; the settings are read from the environment, so these tests run one after another.</summary>
[Collection("environment")]
public sealed class AdminTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-admin-").FullName;

    public AdminTests()
    {
        Environment.SetEnvironmentVariable("Archive__Kind", "sqlite");
        Environment.SetEnvironmentVariable("Archive__Folder", folder);
    }

    public void Dispose()
    {
        Environment.SetEnvironmentVariable("Archive__Kind", null);
        Environment.SetEnvironmentVariable("Archive__Folder", null);
        Directory.Delete(folder, recursive: true);
    }

    [Fact]
    public void A_new_database_is_migrated_and_its_chains_are_whole()
    {
        Assert.Equal(ExitCodes.Done, Ran.Of("admin", "migrate").ExitCode);
        var walked = Ran.Of("admin", "verify-archive");
        Assert.Equal(ExitCodes.Done, walked.ExitCode);
        Assert.StartsWith("Whole:", walked.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_kind_of_database_is_named_with_what_is_allowed()
    {
        Environment.SetEnvironmentVariable("Archive__Kind", "oracle of delphi");
        var ran = Ran.Of("admin", "migrate");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Contains("Allowed are sqlite and postgresql", ran.Error, StringComparison.Ordinal);
    }
}
