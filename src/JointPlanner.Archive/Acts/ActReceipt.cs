namespace JointPlanner.Archive.Acts;

/// <summary>The answer that an act gave, under the request id that the page sent: a second click gets the same answer and changes nothing.</summary>
public sealed class ActReceipt
{
    public required Guid RequestId { get; init; }

    /// <summary>Null when the act came through a field link.</summary>
    public Guid? PersonId { get; init; }
    public required Act Act { get; init; }
    public required string Subject { get; init; }
    public required DateTimeOffset At { get; init; }
    public required string Answer { get; init; }
}
