using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Causes;

/// <summary>Strain still to come after a setting state where the designer gives strain and development.</summary>
public static class OwnStrain
{
    private static readonly Operand Strain = new("ε", "strain at the end of life, shortening positive", Quantity.Strain);
    private static readonly Operand Share = new("s", "share of it over at setting", Quantity.Ratio);
    private static readonly Operand Age = new("t", "deck age at setting", Quantity.Age);
    private static readonly Operand Before = new("t_1", "age before it in the given development", Quantity.Age);
    private static readonly Operand After = new("t_2", "age after it", Quantity.Age);
    private static readonly Operand ShareBefore = new("s_1", "share over at the age before", Quantity.Ratio);
    private static readonly Operand ShareAfter = new("s_2", "share over at the age after", Quantity.Ratio);

    private static readonly Provenance OneCurve = Provenance.Derived("what is still to come is the difference of one curve from setting to the end of life");

    /// <summary>Share over at an age between two given points.</summary>
    public static readonly Formula ShareOver = new(
        "shortening.share-over", "s", "share of the shortening over at setting, linear between the given ages", Quantity.Ratio,
        [ShareBefore, ShareAfter, Age, Before, After],
        ShareBefore + (ShareAfter - ShareBefore) * (Age - Before) / (After - Before), OneCurve,
        new(0.4, 1e-12, "own arithmetic", 0.2, 0.6, 50 * 86400, 0, 100 * 86400));

    /// <summary>Strain still to come.</summary>
    public static readonly Formula StillToCome = new(
        "shortening.still-to-come", "ε_r", "strain still to come after setting", Quantity.Strain, [Strain, Share],
        Strain * (1 - Share), OneCurve, new(160e-6, 1e-9, "own arithmetic", 200e-6, 0.2));

    /// <summary>Strain still to come after a deck age, as steps.</summary>
    /// <param name="path">Path of the shortening in the plan.</param>
    /// <param name="name">What it is called in the steps: creep or shrinkage.</param>
    /// <param name="shortening">Strain and development.</param>
    /// <param name="age">Deck age at the setting state, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    public static Number ToCome(string path, string name, Shortening shortening, Number age, Derivation derivation)
    {
        var strain = derivation.Given($"{path}/strain", "ε", $"{name} strain at the end of life", Quantity.Strain, shortening.Strain, shortening.Source);
        return derivation.Use(StillToCome, "", strain, ShareAt(path, name, shortening, age, derivation));
    }

    private static Number ShareAt(string path, string name, Shortening shortening, Number age, Derivation derivation)
    {
        var points = shortening.Development;
        if (points.IsEmpty)
            return derivation.Given($"{path}/development", "s", $"share of the {name} over at setting: none given, all of it still to come",
                Quantity.Ratio, 0, "", true);
        var next = points.ToList().FindIndex(p => p.Age >= age.Value);
        if (next < 0)
            return ShareOf(points.Length - 1);
        var (before, shareBefore) = next == 0
            ? (derivation.Given($"{path}/development/start/age", "t_1", "start of the development", Quantity.Age, 0),
               derivation.Given($"{path}/development/start/share", "s_1", "nothing is over at the start", Quantity.Ratio, 0))
            : (AgeOf(next - 1), ShareOf(next - 1));
        return points[next].Age <= before.Value
            ? ShareOf(next)
            : derivation.Use(ShareOver, "", shareBefore, ShareOf(next), age, before, AgeOf(next));

        Number AgeOf(int i) => derivation.Given($"{path}/development/{i}/age", "t", $"age in the development of {name}", Quantity.Age, points[i].Age);
        Number ShareOf(int i) => derivation.Given($"{path}/development/{i}/share", "s", $"share of {name} over at that age", Quantity.Ratio, points[i].Share);
    }
}
