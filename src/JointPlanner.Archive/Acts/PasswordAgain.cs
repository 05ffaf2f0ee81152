using JointPlanner.Archive.Rights;

namespace JointPlanner.Archive.Acts;

/// <summary>Grave acts are done only by somebody who has just typed the password again: an unattended screen does not sign, issue or hand out roles.</summary>
public static class PasswordAgain
{
    /// <summary>How long the password, once typed again, holds.</summary>
    public static readonly TimeSpan Holds = TimeSpan.FromMinutes(5);

    // Several instances may run a little apart from each other.
    private static readonly TimeSpan ClocksApart = TimeSpan.FromMinutes(1);

    public static bool Counts(DateTimeOffset? given, DateTimeOffset now) => given is { } at && now - at <= Holds && at - now <= ClocksApart;

    internal static void Need(Act act, ActCall call, DateTimeOffset now)
    {
        if (RightsTable.PasswordAgain.Contains(act) && !Counts(call.PasswordAt, now))
            throw new ActRefused(RefusalReason.PasswordNeeded, $"\"{act}\" needs your password once more: you have not typed it in the last {(int)Holds.TotalMinutes} minutes. Nothing was done yet; type it and do the same again.");
    }
}
