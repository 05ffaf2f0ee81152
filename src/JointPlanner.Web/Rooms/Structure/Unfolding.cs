using JointPlanner.Engine.Formulas;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>A number that the person asked about, with the steps that lead to it.</summary>
/// <param name="Id">Which number of the page, so that the same press folds it again.</param>
/// <param name="Steps">Steps of the calculation, and those made to explain this number.</param>
/// <param name="Wanted">The steps asked for: one, or the two sides of a comparison.</param>
/// <param name="Title">What the number is.</param>
/// <param name="Closing">How the number follows from the steps, where no step says it; empty for none.</param>
public sealed record Unfolding(string Id, IReadOnlyList<Step> Steps, IReadOnlyList<int> Wanted, string Title, string Closing = "");
