namespace JointPlanner.Cli.Tests;

/// <summary>One run of the program inside the test.</summary>
/// <param name="ExitCode">What it told the shell.</param>
/// <param name="Output">What it wrote.</param>
/// <param name="Error">What it wrote beside that.</param>
internal sealed record Ran(int ExitCode, string Output, string Error)
{
    public static Ran Of(params string[] arguments)
    {
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = CommandLine.Run(arguments, output, error);
        return new(code, output.ToString().ReplaceLineEndings("\n"), error.ToString().ReplaceLineEndings("\n"));
    }
}
