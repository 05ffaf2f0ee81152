using System.Collections.Immutable;
using JointPlanner.Engine.Bases;

namespace JointPlanner.Engine.Plans;

/// <summary>Which code edition and owner's rules hold, and how the doubts they leave are treated.</summary>
public sealed record BasisChoice
{
    /// <summary>Id of the code edition, for instance that of "own basis".</summary>
    public required string Code { get; init; }
    /// <summary>Named set of national or regional parameters of that code; empty for the code's own default.</summary>
    public string Profile { get; init; } = "";
    /// <summary>Id of the owner's rule set laid over the code; empty for none.</summary>
    public string OwnerRules { get; init; } = "";
    /// <summary>How the doubt about the temperature at setting is treated when sizing; null for the code's default.</summary>
    public SettingDoubt? Doubt { get; init; }
    /// <summary>Safety format; null for the code's default.</summary>
    public SafetyFormat? Safety { get; init; }
    /// <summary>The designer's answers to entries of the counting table on which the basis is silent.</summary>
    public ImmutableArray<CountingAnswer> Answers { get; init; } = [];
}

/// <summary>The designer's answer to one silent entry of the counting table.</summary>
/// <param name="Cause">Row.</param>
/// <param name="Column">Column.</param>
/// <param name="Factor">Factor on the movement from setting; null for "not counted".</param>
/// <param name="Source">Why.</param>
public sealed record CountingAnswer(Cause Cause, Column Column, double? Factor, string Source);

/// <summary>One cure for the doubt about the temperature at which a joint will be set.</summary>
public enum SettingDoubt
{
    /// <summary>The basis asks for none.</summary>
    None,
    /// <summary>The setting temperature is specified: the smaller allowance of the basis on both ends.</summary>
    Specified,
    /// <summary>The setting temperature is not specified: the larger allowance.</summary>
    Unspecified,
}

/// <summary>How safety is put on thermal movement.</summary>
public enum SafetyFormat
{
    /// <summary>None asked by the basis beyond its factors.</summary>
    None,
    /// <summary>Degrees added at both ends.</summary>
    Degrees,
    /// <summary>A factor on the movement from setting.</summary>
    Factor,
}
