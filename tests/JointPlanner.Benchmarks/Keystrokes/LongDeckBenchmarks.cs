using System.Text.Json;
using BenchmarkDotNet.Attributes;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;

namespace JointPlanner.Benchmarks.Keystrokes;

/// <summary>How reading and computing grow with the length of a deck. Reference: System.Text.Json reading the same file.</summary>
public class LongDeckBenchmarks
{
    private byte[] file = [];
    private PlanDocument document = PlanDocument.Empty;

    /// <summary>Spans of 40 m in one segment.</summary>
    [Params(3, 30, 300)]
    public int Spans { get; set; }

    /// <summary>Makes the deck.</summary>
    [GlobalSetup]
    public void Make()
    {
        file = PlanFiles.Deck(Spans);
        document = PlanFiles.Document(file);
        var calculation = Calculation.Of(document, PlanFiles.Shelf);
        if (calculation.Result?.Joints.Length != 2) throw new InvalidOperationException($"The deck to measure does not compute: {string.Join(" ", calculation.Obstacles)}");
    }

    /// <summary>Reference.</summary>
    [Benchmark(Baseline = true, Description = "System.Text.Json, same file")]
    public JsonDocument Reference() => JsonDocument.Parse(file);

    /// <summary>From bytes to a document.</summary>
    [Benchmark(Description = "bytes to document")]
    public PlanDocument Parse() => PlanFiles.Document(file);

    /// <summary>From a document to an accepted plan.</summary>
    [Benchmark(Description = "document to plan")]
    public PlanReading Read() => new PlanReader(new KnownWords { Bases = Codes.Catalogue.All, OwnerRules = PlanFiles.Shelf.Ids }).Read(document);

    /// <summary>From a document to results.</summary>
    [Benchmark(Description = "document to results")]
    public Calculation Compute() => Calculation.Of(document, PlanFiles.Shelf);
}
