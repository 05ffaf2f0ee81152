using System.Text.Json;
using BenchmarkDotNet.Attributes;
using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;

namespace JointPlanner.Benchmarks.Keystrokes;

/// <summary>
/// What one key typed in the ledger costs, for each demo structure: the engine alone, and the whole way from the changed document to
/// results. Reference: System.Text.Json reading the same file.
/// </summary>
public class KeystrokeBenchmarks
{
    private byte[] file = [];
    private PlanDocument document = PlanDocument.Empty;
    private Plan? plan;
    private CodeBasis? basis;
    private Owner? owner;
    private string field = "";
    private bool later;

    /// <summary>Demo structures.</summary>
    public static IEnumerable<string> Structures => PlanFiles.Structures;

    /// <summary>Which one.</summary>
    [ParamsSource(nameof(Structures))]
    public string Structure { get; set; } = "";

    /// <summary>Reads what does not change from key to key.</summary>
    [GlobalSetup]
    public void Open()
    {
        file = PlanFiles.Bytes(Structure);
        document = PlanFiles.Document(file);
        var calculation = Calculation.Of(document, PlanFiles.Shelf);
        (plan, basis) = (calculation.Reading.Plan!, calculation.Basis!);
        field = $"joints/{document.Items("joints")[0]}/setting/temperature";
        owner = calculation.Owner?.Rules is { } rules ? new Owner(rules, calculation.Profile.SettingStep) : null;
    }

    /// <summary>Reference.</summary>
    [Benchmark(Baseline = true, Description = "System.Text.Json, same file")]
    public JsonDocument Reference() => JsonDocument.Parse(file);

    /// <summary>From an accepted plan to every result, with steps and tables.</summary>
    [Benchmark(Description = "engine: plan to results")]
    public Result Engine() => Movements.Of(plan!, basis!, owner, Catalogue.CreepModels);

    /// <summary>From a changed field to every result, as the ledger does it.</summary>
    [Benchmark(Description = "keystroke: field to results")]
    public Calculation Keystroke()
    {
        later = !later;
        var calculation = Calculation.Of(document.With(field, later ? "11 °C" : "12 °C"), PlanFiles.Shelf);
        return calculation.Result is null ? throw new InvalidOperationException(calculation.Obstacles[0]) : calculation;
    }
}
