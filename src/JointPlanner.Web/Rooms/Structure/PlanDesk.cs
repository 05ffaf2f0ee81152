using JointPlanner.Codes;
using JointPlanner.Engine;
using JointPlanner.Engine.Bases;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Reads and computes plans with the codes and owners' rule sets of this installation.</summary>
public sealed class PlanDesk
{
    private readonly IReadOnlyDictionary<string, OwnerRuleSet> rules;
    private readonly PlanReader reader;

    /// <summary>A desk with these rule sets.</summary>
    public PlanDesk(IReadOnlyDictionary<string, OwnerRuleSet> rules)
    {
        this.rules = rules;
        Known = new KnownWords { Bases = Catalogue.All, OwnerRules = rules.Count == 0 ? null : [.. rules.Keys.Order(StringComparer.Ordinal)] };
        reader = new PlanReader(Known);
    }

    /// <summary>Words that a plan may use.</summary>
    public KnownWords Known { get; }

    /// <summary>What follows from a document as typed.</summary>
    public Outcome Compute(PlanDocument document, CancellationToken cancellation)
    {
        var reading = reader.Read(document);
        if (reading.Plan is not { } plan || Catalogue.Find(plan.Basis.Code) is not { } basis) return new Outcome(reading, null);
        // The step to which openings are rounded belongs to the plan's own units, never to what a screen happens to show.
        var step = DisplayProfile.Of(document.TextAt("display") ?? DisplayProfile.Metric.Id).SettingStep;
        var owner = rules.TryGetValue(plan.Basis.OwnerRules, out var set) ? new Owner(set, step) : null;
        return new Outcome(reading, Movements.Of(plan, basis, owner, cancellation));
    }
}
