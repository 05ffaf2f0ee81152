namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>A kind of expansion joint: what it asks of a rule set, and how its figures become bounds on the gap and other rules.</summary>
public abstract class JointFamily
{
    /// <summary>Permanent word in rule sets, plans and keys.</summary>
    public abstract string Word { get; }

    /// <summary>What it is called on screen and sheet.</summary>
    public abstract string Name { get; }

    /// <summary>Figures it reads from a rule set, for all sizes or for one.</summary>
    public abstract IReadOnlyList<FamilyFigure> Figures { get; }

    /// <inheritdoc/>
    public override string ToString() => Word;
}
