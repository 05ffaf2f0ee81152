using JointPlanner.Engine.Formulas;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Where the formulas and values of EN 1992-1-1:2023 come from.</summary>
internal static class Sources
{
    private const string Document = "EN 1992-1-1", Edition = "2023";

    /// <summary>A formula of the annex as a public transcription quotes it.</summary>
    public static Provenance Quoted(string place) => new(Mark.Seen, Document, Edition, $"Annex B, {place}, as quoted in a public transcription");

    /// <summary>Shrinkage.</summary>
    public static Provenance Shrinkage(string place) => new(Mark.Memory, Document, Edition, $"Annex B.6, {place}", "en-1992-1-1-2023/shrinkage");

    /// <summary>Moduli and mean strength.</summary>
    public static Provenance Modulus(string place) => new(Mark.Memory, Document, Edition, place, "en-1992-1-1-2023/modulus");

    /// <summary>A figure of a cement that is held from memory.</summary>
    public static Provenance Cement(string place) => new(Mark.Memory, Document, Edition, $"Annex B.6, {place}", "en-1992-1-1-2023/cements");
}
