using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.En1992Part1To1Of2023;

/// <summary>Figures of the cements: CS slow, CN normal, CR rapid.</summary>
/// <param name="Name">Class in the code's letters.</param>
/// <param name="Power">α_SC.</param>
/// <param name="Basic">α_bs.</param>
/// <param name="Drying1">α_ds1.</param>
/// <param name="Drying2">α_ds2.</param>
internal sealed record Cements(string Name, double Power, double Basic, double Drying1, double Drying2)
{
    private static readonly Cements Slow = new("class CS", -1, 800, 3, 0.013), Normal = new("class CN", 0, 700, 4, 0.012), Rapid = new("class CR", 1, 600, 6, 0.012);

    public static Cements Of(CementClass cement) => cement switch
    {
        CementClass.Slow => Slow,
        CementClass.Normal => Normal,
        CementClass.Rapid => Rapid,
        _ => throw new ArgumentOutOfRangeException(nameof(cement)),
    };
}
