using JointPlanner.Engine.Formulas;

namespace JointPlanner.Exchange.Printing;

/// <summary>How a kind of quantity is shown: its unit, the digits wanted, and a power of ten that is always written out.</summary>
/// <param name="Unit">The unit.</param>
/// <param name="Digits">Digits wanted where nothing asks for more.</param>
/// <param name="Exponent">The written power of ten: −6 shows 0.000012 as 12.0×10⁻⁶; 0 shows none.</param>
public sealed record DisplayUnit(Unit Unit, Digits Digits, int Exponent = 0);
