using JointPlanner.Archive.Acts;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Issuing;

/// <summary>What still stands in the way of issuing a frozen calculation, from its package alone.</summary>
public static class IssueQuestions
{
    /// <summary>The facts for the act of issuing.</summary>
    /// <param name="package">Stored package bytes.</param>
    /// <param name="documentHash">Hash of the sheet whose signatures were verified.</param>
    /// <param name="signatures">The signatures that verified.</param>
    /// <exception cref="InvalidDataException">The package cannot be read; the message says why.</exception>
    public static IssueFacts Of(ReadOnlySpan<byte> package, string documentHash, IReadOnlyList<VerifiedSignature> signatures)
    {
        var reading = PackageReader.Read(package);
        if (reading.Package is not { } packed) throw new InvalidDataException($"The stored package cannot be read: {reading.Faults[0].Wrong}");
        var calculation = Calculation.Of(packed);
        var open = (calculation.Result?.Findings ?? []).Where(f => f.Severity >= Severity.BlocksIssue).ToArray();
        return new IssueFacts(
            documentHash,
            [.. FrozenCalculation.Unconfirmed(calculation, packed.Confirmations).Select(v => $"{v.ValueId}: {ProvenanceText.Of(v)}")],
            [.. open.Where(f => f.Id != "causes-not-included").Select(f => FindingText.Of(f, calculation.Profile))],
            [.. open.Where(f => f.Id == "causes-not-included").Select(f => FindingText.Of(f, calculation.Profile))],
            signatures);
    }
}
