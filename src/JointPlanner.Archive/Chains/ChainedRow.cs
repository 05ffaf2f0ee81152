namespace JointPlanner.Archive.Chains;

/// <summary>
/// A row that is only ever added. It carries its predecessor's hash and its own, so that a later change, a missing row or a row put between shows.
/// A chain may run through several tables: the joint's chain through setting records, acceptances and readings.
/// </summary>
public abstract class ChainedRow
{
    public Guid Id { get; init; } = Guid.CreateVersion7();
    public string Chain { get; private set; } = "";

    /// <summary>1, 2, 3 … along the chain.</summary>
    public long Position { get; private set; }

    /// <summary>When the row was added.</summary>
    public DateTimeOffset At { get; private set; }

    public string PreviousHash { get; private set; } = "";
    public string Hash { get; private set; } = "";

    /// <summary>The hash that the row's content demands; differs from <see cref="Hash"/> when the row was altered.</summary>
    public string ComputeHash()
    {
        var text = new ChainText()
            .Add("kind", GetType().Name).Add("id", Id).Add("chain", Chain).Add("position", Position).Add("at", At).Add("previous", PreviousHash);
        Write(text);
        return text.Hash();
    }

    internal void Link(ChainTip tip, DateTimeOffset at)
    {
        Chain = tip.Chain;
        Position = tip.Position + 1;
        PreviousHash = tip.Hash;
        At = at;
        Hash = ComputeHash();
        tip.MoveTo(this);
    }

    /// <summary>Writes every column that means something, in an order that never changes.</summary>
    protected abstract void Write(ChainText text);
}
