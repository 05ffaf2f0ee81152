using System.Reflection;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Tests.Printing;

/// <summary>Every formula that Engine and Codes hold in static fields, by id.</summary>
internal static class EveryFormula
{
    public static readonly IReadOnlyList<Formula> All = [.. FormulasOf(typeof(Formula).Assembly), .. FormulasOf(Assembly.Load("JointPlanner.Codes"))];

    public static TheoryData<string> Ids => [.. All.Select(f => f.Id)];

    public static Formula Of(string id) => All.First(f => f.Id == id);

    private static IEnumerable<Formula> FormulasOf(Assembly assembly) => assembly.GetTypes()
        .SelectMany(t => t.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly))
        .Where(f => f.FieldType == typeof(Formula))
        .Select(f => (Formula)f.GetValue(null)!);
}
