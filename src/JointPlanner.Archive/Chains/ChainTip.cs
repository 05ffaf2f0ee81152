namespace JointPlanner.Archive.Chains;

/// <summary>
/// The end of a chain: where the next row joins on. Not itself a proof (a walk from the first row is), but two writers cannot take one position.
/// </summary>
public sealed class ChainTip
{
    public required string Chain { get; init; }
    public long Position { get; private set; }
    public string Hash { get; private set; } = Values.Fingerprint.None;

    internal void MoveTo(ChainedRow row)
    {
        Position = row.Position;
        Hash = row.Hash;
    }
}
