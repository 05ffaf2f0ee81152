namespace JointPlanner.Archive.Acts;

/// <summary>Who asks for an act.</summary>
/// <param name="RequestId">Made by the page when it showed the button: the second press carries the same one and gets the first answer.</param>
/// <param name="From">Address, or "console".</param>
public sealed record ActCall(Guid RequestId, Guid PersonId, string From);
