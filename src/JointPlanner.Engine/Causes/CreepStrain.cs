using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Formulas.Expression;

namespace JointPlanner.Engine.Causes;

/// <summary>Creep strain still to come after a setting state: of stresses already on, the rest of their curve; of later ones, all of it.</summary>
public static class CreepStrain
{
    private static readonly Operand Stress = new("σ", "mean axial stress, compression positive", Quantity.Stress);
    private static readonly Operand Modulus = new("E_c", "modulus that the creep coefficient belongs to", Quantity.Stress);
    private static readonly Operand AtEnd = new("φ_end", "creep coefficient at the end of life", Quantity.Ratio);
    private static readonly Operand AtSetting = new("φ_set", "creep coefficient at setting", Quantity.Ratio);
    private static readonly Operand Part = new("ε_j", "part of one stress", Quantity.Strain);

    /// <summary>Of a stress that was on at setting.</summary>
    public static readonly Formula OfEarlierStress = new(
        "creep.of-earlier-stress", "ε_j", "creep still to come of a stress that is on at setting", Quantity.Strain, [Stress, Modulus, AtEnd, AtSetting],
        Stress / Modulus * (AtEnd - AtSetting), Provenance.Derived("what is still to come is the difference of one curve from setting to the end of life"),
        new(103.3e-6, 5e-8, "own arithmetic: 6 MPa on 36 981 MPa, 1.3806 less 0.7441", 6e6, 36.981e9, 1.3806, 0.7441));

    /// <summary>Of a stress that comes after setting.</summary>
    public static readonly Formula OfLaterStress = new(
        "creep.of-later-stress", "ε_j", "creep of a stress that comes after setting", Quantity.Strain, [Stress, Modulus, AtEnd],
        Stress / Modulus * AtEnd, Provenance.Derived("a stress that comes after setting creeps in full from then"),
        new(150e-6, 1e-12, "own arithmetic", 3e6, 30e9, 1.5));

    /// <summary>All stresses.</summary>
    public static readonly Formula Sum = new(
        "creep.to-come", "ε_r", "creep strain still to come after setting", Quantity.Strain, [Part], Total(Part),
        Provenance.Derived("creep of stresses put on at different ages adds"), new(3e-6, 1e-12, "own arithmetic", 1e-6, 2e-6));

    /// <summary>The strain.</summary>
    /// <param name="concrete">The concrete with its stresses.</param>
    /// <param name="questions">The model.</param>
    /// <param name="age">Deck age at the setting state, s.</param>
    /// <param name="derivation">Where the steps go.</param>
    internal static Number Of(DescribedConcrete concrete, ModelQuestions questions, Number age, Derivation derivation)
    {
        var end = concrete.EndOfLife(derivation);
        var parts = Enumerable.Range(0, concrete.Concrete.Stages.Length).Select(stage =>
        {
            var loadedAt = concrete.StageAge(stage, derivation);
            var stress = concrete.StageStress(stage, derivation);
            var modulus = questions.CreepModulus(loadedAt, derivation);
            var atEnd = questions.CreepCoefficient(end, loadedAt, derivation);
            return concrete.Concrete.Stages[stage].Age < age.Value
                ? derivation.Once(OfEarlierStress, stress, modulus, atEnd, questions.CreepCoefficient(age, loadedAt, derivation))
                : derivation.Once(OfLaterStress, stress, modulus, atEnd);
        }).ToArray();
        return derivation.Once(Sum, parts);
    }
}
