using System.Globalization;
using System.Text;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Tests.Plans;

namespace JointPlanner.Exchange.Tests.Packages;

public sealed class CalculationPackageTests
{
    private static CalculationPackage Package() => new()
    {
        Plan = TestPlans.Document(TestPlans.Good),
        OwnerRules = OwnerRulesReader.Read(File.ReadAllBytes(SeedData.OwnerRules().First())).Root,
        CodeId = "some-code",
        CodeRevision = 3,
        Units = "us",
        RoundingStep = 0.0254 / 16,
        EngineVersion = "0.1.0",
        ClimateRecord = ContentHash.Of("a record"u8),
        Confirmations = [new("some/value", "A licensed text", "2020", "table 3", "A. Person", new DateOnly(2026, 5, 31)), new("other/value", "Another text", "", "", "B. Person", new DateOnly(2026, 6, 1))],
    };

    [Fact]
    public void A_package_read_back_holds_everything_by_value()
    {
        var package = Package();

        var (again, faults) = PackageReader.Read(package.ToUtf8());

        Assert.Empty(faults);
        Assert.Equal(package.Plan.ToJson(), again!.Plan.ToJson());
        Assert.Equal((package.CodeId, package.CodeRevision, package.Units, package.EngineVersion, package.ClimateRecord), (again.CodeId, again.CodeRevision, again.Units, again.EngineVersion, again.ClimateRecord));
        Assert.Equal(package.RoundingStep, again.RoundingStep);
        Assert.Equal(package.Confirmations, again.Confirmations);
        Assert.Equal(package.ToUtf8(), again.ToUtf8());
        Assert.NotNull(new PlanReader().Read(again.Plan).Plan);
        Assert.NotNull(OwnerRulesReader.Read(again.OwnerRules!).Rules);
    }

    [Fact]
    public void A_length_typed_in_feet_and_inches_stands_so_in_the_package()
    {
        var package = Package() with { Plan = TestPlans.Document(TestPlans.Good).With("supports/p2/station", "131'-2 13/16\"") };

        Assert.Equal("131'-2 13/16\"", PackageReader.Read(package.ToUtf8()).Package!.Plan.TextAt("supports/p2/station"));
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("th-TH")]
    public void Equal_packages_give_equal_bytes_in_every_culture(string culture)
    {
        var (expected, before) = (Package().ToUtf8(), CultureInfo.CurrentCulture);
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(expected, Package().ToUtf8());
            Assert.Equal(Package().Confirmations, PackageReader.Read(expected).Package!.Confirmations);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void A_changed_byte_changes_the_hash()
    {
        var bytes = Package().ToUtf8();
        var hash = ContentHash.Of(bytes);
        Assert.True(ContentHash.IsHash(hash));

        for (var i = 0; i < bytes.Length; i += 97)
        {
            bytes[i] ^= 1;
            Assert.NotEqual(hash, ContentHash.Of(bytes));
            bytes[i] ^= 1;
        }
    }

    // Published: FIPS 180-4 example, as in NIST's "Examples with Intermediate Values", SHA-256 of "abc" (from memory, widely reproduced).
    [Fact]
    public void The_hash_is_SHA_256_in_small_hexadecimal_letters() =>
        Assert.Equal("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", ContentHash.Of("abc"u8));

    [Theory]
    [InlineData("\"revision\": 3", "\"revision\": \"3\"", "code/revision")]
    [InlineData("\"units\": \"us\"", "\"units\": \"uk\"", "units")]
    [InlineData("2026-05-31", "2026-05-32", "confirmations/#1/date")]
    [InlineData("\"plan\": {", "\"plann\": {", "plann")]
    [InlineData("calculation/1", "calculation/2", "schema")]
    public void A_package_that_cannot_be_read_is_refused_by_its_field(string from, string to, string path)
    {
        var json = Encoding.UTF8.GetString(Package().ToUtf8());
        Assert.Contains(from, json, StringComparison.Ordinal);

        var reading = PackageReader.Read(Encoding.UTF8.GetBytes(json.Replace(from, to, StringComparison.Ordinal)));

        Assert.Null(reading.Package);
        Assert.Contains(reading.Faults, f => f.Path == path && f.Remedy.Length > 0);
    }
}
