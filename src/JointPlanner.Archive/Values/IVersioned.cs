namespace JointPlanner.Archive.Values;

/// <summary>A row that people change: its version goes up by one at each save, and a save that was based on an older version is refused.</summary>
public interface IVersioned
{
    long Version { get; }
}
