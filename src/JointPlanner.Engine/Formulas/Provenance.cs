namespace JointPlanner.Engine.Formulas;

/// <summary>How surely a value or rule is known.</summary>
public enum Mark
{
    /// <summary>Read in the document that is named with it.</summary>
    Seen,
    /// <summary>Held from memory; to be checked against the licensed text, and confirmed by an owner before anything is issued.</summary>
    Memory,
    /// <summary>Our own derivation or proposal; not published.</summary>
    Own,
    /// <summary>Given by the designer or an owner's rule set, with their source.</summary>
    Given,
}

/// <summary>Where a value or rule comes from.</summary>
/// <param name="Mark">How surely it is known.</param>
/// <param name="Document">The document, or "derived" for our own.</param>
/// <param name="Edition">Edition or date; empty where there is none.</param>
/// <param name="Place">Clause, table or page; for our own derivations the reasoning in a few words.</param>
/// <param name="ValueId">Permanent id under which an owner confirms a value held from memory; empty where nothing is to confirm.</param>
public sealed record Provenance(Mark Mark, string Document, string Edition = "", string Place = "", string ValueId = "")
{
    /// <summary>Our own derivation, said in a few words.</summary>
    public static Provenance Derived(string reasoning) => new(Mark.Own, "derived", "", reasoning);

    /// <summary>A designer's or owner's own figure with its source.</summary>
    public static Provenance By(string source) => new(Mark.Given, source);
}
