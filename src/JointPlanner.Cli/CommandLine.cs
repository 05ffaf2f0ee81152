using System.CommandLine;
using JointPlanner.Cli.Admin;
using JointPlanner.Cli.Comparing;
using JointPlanner.Cli.Compute;
using JointPlanner.Cli.Sheets;
using JointPlanner.Cli.Signing;
using JointPlanner.Cli.Verifying;

namespace JointPlanner.Cli;

/// <summary>The program's commands, one file each.</summary>
internal static class CommandLine
{
    /// <summary>Runs one command.</summary>
    /// <param name="arguments">Words behind the program's name.</param>
    /// <param name="output">Where results go.</param>
    /// <param name="error">Where everything else goes.</param>
    /// <returns>One of <see cref="ExitCodes"/>.</returns>
    public static int Run(string[] arguments, TextWriter output, TextWriter error)
    {
        var root = new RootCommand("Movements, joints and setting tables of bridge decks, from plan files. " + ExitCodes.InWords)
        {
            ComputeCommand.Make(),
            SheetCommand.Make(),
            SignCommand.Make(),
            VerifyCommand.Make(),
            RunAgainCommand.Make(),
            AdminCommand.Make(),
        };
        var parsed = root.Parse(arguments);
        if (parsed.Errors.Count > 0)
        {
            foreach (var wrong in parsed.Errors) error.WriteLine(wrong.Message);
            error.WriteLine("Say --help behind a command to see what it takes.");
            return ExitCodes.WrongUsage;
        }
        try
        {
            return parsed.Invoke(new InvocationConfiguration { Output = output, Error = error, EnableDefaultExceptionHandler = false });
        }
        catch (Exception failure) when (failure is not OutOfMemoryException)
        {
            error.WriteLine($"The program failed; nothing that was printed may be used. {failure.GetType().Name}: {failure.Message}");
            return ExitCodes.Failed;
        }
    }
}
