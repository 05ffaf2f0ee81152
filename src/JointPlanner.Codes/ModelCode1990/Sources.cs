using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.ModelCode1990;

/// <summary>Where the formulas and values of the model code of 1990 come from; ENV 1992-1-1, Appendix 1, prints the same shrinkage.</summary>
internal static class Sources
{
    private const string Document = "CEB-FIP Model Code", Edition = "1990";

    /// <summary>Creep.</summary>
    public static Provenance Creep(string place) => new(Mark.Memory, Document, Edition, $"2.1.6.4.3, {place}", "ceb-fip-mc-1990/creep");

    /// <summary>Shrinkage as the prestandard restates it.</summary>
    public static Provenance Restated(string place) => new(Mark.Seen, "ENV 1992-1-1, Appendix 1, as shown on a public page", "", $"{place}, restates CEB-FIP Model Code 1990, 2.1.6.4.4");

    /// <summary>Shrinkage held from memory.</summary>
    public static Provenance Shrinkage(string place) => new(Mark.Memory, Document, Edition, $"2.1.6.4.4, {place}", "ceb-fip-mc-1990/shrinkage");

    /// <summary>Moduli and strengths.</summary>
    public static Provenance Modulus(string place) => new(Mark.Memory, Document, Edition, place, "ceb-fip-mc-1990/modulus");
}
