using System.Reflection;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Tests.Fitting;

public sealed class FormulasTests
{
    private static readonly Formula[] All = [.. typeof(JointFamily).Assembly.GetTypes()
        .Where(t => t.Namespace?.StartsWith("JointPlanner.Engine.Fitting", StringComparison.Ordinal) == true)
        .SelectMany(t => t.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic))
        .Where(f => f.FieldType == typeof(Formula))
        .Select(f => (Formula)f.GetValue(null)!)];

    [Fact]
    public void Every_formula_of_fitting_reproduces_its_example()
    {
        Assert.True(All.Length >= 40, $"only {All.Length} formulas were found");
        Assert.All(All, f => Assert.Equal(f.Example.Expected, f.Compute(f.Example.Inputs), f.Example.Tolerance));
    }

    [Fact]
    public void No_id_stands_for_two_formulas() => Assert.Equal(All.Length, All.Select(f => f.Id).Distinct().Count());
}
