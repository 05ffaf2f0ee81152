namespace JointPlanner.Pdf;

/// <summary>A fact.</summary>
/// <param name="Key">What it is about.</param>
/// <param name="Value">What holds.</param>
public sealed record KeyValue(string Key, Words Value);
