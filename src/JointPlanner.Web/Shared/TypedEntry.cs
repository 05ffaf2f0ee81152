namespace JointPlanner.Web.Shared;

/// <summary>What was typed into a field and kept by the browser.</summary>
/// <param name="Path">Path of the field.</param>
/// <param name="Text">The whole text as typed.</param>
public sealed record TypedEntry(string Path, string Text);
