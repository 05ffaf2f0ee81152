using JointPlanner.Codes;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>A deck's concrete in a plan file.</summary>
public sealed class ConcreteReadingTests
{
    private const double Day = 86400;
    private const string Path = "segments/west/concrete";

    private const string Good = """
        { "model": "fib-mc-2010", "source": "sheet 3", "strength-class": "C40/50", "transfer-strength": "30 MPa", "modulus": "36 GPa", "cement": "rapid", "curing": "steam",
          "curing-end": "2 d", "humidity": "75 %", "area": "5.4 m2", "perimeter": "21.6 m", "end-of-life": "80 a",
          "stages": [ { "age": "10 d", "stress": "3.4 MPa", "modulus": "33 GPa", "source": "sheet 18" }, { "age": "40 d", "stress": "-0.2 MPa", "source": "loss, sheet 18" } ] }
        """;

    [Fact]
    public void Every_field_is_read()
    {
        var reading = Read(Good);
        Assert.DoesNotContain(reading.Faults, f => !f.IsWarning);
        var concrete = reading.Plan!.Segments[0].Concrete!;
        Assert.Equal(("fib-mc-2010", "sheet 3", "C40/50", CementClass.Rapid, Curing.Steam), (concrete.Model, concrete.Source, concrete.StrengthClass, concrete.Cement, concrete.Curing));
        Assert.Equal((40e6, 30e6, 36e9, 0.75), (concrete.Strength, concrete.TransferStrength, concrete.Modulus, concrete.Humidity));
        Assert.Equal((2 * Day, 80 * 365.25 * Day), (concrete.CuringEnd, concrete.EndOfLife));
        Assert.Equal(new SectionSize(5.4, 21.6), concrete.Size);
        Assert.Equal([new(10 * Day, 3.4e6, 33e9, "sheet 18"), new(40 * Day, -0.2e6, null, "loss, sheet 18")], concrete.Stages);
    }

    [Fact]
    public void What_nobody_gave_is_a_stated_default()
    {
        var reading = Read("""{ "source": "sheet 3", "strength": "6 ksi", "curing-end": "3 d", "humidity": 0.7, "volume-to-surface": "4 in" }""");
        Assert.DoesNotContain(reading.Faults, f => !f.IsWarning);
        var concrete = reading.Plan!.Segments[0].Concrete!;
        Assert.Equal(("", CementClass.Normal, Curing.Moist), (concrete.Model, concrete.Cement, concrete.Curing));
        Assert.Equal(new VolumeToSurface(0.1016), concrete.Size);
        Assert.Equal(["cement", "curing", "end-of-life"], reading.Defaults.Where(d => d.Path.StartsWith(Path, StringComparison.Ordinal)).Select(d => d.Path[(Path.Length + 1)..]));
    }

    [Theory]
    [InlineData("\"strength-class\": \"C40/50\"", "\"strength-class\": \"C40/55\"", "strength-class", "field.unknown-word")]
    [InlineData("\"strength-class\": \"C40/50\",", "\"strength-class\": \"C40/50\", \"strength\": \"40 MPa\",", "strength", "concrete.strength")]
    [InlineData("\"strength-class\": \"C40/50\",", "", "strength", "concrete.strength")]
    [InlineData("\"area\": \"5.4 m2\",", "", "notional-size", "concrete.size")]
    [InlineData("\"area\": \"5.4 m2\",", "\"area\": \"5.4 m2\", \"notional-size\": \"0.5 m\",", "notional-size", "concrete.size")]
    [InlineData("\"humidity\": \"75 %\"", "\"humidity\": 75", "humidity", "field.range")]
    [InlineData("\"curing-end\": \"2 d\"", "\"curing-end\": \"2\"", "curing-end", "quantity.bare-number")]
    [InlineData("\"model\": \"fib-mc-2010\"", "\"model\": \"fib-mc-2011\"", "model", "field.unknown-word")]
    [InlineData("\"end-of-life\": \"80 a\"", "\"end-of-life\": \"1 a\"", "stages/#2/age", "")]
    [InlineData("\"age\": \"40 d\"", "\"age\": \"90 a\"", "stages/#2/age", "concrete.after-end-of-life")]
    public void Each_slip_is_named_at_its_field(string good, string slip, string field, string id)
    {
        Assert.Contains(good, Good, StringComparison.Ordinal);
        var reading = Read(Good.Replace(good, slip, StringComparison.Ordinal));
        var faults = reading.At($"{Path}/{field}").Where(f => !f.IsWarning).ToArray();
        if (id.Length == 0) Assert.Empty(faults); // a short life is a warning, and both stresses lie in it
        else Assert.Equal(id, Assert.Single(faults).Id);
        Assert.All(faults, f => Assert.True(f.Wrong.Length > 0 && f.Allowed.Length > 0 && f.Remedy.Length > 0));
    }

    [Theory]
    [InlineData("shrinkage", "\"shrinkage\": { \"strain\": \"200 µε\", \"source\": \"sheet 22\" },")]
    [InlineData("creep", "\"creep\": { \"strain\": \"200 µε\", \"source\": \"sheet 22\" },")]
    public void A_strain_is_given_once(string word, string own)
    {
        var reading = Read(Good, own);
        Assert.Equal("concrete.two-strains", Assert.Single(reading.At($"segments/west/{word}")).Id);
    }

    [Fact]
    public void A_composite_deck_takes_no_free_concrete()
    {
        var reading = Read(Good, kind: "composite");
        Assert.Contains(reading.At(Path), f => f.Id == "concrete.other-deck");
    }

    [Fact]
    public void A_movement_by_prestress_is_not_given_beside_the_stresses_that_make_it()
    {
        var json = Json(Good, "", "concrete").Replace("\"cause\": \"live-load\", \"opens-by\"", "\"cause\": \"prestress\", \"opens-by\"", StringComparison.Ordinal);
        Assert.Equal("movements.computed", Assert.Single(TestPlans.Read(json).At("movements/m1/cause")).Id);
    }

    private static PlanReading Read(string concrete, string own = "", string kind = "concrete") =>
        new PlanReader(new KnownWords { CreepModels = Catalogue.CreepModels }).Read(System.Text.Encoding.UTF8.GetBytes(Json(concrete, own, kind)));

    private static string Json(string concrete, string own, string kind)
    {
        var good = TestPlans.Good;
        var (from, to) = (good.IndexOf("\"creep\": {", StringComparison.Ordinal), good.IndexOf("{ \"id\": \"east\"", StringComparison.Ordinal));
        return (good[..from] + own + $" \"concrete\": {concrete} }},\n" + good[to..])
            .Replace("\"end\": \"60 m\", \"kind\": \"concrete\"", $"\"end\": \"60 m\", \"kind\": \"{kind}\"", StringComparison.Ordinal);
    }
}
