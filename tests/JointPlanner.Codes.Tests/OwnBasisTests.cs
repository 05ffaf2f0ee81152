using JointPlanner.Codes.Own;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests;

public sealed class OwnBasisTests : BasisSpecification
{
    protected override CodeBasis Basis { get; } = new OwnBasis();

    protected override Plan Answerable => PlanWith("own", new Climate { EffectiveMin = -11, EffectiveMax = 36, Source = "test" });

    protected override string[] SilentOn =>
    [
        .. Enum.GetNames<Cause>().Select(c => $"counting {c}").Order(StringComparer.Ordinal),
        "expansion Composite", "expansion Concrete", "expansion Steel", "live load", "safety degrees",
        "temperature difference Composite", "temperature difference Concrete", "temperature difference Steel",
    ];
}
