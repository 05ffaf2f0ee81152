using JointPlanner.Recomputation.Tests.Reading;

namespace JointPlanner.Recomputation.Tests;

/// <summary>The demo bridge that describes its concrete, by every model of creep and shrinkage, computed again from what the program prints.</summary>
public sealed class EveryCreepModelTests : IDisposable
{
    private const string Demo = "teal-mere-bridge.json", Rules = "demonstration-metric.json";

    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-creep-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Theory]
    [InlineData("en-1992-1-1-2004", "EN 1992-1-1, 2004, 3.1.4(6), (3.10)")]
    [InlineData("en-1992-1-1-2023", "EN 1992-1-1, 2023, Annex B, (B.13)")]
    [InlineData("fib-mc-2010", "fib Model Code for Concrete Structures, 2010, 5.1.9.4.3")]
    [InlineData("ceb-fip-mc-1990", "CEB-FIP Model Code, 1990, 2.1.6.4.3")]
    [InlineData("aashto-lrfd-creep-2004", "AASHTO LRFD Bridge Design Specifications, to 2004, 5.4.2.3.2")]
    [InlineData("aashto-lrfd-creep-2005", "AASHTO LRFD Bridge Design Specifications, 2005 interims to 2014, 5.4.2.3.2")]
    [InlineData("aashto-lrfd-creep-2015", "AASHTO LRFD Bridge Design Specifications, 2015 interims on, 5.4.2.3.2")]
    [InlineData("aci-209r-92", "ACI 209R, 1992, 2.4")]
    public void Every_step_of_a_model_is_recomputed_and_names_its_clause(string model, string clause)
    {
        foreach (var profile in new[] { "metric", "us" })
        {
            var text = ComputedText.Of(PlanWith(model), profile);
            Assert.Contains(clause, text, StringComparison.Ordinal);
            Assert.Contains("key joint/j1/opens-by/creep", text, StringComparison.Ordinal);
            Assert.Empty(Recomputer.Complaints(text));
            Assert.DoesNotContain(StepBlock.All(text), s => s.SaysItFallsShort);
        }
    }

    /// <summary>A copy of the demo with another model; thinner, because one of them knows no thick sections, and with the modulus that one of them does not hold.</summary>
    private string PlanWith(string model)
    {
        var text = File.ReadAllText(PlanFiles.PathOf($"structures/{Demo}"));
        foreach (var (old, changed) in new[]
        {
            ("\"concrete\": {", $"\"concrete\": {{ \"model\": \"{model}\","),
            ("\"area\": \"5.4 m2\",", "\"notional-size\": \"280 mm\","),
            ("\"perimeter\": \"21.6 m\",", ""),
            ("\"stress\": \"0.4 MPa\",", "\"stress\": \"0.4 MPa\", \"modulus\": \"36 GPa\","),
        })
        {
            Assert.Contains(old, text, StringComparison.Ordinal);
            text = text.Replace(old, changed, StringComparison.Ordinal);
        }
        var rules = Path.Combine(folder, "owner-rules");
        Directory.CreateDirectory(rules);
        File.Copy(PlanFiles.PathOf($"owner-rules/{Rules}"), Path.Combine(rules, Rules), overwrite: true);
        var file = Path.Combine(folder, $"{model}.json");
        File.WriteAllText(file, text);
        return file;
    }
}
