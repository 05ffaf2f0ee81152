using JointPlanner.Architecture.Tests.Planted.Frames;

namespace JointPlanner.Architecture.Tests.Planted.HandChecks;

// Breaches for the search to find, each in its own way, and a hand check that is one.

public sealed class ByBase : Solver;

public static class ByCall
{
    public static int Half() => Solver.Solve() / 2;
}

public static class ByLambda
{
    public static Func<int> Half { get; } = () => Solver.Solve() / 2;
}

public sealed class ByField
{
    private readonly List<Result> results = [];

    public int Count => results.Count;
}

public static class ByParameter
{
    public static bool Known(Result? result) => result is null;
}

public static class ByTest
{
    public static bool Is(object value) => value is Result;
}

public static class ByHand
{
    public static int Sum(IEnumerable<int> stiffnesses) => stiffnesses.Sum();
}
