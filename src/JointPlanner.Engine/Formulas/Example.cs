namespace JointPlanner.Engine.Formulas;

/// <summary>A worked example that a formula must reproduce: every formula carries at least one.</summary>
/// <param name="Expected">Value in SI.</param>
/// <param name="Tolerance">Half the last digit of the example, in SI.</param>
/// <param name="Source">Where the example was worked; "own arithmetic" where it is ours.</param>
/// <param name="Inputs">Operands in order, in SI.</param>
public sealed record Example(double Expected, double Tolerance, string Source, params double[] Inputs);
