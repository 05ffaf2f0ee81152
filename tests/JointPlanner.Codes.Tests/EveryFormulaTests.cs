using System.Reflection;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.Tests;

/// <summary>What every formula of a code edition owes: an id of its own, a source, an example that it reproduces.</summary>
public class EveryFormulaTests
{
    private static readonly IReadOnlyList<Formula> All =
    [
        .. typeof(Catalogue).Assembly.GetTypes()
            .SelectMany(t => t.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly))
            .Where(f => f.FieldType == typeof(Formula))
            .Select(f => (Formula)f.GetValue(null)!),
    ];

    public static TheoryData<string> Ids => [.. All.Select(f => f.Id)];

    [Fact]
    public void Ids_are_words_with_dots_and_never_stand_twice()
    {
        Assert.NotEmpty(All);
        Assert.All(All, f => Assert.Matches("^[a-z0-9-]+([.][a-z0-9-]+)+$", f.Id));
        Assert.Equal(All.Count, All.Select(f => f.Id).Distinct().Count());
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void A_formula_names_its_source(string id)
    {
        var formula = All.First(f => f.Id == id);
        Assert.NotEqual("", formula.Source.Document);
        Assert.NotEqual("", formula.Source.Place);
        Assert.Equal(formula.Source.Mark == Mark.Memory, formula.Source.ValueId.Length > 0);
        Assert.NotEqual("", formula.Meaning);
        Assert.All(formula.Operands, o => Assert.NotEqual("", o.Meaning));
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void A_formula_reproduces_its_example(string id)
    {
        var formula = All.First(f => f.Id == id);
        Assert.NotEqual("", formula.Example.Source);
        Assert.True(formula.Example.Tolerance <= Math.Max(0.05 * Math.Abs(formula.Example.Expected), 1e-9), "the tolerance tells right from wrong");
        Assert.Equal(formula.Example.Expected, formula.Compute(formula.Example.Inputs), formula.Example.Tolerance);
    }
}
