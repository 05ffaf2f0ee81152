using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>Where the formulas and values of EN 1992-1-1:2004 come from.</summary>
internal static class Sources
{
    private const string Document = "EN 1992-1-1", Edition = "2004";

    /// <summary>A clause as a public transcription quotes it.</summary>
    public static Provenance Quoted(string place) => new(Mark.Seen, Document, Edition, $"{place}, as quoted in a public transcription of the clauses");

    /// <summary>Annex B, creep.</summary>
    public static Provenance AnnexBCreep(string place) => new(Mark.Memory, Document, Edition, $"Annex B.1, {place}", "en-1992-1-1-2004/annex-b-creep");

    /// <summary>Annex B, basic drying shrinkage.</summary>
    public static Provenance AnnexBShrinkage(string place) => new(Mark.Memory, Document, Edition, $"Annex B.2, {place}", "en-1992-1-1-2004/annex-b-shrinkage");

    /// <summary>Moduli.</summary>
    public static Provenance Modulus(string place) => new(Mark.Memory, Document, Edition, place, "en-1992-1-1-2004/modulus");

    /// <summary>The published example that most formulas reproduce.</summary>
    public const string Jrc = "JRC, Bridge design to Eurocodes – Worked examples, 2012, as quoted in an open-source finite-element library";
}
