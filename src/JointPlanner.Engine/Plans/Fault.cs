namespace JointPlanner.Engine.Plans;

/// <summary>Something in a plan that must be put right before it can be computed.</summary>
/// <param name="Id">Permanent id of the kind of fault.</param>
/// <param name="Path">Path of the field.</param>
/// <param name="Value">The value as given, as text; empty where the field is missing.</param>
/// <param name="Wrong">What is wrong, a sentence.</param>
/// <param name="Allowed">What is allowed.</param>
/// <param name="Remedy">What to do.</param>
/// <param name="IsWarning">True when the plan can be computed all the same.</param>
public sealed record Fault(string Id, string Path, string Value, string Wrong, string Allowed, string Remedy, bool IsWarning = false);
