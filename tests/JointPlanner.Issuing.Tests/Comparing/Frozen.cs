using JointPlanner.Exchange.Packages;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Issuing.Tests.Comparing;

/// <summary>Frozen calculations for tests: the very bytes that freezing stores, without their sheet.</summary>
internal sealed record Frozen(byte[] Package, byte[] Results)
{
    public static Frozen Of(PlanDocument plan, OwnerRuleShelf? shelf = null, params Confirmation[] confirmations)
    {
        var calculation = Calculation.Of(plan, shelf ?? SeedData.Shelf);
        Assert.Empty(calculation.Obstacles);
        var package = calculation.Package(confirmations).ToUtf8();
        return new Frozen(package, ResultsFile.ToUtf8(calculation.Stored(ContentHash.Of(package))));
    }

    public StoredCalculation Read() => StoredCalculation.Read(Package, Results);

    /// <summary>The same with its results changed after they were written.</summary>
    public Frozen With(Func<StoredResults, StoredResults> change) => this with { Results = ResultsFile.ToUtf8(change(ResultsFile.Read(Results).Results!)) };

    /// <summary>The same with one value multiplied.</summary>
    public Frozen WithValue(string key, Func<double, double> change) => With(r =>
    {
        Assert.Contains(r.Values, v => v.Key == key);
        return r with { Values = [.. r.Values.Select(v => v.Key == key ? v with { Value = change(v.Value) } : v)] };
    });
}
