using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class PlanReaderTests
{
    public static TheoryData<string> SeedPlans => [.. SeedData.Plans().Select(Path.GetFileName).OfType<string>()];

    [Theory]
    [MemberData(nameof(SeedPlans))]
    public void A_plan_of_the_seed_data_reads_without_a_fault(string file)
    {
        var reading = new PlanReader().Read(File.ReadAllBytes(SeedData.Plans().Single(p => Path.GetFileName(p) == file)));

        Assert.Empty(reading.Faults.Select(f => $"{f.Path}: {f.Wrong} {f.Allowed} {f.Remedy}"));
        Assert.NotNull(reading.Plan);
    }
}
