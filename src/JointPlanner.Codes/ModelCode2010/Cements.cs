using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.ModelCode2010;

/// <summary>Figures of the cements: slow 32.5 N; normal 32.5 R and 42.5 N; rapid 42.5 R, 52.5 N and 52.5 R.</summary>
/// <param name="Name">Cements of the class.</param>
/// <param name="Power">α of the age at loading.</param>
/// <param name="Basic">α_bs.</param>
/// <param name="Drying1">α_ds1.</param>
/// <param name="Drying2">α_ds2.</param>
/// <param name="Strength">s of the strength's development.</param>
internal sealed record Cements(string Name, double Power, double Basic, double Drying1, double Drying2, double Strength)
{
    private static readonly Cements Slow = new("32.5 N", -1, 800, 3, 0.013, 0.38), Normal = new("32.5 R, 42.5 N", 0, 700, 4, 0.012, 0.25),
        Rapid = new("42.5 R, 52.5 N, 52.5 R", 1, 600, 6, 0.012, 0.20);

    public static Cements Of(CementClass cement) => cement switch
    {
        CementClass.Slow => Slow,
        CementClass.Normal => Normal,
        CementClass.Rapid => Rapid,
        _ => throw new ArgumentOutOfRangeException(nameof(cement)),
    };
}
