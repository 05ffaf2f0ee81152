namespace JointPlanner.Engine.Formulas;

/// <summary>One line of a calculation: a value, what it is, and how it came about.</summary>
/// <param name="Index">Place in the list; operands refer to it.</param>
/// <param name="Symbol">Printed symbol.</param>
/// <param name="Meaning">What it is, in words.</param>
/// <param name="Quantity">Kind of value.</param>
/// <param name="Value">Value in SI.</param>
/// <param name="Origin">How it came about.</param>
/// <param name="Key">Result key, or empty for an intermediate value.</param>
public sealed record Step(int Index, string Symbol, string Meaning, Quantity Quantity, double Value, Origin Origin, string Key);

/// <summary>How a value came about.</summary>
public abstract record Origin
{
    /// <summary>Steps it was made from.</summary>
    public virtual IReadOnlyList<int> Operands => [];
}

/// <summary>Given in the plan or an owner's rule set.</summary>
/// <param name="Path">Path in the plan or rule set.</param>
/// <param name="Source">The designer's or owner's source note, or the reason of a default; empty where none is asked.</param>
/// <param name="IsDefault">True when nobody gave it and a stated default stands in.</param>
public sealed record GivenOrigin(string Path, string Source, bool IsDefault) : Origin;

/// <summary>Read from a table or clause of a code.</summary>
/// <param name="Source">Document, edition, place and mark.</param>
/// <param name="Row">Row and column, or how it was interpolated.</param>
public sealed record TableOrigin(Provenance Source, string Row) : Origin;

/// <summary>Computed by a formula from earlier steps.</summary>
public sealed record FormulaOrigin(Formula Formula, IReadOnlyList<int> From) : Origin
{
    /// <inheritdoc/>
    public override IReadOnlyList<int> Operands => From;
}

/// <summary>An unknown of a solved system of equations.</summary>
/// <param name="Model">Which model listing it belongs to.</param>
/// <param name="Residual">Largest out-of-balance relative to the largest load.</param>
/// <param name="From">Steps the model was built from.</param>
public sealed record SolvedOrigin(string Model, double Residual, IReadOnlyList<int> From) : Origin
{
    /// <inheritdoc/>
    public override IReadOnlyList<int> Operands => From;
}

/// <summary>Chosen from candidates; the list tells why each other one was left.</summary>
/// <param name="Candidates">Candidates in order of trying.</param>
/// <param name="From">Steps the choice rests on.</param>
public sealed record SearchOrigin(IReadOnlyList<Candidate> Candidates, IReadOnlyList<int> From) : Origin
{
    /// <inheritdoc/>
    public override IReadOnlyList<int> Operands => From;
}

/// <summary>One candidate of a search.</summary>
/// <param name="Name">Its name.</param>
/// <param name="RejectedBy">The rule that rejected it, or empty for the chosen one.</param>
public sealed record Candidate(string Name, string RejectedBy);
