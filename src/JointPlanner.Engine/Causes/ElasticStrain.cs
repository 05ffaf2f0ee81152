using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>Elastic strain of stresses that are put on after a setting state. One put on at the very age of setting counts as coming after it.</summary>
public static class ElasticStrain
{
    private static readonly Operand Stress = new("σ", "mean axial stress, compression positive", Quantity.Stress);
    private static readonly Operand Modulus = new("E_c", "modulus when the stress is put on", Quantity.Stress);
    private static readonly Operand Part = new("ε_j", "part of one stress", Quantity.Strain);

    /// <summary>Of one stress.</summary>
    public static readonly Formula OfStress = new(
        "elastic.of-stress", "ε_j", "elastic strain of a stress that comes after setting", Quantity.Strain, [Stress, Modulus], Stress / Modulus,
        Provenance.Derived("a stress that comes after setting shortens the deck in full"), new(100e-6, 1e-12, "own arithmetic", 3e6, 30e9));

    /// <summary>All of them.</summary>
    public static readonly Formula Sum = new(
        "elastic.to-come", "ε_r", "elastic strain still to come after setting", Quantity.Strain, [Part], Total(Part),
        Provenance.Derived("elastic strains add"), new(3e-6, 1e-12, "own arithmetic", 1e-6, 2e-6));

    /// <summary>The strain; null where no stress comes after setting.</summary>
    internal static Number? Of(DescribedConcrete concrete, ModelQuestions questions, Number age, Derivation derivation)
    {
        var parts = Enumerable.Range(0, concrete.Concrete.Stages.Length).Where(stage => concrete.Concrete.Stages[stage].Age >= age.Value)
            .Select(stage => derivation.Once(OfStress, concrete.StageStress(stage, derivation),
                concrete.StageModulus(stage, derivation) ?? questions.ElasticModulus(concrete.StageAge(stage, derivation), derivation)))
            .ToArray();
        return parts.Length == 0 ? null : derivation.Once(Sum, parts);
    }
}
