namespace JointPlanner.Exchange.Printing;

/// <summary>A number as it stands on paper, and what a reader who has nothing but the paper takes it for.</summary>
/// <param name="Text">Digits with sign and power of ten, without unit.</param>
/// <param name="Value">The value read back from the text, SI.</param>
/// <param name="LastDigit">One unit of the last printed digit, SI, positive.</param>
public readonly record struct PrintedNumber(string Text, double Value, double LastDigit);
