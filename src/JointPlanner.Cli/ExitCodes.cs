namespace JointPlanner.Cli;

/// <summary>What the program tells the shell.</summary>
internal static class ExitCodes
{
    /// <summary>Done; nothing but unconfirmed memory values stands in the way of issuing.</summary>
    public const int Done = 0;
    /// <summary>An input is at fault; every fault was printed.</summary>
    public const int FaultyInput = 1;
    /// <summary>The command line itself is wrong.</summary>
    public const int WrongUsage = 2;
    /// <summary>Computed, but a finding stops the calculation from being issued, or a check failed.</summary>
    public const int CannotBeIssued = 3;
    /// <summary>The program failed; nothing that was printed may be used.</summary>
    public const int Failed = 4;

    /// <summary>The same in words, for the help text.</summary>
    public const string InWords =
        "Exit codes: 0 done; 1 faults in an input, each named; 2 wrong usage; 3 computed, but something stops issue; 4 the program failed.";
}
