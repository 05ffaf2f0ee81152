using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.En1992Part1To1Of2004;

/// <summary>Figures of the cements: S slow, N normal, R rapid.</summary>
/// <param name="Name">Class in the code's letter.</param>
/// <param name="Power">α of (B.9).</param>
/// <param name="Drying1">α_ds1.</param>
/// <param name="Drying2">α_ds2.</param>
/// <param name="Strength">s of 3.1.2(6).</param>
internal sealed record Cements(string Name, double Power, double Drying1, double Drying2, double Strength)
{
    private static readonly Cements S = new("class S", -1, 3, 0.13, 0.38), N = new("class N", 0, 4, 0.12, 0.25), R = new("class R", 1, 6, 0.11, 0.20);

    public static Cements Of(CementClass cement) => cement switch
    {
        CementClass.Slow => S,
        CementClass.Normal => N,
        CementClass.Rapid => R,
        _ => throw new ArgumentOutOfRangeException(nameof(cement)),
    };
}
