using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

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

    /// <summary>The figure by which sizes are told apart.</summary>
    public abstract FamilyFigure SizeFigure { get; }

    /// <summary>Bounds on the gap by the owner's figures.</summary>
    internal abstract IEnumerable<Limit> OwnLimits(SizeTrial trial);

    /// <summary>Bounds on the gap by the code, where they hold for this family.</summary>
    internal abstract IEnumerable<Limit> CodeLimits(SizeTrial trial);

    /// <summary>Rules beside those of the gap.</summary>
    internal abstract IEnumerable<RuleCheck> OtherRules(SizeTrial trial);

    /// <summary>Normal opening at the owner's reference temperature; null where the rule set gives none for the family.</summary>
    internal abstract Number? ReferenceOpening(SizeTrial trial);

    /// <inheritdoc/>
    public override string ToString() => Word;
}
