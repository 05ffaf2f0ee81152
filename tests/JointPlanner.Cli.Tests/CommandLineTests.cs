namespace JointPlanner.Cli.Tests;

public class CommandLineTests
{
    [Theory]
    [InlineData("compute")]
    [InlineData("compute", "plan.json", "--profile", "imperial")]
    [InlineData("compute", "plan.json", "--unknown")]
    [InlineData("conjure")]
    public void Wrong_usage_has_an_exit_code_of_its_own_and_points_to_help(params string[] arguments)
    {
        var ran = Ran.Of(arguments);
        Assert.Equal(ExitCodes.WrongUsage, ran.ExitCode);
        Assert.Contains("--help", ran.Error, StringComparison.Ordinal);
        Assert.Equal("", ran.Output);
    }

    [Fact]
    public void Help_tells_the_exit_codes()
    {
        var ran = Ran.Of("compute", "--help");
        Assert.Equal(ExitCodes.Done, ran.ExitCode);
        Assert.Contains("3 computed, but something stops issue", ran.Output, StringComparison.Ordinal);
    }
}
