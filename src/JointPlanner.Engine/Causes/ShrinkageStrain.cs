using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Causes;

/// <summary>Shrinkage strain still to come after a setting state.</summary>
public static class ShrinkageStrain
{
    private static readonly Operand AtEnd = new("ε_end", "shrinkage strain at the end of life", Quantity.Strain);
    private static readonly Operand AtSetting = new("ε_set", "shrinkage strain at setting", Quantity.Strain);

    /// <summary>The difference of one curve.</summary>
    public static readonly Formula ToCome = new(
        "shrinkage.to-come", "ε_r", "shrinkage strain still to come after setting", Quantity.Strain, [AtEnd, AtSetting], AtEnd - AtSetting,
        Provenance.Derived("what is still to come is the difference of one curve from setting to the end of life"),
        new(144.45e-6, 1e-9, "own arithmetic", 270.42e-6, 125.97e-6));

    /// <summary>The strain.</summary>
    internal static Number Of(DescribedConcrete concrete, ModelQuestions questions, Number age, Derivation derivation) =>
        derivation.Once(ToCome, questions.Shrinkage(concrete.EndOfLife(derivation), derivation), questions.Shrinkage(age, derivation));
}
