using System.Collections.Immutable;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>What a plan document says: the plan to compute, or what is wrong with it.</summary>
/// <param name="Plan">The plan; null where a fault stands in its way.</param>
/// <param name="Faults">Faults and warnings in the order of the document.</param>
/// <param name="Defaults">Every stated default that stands in where nobody gave a value.</param>
/// <param name="Document">The document that was read; null where the file was none.</param>
public sealed record PlanReading(Plan? Plan, ImmutableArray<Fault> Faults, ImmutableArray<DefaultUsed> Defaults, PlanDocument? Document)
{
    /// <summary>True where a fault stands in the way of computing.</summary>
    public bool HasErrors => Faults.Any(f => !f.IsWarning);

    /// <summary>Faults and warnings of one field.</summary>
    public IEnumerable<Fault> At(string path) => Faults.Where(f => f.Path == path);
}
