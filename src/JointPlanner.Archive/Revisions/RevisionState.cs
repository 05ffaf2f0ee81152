namespace JointPlanner.Archive.Revisions;

/// <summary>
/// Where a revision stands. <see cref="Returned"/> is the end of a frozen revision that the checker sent back: it is kept, and the work goes on
/// in a new draft with the next number, so that one number never names two different frozen calculations.
/// </summary>
public enum RevisionState
{
    Draft,
    InCheck,
    Returned,
    Checked,
    Issued,
    Superseded,
    Withdrawn,
}
