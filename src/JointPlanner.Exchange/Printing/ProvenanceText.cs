using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>Says in words where a value or rule comes from and how surely it is known.</summary>
public static class ProvenanceText
{
    /// <summary>The words that stand beside every value held from memory.</summary>
    public const string FromMemory = "from memory, check against the licensed text";

    /// <summary>Document, edition and place, with the mark in words.</summary>
    public static string Of(Provenance source) => source.Mark switch
    {
        Mark.Seen => Cited(source),
        Mark.Memory => $"{Cited(source)} ({FromMemory})",
        Mark.Own when source.Document == Provenance.Derived("").Document => $"our own derivation: {source.Place}",
        Mark.Own => $"our own proposal, not published: {Cited(source)}",
        Mark.Given => $"given by designer or owner: {Cited(source)}",
        _ => throw new ArgumentOutOfRangeException(nameof(source)),
    };

    private static string Cited(Provenance source) =>
        string.Join(", ", new[] { source.Document, source.Edition, source.Place }.Where(part => part.Length > 0));
}
