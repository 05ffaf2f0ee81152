using JointPlanner.Engine.Plans;

namespace JointPlanner.Engine.Frames;

/// <summary>Numbers of the movements that may be given to the ground under a support.</summary>
internal static class GroundOf
{
    /// <summary>Settlement, m, positive downward.</summary>
    public static int Settlement(Plan plan, Support support) => 3 * plan.Supports.IndexOf(support);

    /// <summary>Movement of bearing level along the deck while nothing pushes the support, m, positive up-station.</summary>
    public static int Along(Plan plan, Support support) => Settlement(plan, support) + 1;

    /// <summary>Tilt about bearing level, rad, positive when the support leans up-station.</summary>
    public static int Tilt(Plan plan, Support support) => Settlement(plan, support) + 2;
}
