using JointPlanner.Codes;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Comparing;

/// <summary>A stored package computed again by this program, beside the results that were stored with it. It changes nothing anywhere.</summary>
/// <param name="Stored">As it was frozen.</param>
/// <param name="Differences">In what today's results differ; null where nothing could be computed.</param>
/// <param name="Obstacles">What stands in the way of computing, as sentences.</param>
/// <param name="Notes">What differs between the program then and now, as sentences: it may explain a difference.</param>
public sealed record RunAgain(StoredCalculation Stored, Differences? Differences, IReadOnlyList<string> Obstacles, IReadOnlyList<string> Notes)
{
    /// <summary>True where today's results are the stored ones, within rounding.</summary>
    public bool IsSame => Differences is { SameResults: true };

    /// <summary>The answer in a sentence.</summary>
    public string Summary => Differences is { } differences
        ? DifferenceText.Summary(differences)
        : $"The package cannot be computed by this program: {(Obstacles.Count > 0 ? Obstacles[0] : "nothing was computed.")}";

    /// <summary>Computes a package again from itself alone: no rule shelf, no database.</summary>
    /// <param name="package">Package as stored.</param>
    /// <param name="results">Results as stored.</param>
    /// <param name="cancellation">Stops between joints.</param>
    /// <exception cref="InvalidDataException">One of them cannot be read, or they do not belong together.</exception>
    public static RunAgain Of(ReadOnlySpan<byte> package, ReadOnlySpan<byte> results, CancellationToken cancellation = default)
    {
        var stored = StoredCalculation.Read(package, results);
        var calculation = Calculation.Of(stored.Package, cancellation);
        var notes = VersionsBetween(stored.Package, calculation).ToList();
        if (calculation.Result is not { } result) return new RunAgain(stored, null, calculation.Obstacles, notes);
        // Read back from its bytes, so that both sides went through the same digits.
        var today = ResultsFile.Read(ResultsFile.ToUtf8(calculation.Stored(stored.PackageHash))).Results!;
        var differences = Comparison.Of(stored, stored with { Results = today }, result);
        return new RunAgain(stored, differences with { Basis = [] }, calculation.Obstacles, notes);
    }

    private static IEnumerable<string> VersionsBetween(CalculationPackage package, Calculation calculation)
    {
        if (package.EngineVersion != ProgramVersion.Number) yield return $"Computed by program version {package.EngineVersion}; this one is {ProgramVersion.Number}.";
        if (calculation.Basis is not { } basis) yield return $"The code edition {package.CodeId} is not known to this program; there are {string.Join(", ", Catalogue.All.Select(b => b.Id))}.";
        else if (basis.Id != package.CodeId) yield return $"The package names the code edition {package.CodeId}, its plan {basis.Id}.";
        else if (basis.Revision != package.CodeRevision)
            yield return FormattableString.Invariant($"Computed with correction {package.CodeRevision} of the folder of {basis.Title}; this program has correction {basis.Revision}.");
    }
}
