using JointPlanner.Architecture.Tests.Compiled;

namespace JointPlanner.Architecture.Tests;

/// <summary>
/// On the day of setting nothing is computed anew: the page, and the class that looks up and carries, have nothing to do with the engine's
/// calculation, with the plan or with the code editions. Units, kinds of quantity and sentences are theirs to use.
/// </summary>
public class SetDayReadsWhatWasIssuedTests
{
    // Kinds of quantity, sentences, what is wrong with a file and the words of limits: no movement comes from these.
    private static readonly string[] Allowed = ["JointPlanner.Engine.Formulas.Quantity", "JointPlanner.Engine.Formulas.Unit", "JointPlanner.Engine.Formulas.Finding",
        "JointPlanner.Engine.Formulas.Severity", "JointPlanner.Engine.Bases.Column", "JointPlanner.Engine.Plans.Fault"];

    private static readonly string[] Calculating = ["JointPlanner.Issuing.Calculation", "JointPlanner.Issuing.FrozenCalculation", "JointPlanner.Web.Rooms.Structure.PlanDesk",
        "JointPlanner.Exchange.Packages.CalculationPackage"];

    [Theory]
    [InlineData("JointPlanner.Web", "JointPlanner.Web.Rooms.SetDay")]
    [InlineData("JointPlanner.Issuing", "JointPlanner.Issuing.Setting")]
    public void The_rooms_of_the_day_never_compute(string project, string room)
    {
        using var assembly = Assembly.Of(project);

        Assert.Contains(assembly.Types(), t => TypeNames.NamespaceOf(t.Name) == room);
        Expect.NoBreach(Breaches(assembly, room));
    }

    [Fact]
    public void A_room_that_computes_is_found()
    {
        using var issuing = Assembly.Of("JointPlanner.Issuing");

        // The rest of that project does compute: the same search must see it.
        Assert.Contains("JointPlanner.Issuing.FrozenCalculation has to do with JointPlanner.Issuing.Calculation", Breaches(issuing, "JointPlanner.Issuing"));
        Assert.Contains(Breaches(issuing, "JointPlanner.Issuing"), b => b.EndsWith(" JointPlanner.Engine.Movements", StringComparison.Ordinal));
    }

    private static IEnumerable<string> Breaches(Assembly assembly, string room) =>
        from type in assembly.Types()
        where TypeNames.NamespaceOf(type.Name) == room
        from used in UsedTypes.Of(assembly, type.Handle).Distinct()
        where Calculating.Contains(used) || used.StartsWith("JointPlanner.Codes.", StringComparison.Ordinal)
            || (used.StartsWith("JointPlanner.Engine.", StringComparison.Ordinal) && !Allowed.Contains(used))
        select $"{type.Name} has to do with {used}";
}
