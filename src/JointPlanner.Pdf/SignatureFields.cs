namespace JointPlanner.Pdf;

/// <summary>The boxes for signatures, side by side. All fields of a document exist, empty, from the start.</summary>
/// <param name="Fields">The fields; how many is the owner's rule.</param>
public sealed record SignatureFields(IReadOnlyList<SignatureField> Fields) : Block;
