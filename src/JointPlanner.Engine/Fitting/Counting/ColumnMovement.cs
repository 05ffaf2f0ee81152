using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Counting;

/// <summary>What counts in one column of the counting table, from setting at one temperature: factored, both ends normal to the joint and ≥ 0.</summary>
/// <param name="Column">The column.</param>
/// <param name="ClosesBy">C: how far the joint still closes, normal to the joint, m.</param>
/// <param name="OpensBy">O: how far it still opens, normal to the joint, m.</param>
/// <param name="Parts">What counts, cause by cause, along the deck.</param>
/// <param name="LeftOut">What does not count, by rule or because the basis is silent.</param>
public sealed record ColumnMovement(
    Column Column, Number ClosesBy, Number OpensBy, ImmutableArray<CountedPart> Parts, ImmutableArray<LeftOutPart> LeftOut);

/// <summary>One cause's factored share, along the deck.</summary>
/// <param name="Cause">The cause.</param>
/// <param name="Segment">Segment whose temperature it is; empty for causes that belong to the whole joint.</param>
/// <param name="Factor">Factor of the counting table.</param>
/// <param name="ClosesBy">How far it closes the joint, m; null where it does not.</param>
/// <param name="OpensBy">How far it opens the joint, m; null where it does not.</param>
public sealed record CountedPart(Cause Cause, string Segment, Number Factor, Number? ClosesBy, Number? OpensBy);

/// <summary>A movement that is left out of a column, along the deck and without factor.</summary>
/// <param name="Cause">The cause.</param>
/// <param name="Column">The column it is left out of.</param>
/// <param name="ClosesBy">How far it would close the joint, m.</param>
/// <param name="OpensBy">How far it would open the joint, m.</param>
/// <param name="IsSilent">True where the basis says nothing and the designer must answer; false where a rule leaves it out.</param>
/// <param name="Source">The rule that leaves it out; null for silence.</param>
public sealed record LeftOutPart(Cause Cause, Column Column, double ClosesBy, double OpensBy, bool IsSilent, Provenance? Source);

/// <summary>Movement along the joint line.</summary>
/// <param name="ClosesBy">While the joint closes, m.</param>
/// <param name="OpensBy">While the joint opens, m.</param>
/// <param name="Demand">What is judged: the larger one-way value from setting, or the total range where the owner's rules say so, m.</param>
public sealed record RackingMovement(Number ClosesBy, Number OpensBy, Number Demand);
