using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.ModelCode1990;

/// <summary>Figures of the cements: SL slow; N and R normal; RS rapid, high strength.</summary>
/// <param name="Name">Class in the document's letters.</param>
/// <param name="Power">α of the age at loading.</param>
/// <param name="Shrinkage">β_sc.</param>
/// <param name="Strength">s of the strength's development.</param>
internal sealed record Cements(string Name, double Power, double Shrinkage, double Strength)
{
    private static readonly Cements Slow = new("class SL", -1, 4, 0.38), Normal = new("classes N and R", 0, 5, 0.25), Rapid = new("class RS", 1, 8, 0.20);

    public static Cements Of(CementClass cement) => cement switch
    {
        CementClass.Slow => Slow,
        CementClass.Normal => Normal,
        CementClass.Rapid => Rapid,
        _ => throw new ArgumentOutOfRangeException(nameof(cement)),
    };
}
