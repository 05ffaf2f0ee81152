using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Where the formulas and values of the model code come from.</summary>
internal static class Sources
{
    private const string Document = "fib Model Code for Concrete Structures", Edition = "2010";

    /// <summary>Creep.</summary>
    public static Provenance Creep(string place) => new(Mark.Memory, Document, Edition, $"5.1.9.4.3, {place}", "fib-mc-2010/creep");

    /// <summary>Shrinkage.</summary>
    public static Provenance Shrinkage(string place) => new(Mark.Memory, Document, Edition, $"5.1.9.4.4, {place}", "fib-mc-2010/shrinkage");

    /// <summary>Moduli.</summary>
    public static Provenance Modulus(string place) => new(Mark.Memory, Document, Edition, $"5.1.7, {place}", "fib-mc-2010/modulus");

    /// <summary>Figures of the cements as a public text quotes them.</summary>
    public static Provenance QuotedCement(string place) => new(Mark.Seen, Document, Edition, $"{place}, as quoted in a public text");

    /// <summary>The public check that the shared shrinkage formulas reproduce.</summary>
    public const string SecondGeneration = "an open-source finite-element library's verification file to the 2021 draft of EN 1992-1-1";
}
