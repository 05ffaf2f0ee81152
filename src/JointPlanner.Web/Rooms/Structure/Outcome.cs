using JointPlanner.Engine;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>What came of a plan document: what is wrong with it, or everything that follows from it.</summary>
/// <param name="Reading">The document as read.</param>
/// <param name="Result">Movements, fits and setting tables; null where a fault stands in the way.</param>
public sealed record Outcome(PlanReading Reading, Result? Result)
{
    /// <summary>Faults and warnings of one field.</summary>
    public IReadOnlyList<Fault> At(string path) => [.. Reading.At(path)];
}
