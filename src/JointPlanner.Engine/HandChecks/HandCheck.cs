using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.HandChecks;

/// <summary>A solved number beside its elementary check.</summary>
/// <param name="What">What is checked, for instance "expansion length of joint j1".</param>
/// <param name="Path">Path in the plan.</param>
/// <param name="Solved">The solved value.</param>
/// <param name="ByHand">The elementary value; null where no elementary formula applies.</param>
/// <param name="Band">Half-width within which both should agree, in the unit of the value.</param>
/// <param name="Reason">Why they may differ, or why no elementary formula applies.</param>
public sealed record HandCheck(string What, string Path, Number Solved, Number? ByHand, double Band, string Reason)
{
    /// <summary>Kind of the value.</summary>
    public Quantity Quantity { get; init; } = Quantity.Length;

    /// <summary>True when there is no elementary value or it agrees within the band.</summary>
    public bool Agrees => ByHand is not { } hand || Math.Abs(hand.Value - Solved.Value) <= Band;
}
