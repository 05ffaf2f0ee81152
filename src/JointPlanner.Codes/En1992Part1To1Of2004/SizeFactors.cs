namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>Table 3.3: factor k_h by notional size, mm.</summary>
internal static class SizeFactors
{
    public static readonly (double Size, double Factor)[] Rows = [(100, 1.0), (200, 0.85), (300, 0.75), (500, 0.70)];
}
