namespace JointPlanner.Pdf;

/// <summary>How letters of a formula are set.</summary>
public enum MathKind
{
    /// <summary>Leaning: a quantity's symbol.</summary>
    Variable,

    /// <summary>Upright: numbers, units, names of functions.</summary>
    Upright,

    /// <summary>Upright and strong: a result.</summary>
    Strong,

    /// <summary>Upright with space on both sides.</summary>
    Operator,
}
