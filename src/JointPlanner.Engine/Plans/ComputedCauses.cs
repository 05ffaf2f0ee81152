using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine.Plans;

/// <summary>
/// Which causes a plan describes well enough to be computed at a joint by the frame: every deck that ends there bends in the model and says
/// what acts on it. What is computed may not be given beside it.
/// </summary>
public static class ComputedCauses
{
    /// <summary>True where the frame computes the cause at a joint between these bodies.</summary>
    public static bool ByFrame(Plan plan, Joint joint, Cause cause)
    {
        Segment[] decks = [.. plan.Segments.Where(s => s.Id == joint.Near || s.Id == joint.Far)];
        return decks.Length > 0 && cause switch
        {
            Cause.TemperatureDifference => decks.All(s => s is { Section: not null, Gradient: not null }),
            Cause.DeadLoad => decks.All(s => s is { Section: not null, DeadLoad: not null }),
            Cause.Substructure => plan.Supports.Any(s => s.Movement is not null),
            Cause.LiveLoad => plan.LiveLoad is not null && decks.All(s => s.Section is not null),
            Cause.Braking => decks.All(s => s.Braking is not null),
            _ => false,
        };
    }
}
