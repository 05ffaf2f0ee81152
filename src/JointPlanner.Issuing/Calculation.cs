using System.Collections.Immutable;
using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Issuing;

/// <summary>
/// A plan document taken all the way: read, judged, computed. What the screen shows while typing, what the command line prints and what
/// is frozen come from here.
/// </summary>
public sealed record Calculation
{
    private Calculation(PlanReading reading, CodeBasis? basis, OwnerRulesReading? owner, double settingStep, Result? result) =>
        (Reading, Basis, Owner, SettingStep, Result) = (reading, basis, owner, settingStep, result);

    /// <summary>What the document says: faults, defaults, the plan.</summary>
    public PlanReading Reading { get; }

    /// <summary>The code edition; null where the plan names none that is known.</summary>
    public CodeBasis? Basis { get; }

    /// <summary>The owner's rule set; null where the plan uses none.</summary>
    public OwnerRulesReading? Owner { get; }

    /// <summary>Step to which set values are rounded where the owner's rules state none, m.</summary>
    private double SettingStep { get; }

    /// <summary>What was computed; null where faults stand in the way.</summary>
    public Result? Result { get; }

    /// <summary>Faults and warnings of the plan and of the rule set.</summary>
    public ImmutableArray<Fault> Faults => [.. Reading.Faults, .. Owner?.Faults ?? []];

    /// <summary>What stands in the way of freezing, as sentences: faults, and findings without which nothing can be computed.</summary>
    public IReadOnlyList<string> Obstacles =>
    [
        .. Faults.Where(f => !f.IsWarning).Select(f => $"{f.Path}: {f.Wrong} {f.Remedy}"),
        .. (Result?.Findings ?? []).Where(f => f.Severity == Severity.Error).Select(f => $"{f.Path}: {FindingText.Of(f, Profile)}"),
        .. TooManyRows(),
    ];

    /// <summary>The display profile that the plan asks for.</summary>
    public DisplayProfile Profile => ProfileOf(Reading.Document);

    /// <summary>Most rows that the tables for the day of setting may have together, so that the results can be attached, signed and verified.</summary>
    public const int MostDayRows = 60_000;

    /// <summary>Computes a document with the rule sets of an installation.</summary>
    /// <param name="document">The plan as it stands on the screen or in a file.</param>
    /// <param name="shelf">The rule sets that the plan may name.</param>
    /// <param name="cancellation">Stops between joints.</param>
    public static Calculation Of(PlanDocument document, OwnerRuleShelf shelf, CancellationToken cancellation = default)
    {
        var reading = new PlanReader(new KnownWords { Bases = Catalogue.All, CreepModels = Catalogue.CreepModels, OwnerRules = shelf.Ids }).Read(document);
        var owner = shelf.Find(document.TextAt("basis/owner-rules") ?? "");
        return Of(reading, owner, ProfileOf(document).SettingStep, cancellation);
    }

    /// <summary>Computes a package from itself alone: no shelf, no database.</summary>
    public static Calculation Of(CalculationPackage package, CancellationToken cancellation = default)
    {
        var reading = new PlanReader(new KnownWords { Bases = Catalogue.All, CreepModels = Catalogue.CreepModels }).Read(package.Plan);
        return Of(reading, package.OwnerRules is { } rules ? OwnerRulesReader.Read(rules) : null, package.RoundingStep, cancellation);
    }

    /// <summary>Everything that can change a number of this calculation, by value.</summary>
    /// <exception cref="InvalidOperationException">Nothing was computed.</exception>
    public CalculationPackage Package(IEnumerable<Confirmation> confirmations) => new()
    {
        Plan = Reading.Document ?? throw new InvalidOperationException("There is no document to pack."),
        OwnerRules = Owner?.Root,
        CodeId = Basis?.Id ?? throw new InvalidOperationException("There is no code edition to pack."),
        CodeRevision = Basis.Revision,
        Units = Profile.Id,
        RoundingStep = Profile.SettingStep,
        EngineVersion = ProgramVersion.Number,
        Confirmations = [.. confirmations.OrderBy(c => c.ValueId, StringComparer.Ordinal)],
    };

    /// <summary>What is stored of this calculation, with the tables for the day of setting.</summary>
    /// <param name="packageHash">SHA-256 of the package.</param>
    /// <exception cref="InvalidOperationException">Nothing was computed.</exception>
    public StoredResults Stored(string packageHash)
    {
        var result = Result ?? throw new InvalidOperationException("There are no results to store.");
        return ResultsFile.Of(result, ProgramVersion.Number, packageHash, Day, EngineOwner is { } owner ? SettingDays.Of(result, owner, Profile.DayStep) : []);
    }

    /// <summary>What holds for every joint on the day of setting; null where no joint is set by this calculation.</summary>
    public StoredDay? Day => Result is not { } result || EngineOwner is not { } owner ? null : new StoredDay(Profile.Id, owner.Rules.UseWithin,
        [.. SettingDays.Methods(result.Plan, owner.Rules).Select(m => new StoredMethod(m.Id, m.Name, m.TemperatureUncertainty, m.Source))],
        [.. result.Plan.SettingDay.Points.Select(p => new StoredPoint(p.Id, p.Name, p.Weight))]);

    private Owner? EngineOwner => Owner?.Rules is { } rules ? new Owner(rules, SettingStep) : null;

    private IEnumerable<string> TooManyRows()
    {
        if (Result is not { } result || EngineOwner is not { } owner || SettingDays.RowCount(result, owner, Profile.DayStep) is not (> MostDayRows and var count)) yield break;
        yield return FormattableString.Invariant(
            $"setting-table/ages: the tables for the day of setting would have {count} rows. Allowed: up to {MostDayRows}. Tabulate fewer deck ages or methods of measuring.");
    }

    private static Calculation Of(PlanReading reading, OwnerRulesReading? owner, double settingStep, CancellationToken cancellation)
    {
        var basis = Catalogue.Find(reading.Document?.TextAt("basis/code") ?? "");
        var result = reading.Plan is { } plan && basis is not null
            ? Movements.Of(plan, basis, owner?.Rules is { } rules ? new Owner(rules, settingStep) : null, Catalogue.CreepModels, cancellation)
            : null;
        return new Calculation(reading, basis, owner, settingStep, result);
    }

    private static DisplayProfile ProfileOf(PlanDocument? document) =>
        document?.TextAt("display") == DisplayProfile.Us.Id ? DisplayProfile.Us : DisplayProfile.Metric;
}
