using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Revisions;

/// <summary>
/// What was frozen: everything that can change a number, and the numbers. Both are kept as the very text that was hashed, never as a database's own JSON type,
/// which rewrites it.
/// </summary>
public sealed class FrozenPackage : ChainedRow
{
    public required Guid RevisionId { get; init; }
    public Revision? Revision { get; init; }
    public required Guid DesignerId { get; init; }
    public required string PackageText { get; init; }
    public required string PackageHash { get; init; }
    public required string ResultsText { get; init; }
    public required string ResultsHash { get; init; }
    public required string EngineVersion { get; init; }

    /// <summary>Whether both texts still give the hashes they were frozen with; computed from the texts each time.</summary>
    public bool IsIntact => Fingerprint.Of(PackageText) == PackageHash && Fingerprint.Of(ResultsText) == ResultsHash;

    protected override void Write(ChainText text) => text
        .Add("revision", RevisionId).Add("designer", DesignerId).Add("package", PackageHash).Add("results", ResultsHash).Add("engine", EngineVersion);
}
