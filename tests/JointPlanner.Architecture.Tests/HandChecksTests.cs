using JointPlanner.Architecture.Tests.Compiled;

namespace JointPlanner.Architecture.Tests;

/// <summary>A hand check that leans on what it checks proves nothing: elementary formulas only, never the frame's or the cables' code or results.</summary>
public class HandChecksTests
{
    [Fact]
    public void Hand_checks_use_neither_the_frame_nor_the_cables()
    {
        using var engine = Assembly.Of("JointPlanner.Engine");

        Assert.Contains(engine.Types(), t => TypeNames.NamespaceOf(t.Name) == "JointPlanner.Engine.HandChecks");
        Assert.Contains(engine.Types(), t => TypeNames.NamespaceOf(t.Name) == "JointPlanner.Engine.Frames");
        Expect.NoBreach(Uses(engine, "JointPlanner.Engine.HandChecks", ["JointPlanner.Engine.Frames", "JointPlanner.Engine.Cables"]));
    }

    [Fact]
    public void A_hand_check_that_leans_on_the_frame_is_found_wherever_it_does()
    {
        using var planted = Assembly.OfTheseTests();
        const string root = "JointPlanner.Architecture.Tests.Planted.";

        Assert.Equal(
            [
                $"{root}HandChecks.ByBase has to do with {root}Frames.Solver",
                $"{root}HandChecks.ByCall has to do with {root}Frames.Solver",
                $"{root}HandChecks.ByField has to do with {root}Frames.Result",
                $"{root}HandChecks.ByLambda+<>c has to do with {root}Frames.Solver",
                $"{root}HandChecks.ByParameter has to do with {root}Frames.Result",
                $"{root}HandChecks.ByTest has to do with {root}Frames.Result",
            ],
            Uses(planted, root + "HandChecks", [root + "Frames"]).Order(StringComparer.Ordinal));
    }

    private static IEnumerable<string> Uses(Assembly assembly, string room, string[] forbidden) =>
        from type in assembly.Types()
        where Within(TypeNames.NamespaceOf(type.Name), room)
        from used in UsedTypes.Of(assembly, type.Handle).Distinct()
        where forbidden.Any(f => Within(TypeNames.NamespaceOf(used), f))
        select $"{type.Name} has to do with {used}";

    private static bool Within(string space, string room) => space == room || space.StartsWith(room + ".", StringComparison.Ordinal);
}
