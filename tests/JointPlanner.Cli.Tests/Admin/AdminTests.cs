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
        foreach (var name in (string[])["Archive__Kind", "Archive__ConnectionString", "Archive__AppRole", "PublicAddress"]) Environment.SetEnvironmentVariable(name, null);
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

    [Fact]
    public void The_first_administrator_gets_a_link_made_from_the_public_address()
    {
        Environment.SetEnvironmentVariable("PublicAddress", "https://joints.example/office");
        Ran.Of("admin", "migrate");
        var made = Ran.Of("admin", "create", "--account", "jonas", "--name", "Jonas Varga");
        Assert.Equal(ExitCodes.Done, made.ExitCode);
        Assert.Matches(@"\n  https://joints\.example/office/account/link/[A-Za-z0-9_-]{22}\n", made.Output);

        var again = Ran.Of("admin", "create", "--account", "jonas", "--name", "Jonas Varga");
        Assert.Equal(ExitCodes.FaultyInput, again.ExitCode);
        Assert.Contains("There is an account \"jonas\" already", again.Error, StringComparison.Ordinal);
        var another = Ran.Of("admin", "link", "--account", "jonas");
        Assert.Equal(ExitCodes.Done, another.ExitCode);
        Assert.NotEqual(made.Output, another.Output);
    }

    [Theory]
    [InlineData(null)]
    [InlineData("joints.example")]
    [InlineData("http://joints.example")]
    public void No_link_is_made_without_a_secure_public_address(string? address)
    {
        Environment.SetEnvironmentVariable("PublicAddress", address);
        Ran.Of("admin", "migrate");
        var ran = Ran.Of("admin", "create", "--account", "jonas", "--name", "Jonas Varga");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Contains($"PublicAddress is \"{address}\"", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unmigrated_database_is_told_to_be_migrated_first()
    {
        Environment.SetEnvironmentVariable("PublicAddress", "https://joints.example");
        var ran = Ran.Of("admin", "create", "--account", "jonas", "--name", "Jonas Varga");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Contains("admin migrate", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void An_empty_role_is_refused_before_the_database_is_touched()
    {
        Environment.SetEnvironmentVariable("Archive__Kind", "postgresql");
        Environment.SetEnvironmentVariable("Archive__ConnectionString", "Host=127.0.0.1;Port=1;Database=none");
        Environment.SetEnvironmentVariable("Archive__AppRole", " ");
        var ran = Ran.Of("admin", "migrate");
        Assert.Equal(ExitCodes.FaultyInput, ran.ExitCode);
        Assert.Contains("Archive:AppRole is empty", ran.Error, StringComparison.Ordinal);
    }
}
