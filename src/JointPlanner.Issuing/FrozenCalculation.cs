using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Packages;
using JointPlanner.Pdf;
using JointPlanner.Sheets;

namespace JointPlanner.Issuing;

/// <summary>A calculation as it is frozen: package and results as the very bytes that are hashed, and the sheet made from them.</summary>
/// <param name="Package">Package text in UTF-8.</param>
/// <param name="Results">Results text in UTF-8.</param>
/// <param name="Sheet">The unsigned sheet with its prepared fields.</param>
public sealed record FrozenCalculation(byte[] Package, byte[] Results, PdfFile Sheet)
{
    /// <summary>Freezes a calculation.</summary>
    /// <param name="calculation">A calculation without faults.</param>
    /// <param name="confirmations">Confirmations of memory values in force.</param>
    /// <param name="title">Who and when, for the sheet.</param>
    /// <exception cref="InvalidOperationException">Faults stand in the way; the message names the first.</exception>
    public static FrozenCalculation Of(Calculation calculation, IReadOnlyCollection<Confirmation> confirmations, SheetTitle title)
    {
        if (calculation.Result is not { } result || calculation.Obstacles.Count > 0)
            throw new InvalidOperationException(calculation.Obstacles is [var first, ..] ? first : "Nothing was computed.");
        // Only what this calculation uses goes into its package: another confirmation must not change its hash.
        var used = result.MemoryValues.Select(v => v.ValueId).ToHashSet();
        var package = calculation.Package(confirmations.Where(c => used.Contains(c.ValueId))).ToUtf8();
        var results = ResultsFile.ToUtf8(calculation.Stored(ContentHash.Of(package)));
        var facts = new SheetFacts
        {
            Revision = title.Revision,
            Date = title.Date,
            Designer = title.Designer,
            Checker = title.Checker,
            Organisation = title.Organisation,
            Basis = calculation.Basis!.Title,
            BasisId = FormattableString.Invariant($"{calculation.Basis.Id}, revision {calculation.Basis.Revision}"),
            OwnerRules = calculation.Owner?.Rules is { } rules ? $"{rules.Name}, version {rules.Version}" : "",
            Program = ProgramVersion.Name,
            Package = package,
            Results = results,
            Day = calculation.Day,
            Confirmed = confirmations.ToDictionary(c => c.ValueId, Sentence),
            IsPreliminary = title.IsPreliminary,
            IsDemonstration = title.IsDemonstration,
        };
        return new FrozenCalculation(package, results,
            PdfWriter.Write(CalculationSheet.Of(result, facts, calculation.Profile, title.Letter ? PaperSize.Letter : PaperSize.A4)));
    }

    /// <summary>Memory values that the calculation uses and nobody confirmed.</summary>
    public static IReadOnlyList<Provenance> Unconfirmed(Calculation calculation, IEnumerable<Confirmation> confirmations)
    {
        var confirmed = confirmations.Select(c => c.ValueId).ToHashSet();
        return [.. (calculation.Result?.MemoryValues ?? []).Where(v => !confirmed.Contains(v.ValueId))];
    }

    private static string Sentence(Confirmation c) => FormattableString.Invariant(
        $"confirmed by {c.Person} on {c.Date:yyyy-MM-dd}: {string.Join(", ", new[] { c.Document, c.Edition, c.Place }.Where(p => p.Length > 0))}");
}

/// <summary>Who and when, as the sheet's title says it.</summary>
public sealed record SheetTitle
{
    /// <summary>Revision as printed.</summary>
    public required string Revision { get; init; }
    /// <summary>Date of the sheet.</summary>
    public required DateTimeOffset Date { get; init; }
    /// <summary>Designer.</summary>
    public string Designer { get; init; } = "";
    /// <summary>Checker.</summary>
    public string Checker { get; init; } = "";
    /// <summary>Owner.</summary>
    public string Organisation { get; init; } = "";
    /// <summary>True for an unsigned print with a watermark.</summary>
    public bool IsPreliminary { get; init; }
    /// <summary>True in demo mode.</summary>
    public bool IsDemonstration { get; init; }
    /// <summary>True for Letter, false for A4.</summary>
    public bool Letter { get; init; }
}
