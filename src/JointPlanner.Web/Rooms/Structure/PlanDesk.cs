using JointPlanner.Codes;
using JointPlanner.Exchange.Plans;
using JointPlanner.Issuing;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Reads and computes plans with the codes and owners' rule sets of this installation.</summary>
/// <param name="shelf">The rule sets.</param>
public sealed class PlanDesk(OwnerRuleShelf shelf)
{
    /// <summary>Words that a plan may use.</summary>
    public KnownWords Known { get; } = new() { Bases = Catalogue.All, CreepModels = Catalogue.CreepModels, OwnerRules = shelf.Ids };

    /// <summary>Rule sets by id, with their names.</summary>
    public IEnumerable<(string Id, string Name)> RuleNames => shelf.Names;

    /// <summary>What follows from a document as typed.</summary>
    public Calculation Compute(PlanDocument document, CancellationToken cancellation) => Calculation.Of(document, shelf, cancellation);
}
