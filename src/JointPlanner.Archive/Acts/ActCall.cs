namespace JointPlanner.Archive.Acts;

/// <summary>Who asks for an act.</summary>
/// <param name="RequestId">Made by the page when it showed the button: the second press carries the same one and gets the first answer.</param>
/// <param name="From">Address, or "console".</param>
public sealed record ActCall(Guid RequestId, Guid PersonId, string From)
{
    /// <summary>When the person last typed the password again; null where they have not since they signed in.</summary>
    public DateTimeOffset? PasswordAt { get; init; }

    /// <summary>A call at the console, where the machine's own door stands in for the password.</summary>
    public static ActCall AtConsole(Guid personId, DateTimeOffset now) => new(Guid.CreateVersion7(), personId, "console") { PasswordAt = now };
}
