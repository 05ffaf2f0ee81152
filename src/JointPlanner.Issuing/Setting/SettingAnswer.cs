using JointPlanner.Engine.Formulas;

namespace JointPlanner.Issuing.Setting;

/// <summary>In which direction an opening is measured on site.</summary>
public enum Direction
{
    /// <summary>At right angles to the joint line.</summary>
    Normal,
    /// <summary>Along the road.</summary>
    Along,
}

/// <summary>What the issued table says at one temperature and deck age.</summary>
public abstract record SettingAnswer;

/// <summary>The joint may be set. Openings in the direction asked for, m.</summary>
/// <param name="Direction">Direction of measure.</param>
/// <param name="Set">Opening to set.</param>
/// <param name="Minus">How much smaller it may be made.</param>
/// <param name="Plus">How much larger.</param>
/// <param name="Least">Least opening of the window.</param>
/// <param name="Greatest">Greatest opening of the window.</param>
/// <param name="LeastBy">What governs the lower end.</param>
/// <param name="GreatestBy">What governs the upper end.</param>
/// <param name="Reserve">What is kept back at each end for what cannot be known exactly on the day.</param>
public sealed record MaySet(
    Direction Direction, double Set, double Minus, double Plus, double Least, double Greatest, string LeastBy, string GreatestBy, double Reserve) : SettingAnswer;

/// <summary>The joint may not be set now; no number is given.</summary>
/// <param name="Why">Why, a sentence whose numbers are SI.</param>
public sealed record DoNotSet(Finding Why) : SettingAnswer;

/// <summary>What to do with the opening that is there now, m.</summary>
/// <param name="OpenBy">How far to open it; null where it is to be closed or left.</param>
/// <param name="CloseBy">How far to close it; null where it is to be opened or left.</param>
/// <param name="IsWithin">True where it lies within the tolerance already.</param>
public sealed record Correction(double? OpenBy, double? CloseBy, bool IsWithin);

/// <summary>How far the temperature may still change before the second edge is fixed, K; null where temperature does not move the joint.</summary>
/// <param name="Warming">By warming; 0 where nothing is left.</param>
/// <param name="Cooling">By cooling.</param>
public sealed record AllowedDrift(double? Warming, double? Cooling);

/// <summary>An opening as it was set, at one point across the deck.</summary>
/// <param name="Place">Where across the deck.</param>
/// <param name="Opening">Opening as measured, m.</param>
/// <param name="Direction">Direction in which it was measured.</param>
/// <param name="Temperature">Temperature of the structure, °C.</param>
/// <param name="Method">Id of the method by which the temperature was measured.</param>
public sealed record SetPoint(string Place, double Opening, Direction Direction, double Temperature, string Method);

/// <summary>Whether an opening as set still fits at one end of the temperatures.</summary>
/// <param name="Holds">True where it fits with the reserve of the day.</param>
/// <param name="Room">What is left to the limit, m; negative where it does not fit.</param>
/// <param name="Says">The sentence, numbers in SI.</param>
public sealed record EndCheck(bool Holds, double Room, Finding Says);
