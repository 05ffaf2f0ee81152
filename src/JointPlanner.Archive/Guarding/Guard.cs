namespace JointPlanner.Archive.Guarding;

/// <summary>A trigger that keeps rows as they are.</summary>
/// <param name="Name">Name of the trigger.</param>
/// <param name="Statements">Drop it if it stands, make it.</param>
public sealed record Guard(string Name, IReadOnlyList<string> Statements);
