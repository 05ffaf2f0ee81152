namespace JointPlanner.Pdf;

/// <summary>A head over several columns.</summary>
/// <param name="Head">The words; <see cref="Words.None"/> leaves the place empty.</param>
/// <param name="Columns">How many columns it covers.</param>
public sealed record HeadSpan(Words Head, int Columns);
