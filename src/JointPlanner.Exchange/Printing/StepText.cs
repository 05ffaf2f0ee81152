namespace JointPlanner.Exchange.Printing;

/// <summary>
/// Writes printed steps as lines of text:
/// <code>
/// [12] Δ: movement by uniform temperature
///      Δ = α · L · ΔT
///        = 12.0×10⁻⁶ /K [3] · 42.500 m [7] · 35.0 K [11]
///        | rows of a long sum, one value each
///        = 17.9 mm, carried on as 17.8500 mm
///      formula thermal.movement: …
///      key joint/j1/…
/// </code>
/// The first line that begins with an equals sign holds the values put in (see <see cref="LinearText"/>), the last one the result; later steps
/// use what is carried on, or the result where nothing is. A value that no formula made has one line: symbol, equals sign, value.
/// </summary>
public static class StepText
{
    private const string Indent = "     ";

    /// <summary>The lines of one step.</summary>
    public static IEnumerable<string> Lines(PrintedStep step)
    {
        yield return FormattableString.Invariant($"[{step.Number}] {step.Symbol}: {step.Meaning}");
        var result = LinearText.Of(step.Result) + (step.CarriedOn is { } carried ? $", carried on as {LinearText.Of(carried)}" : "");
        if (step.Formula is { } formula && step.Substituted is { } substituted)
        {
            yield return $"{Indent}{step.Symbol} = {LinearText.Of(formula)}";
            yield return $"{Indent}  = {LinearText.Of(substituted)}";
            foreach (var term in step.Terms) yield return $"{Indent}  | {LinearText.Of(term)}";
            yield return $"{Indent}  = {result}";
        }
        else
        {
            yield return $"{Indent}{step.Symbol} = {result}";
        }
        if (step.Shortfall is { } shortfall) yield return $"{Indent}printed digits do not suffice here: they give {shortfall}";
        yield return Indent + step.Origin;
        foreach (var candidate in step.Candidates)
            yield return $"{Indent}- {candidate.Name}: {(candidate.RejectedBy.Length > 0 ? $"rejected by {candidate.RejectedBy}" : "taken")}";
        if (step.Key.Length > 0) yield return $"{Indent}key {step.Key}";
    }
}
