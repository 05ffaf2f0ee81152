using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Bases;

/// <summary>Which end of the gap a limit bounds.</summary>
public enum Bound
{
    /// <summary>The gap must not be smaller.</summary>
    Lower,
    /// <summary>The gap must not be larger.</summary>
    Upper,
}

/// <summary>In which direction a gap is measured.</summary>
public enum Measure
{
    /// <summary>At right angles to the joint line.</summary>
    Normal,
    /// <summary>Along the road.</summary>
    Along,
}

/// <summary>A bound on the clear gap of a joint.</summary>
/// <param name="Name">The rule in a few words, for instance "least gap in service".</param>
/// <param name="Value">The bound, m, in the direction it is measured.</param>
/// <param name="Bound">Lower or upper.</param>
/// <param name="Measure">Direction of measure.</param>
/// <param name="JudgedBy">Column whose movements are set against it; null for a limit at installation, which holds as it stands.</param>
/// <param name="Source">Where it comes from.</param>
public sealed record Limit(string Name, Number Value, Bound Bound, Measure Measure, Column? JudgedBy, Provenance Source)
{
    /// <summary>True when the limit holds on the day of setting and not later.</summary>
    public bool IsAtInstallation => JudgedBy is null;
}
