namespace JointPlanner.Engine.Formulas;

/// <summary>A value together with the step that made it.</summary>
/// <param name="Step">Index in the derivation's list; −1 where steps are not kept.</param>
/// <param name="Value">Value in SI.</param>
public readonly record struct Number(int Step, double Value);
