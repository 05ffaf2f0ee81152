namespace JointPlanner.Exchange.Packages;

/// <summary>An owner's word that a value held from memory stands so in the licensed text.</summary>
/// <param name="ValueId">Id of the value.</param>
/// <param name="Document">Document in which the person read it.</param>
/// <param name="Edition">Its edition.</param>
/// <param name="Place">Clause, table or page.</param>
/// <param name="Person">Name of the person.</param>
/// <param name="Date">Day of the confirmation.</param>
public sealed record Confirmation(string ValueId, string Document, string Edition, string Place, string Person, DateOnly Date);
