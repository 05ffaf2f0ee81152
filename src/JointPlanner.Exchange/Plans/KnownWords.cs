using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Fitting.Joints;

namespace JointPlanner.Exchange.Plans;

/// <summary>Words that a plan may use and that are known outside it: code editions, models of creep and shrinkage, and owners' rule sets.</summary>
public sealed record KnownWords
{
    /// <summary>Nothing known: code, profile, zone and owner's rules are taken as they stand, and whoever computes the plan says what it does not know.</summary>
    public static readonly KnownWords None = new();

    /// <summary>Code editions; null where they are not to be checked.</summary>
    public IReadOnlyList<CodeBasis>? Bases { get; init; }

    /// <summary>Models of creep and shrinkage; null where they are not to be checked.</summary>
    public IReadOnlyList<CreepModel>? CreepModels { get; init; }

    /// <summary>Ids of owners' rule sets; null where they are not to be checked.</summary>
    public IReadOnlyCollection<string>? OwnerRules { get; init; }

    internal Dictionary<string, IReadOnlyCollection<string>> ByWhatTheyName(string code)
    {
        var words = new Dictionary<string, IReadOnlyCollection<string>> { ["family"] = [.. JointFamilies.All.Select(f => f.Word)] };
        if (OwnerRules is not null) words["owner-rules"] = OwnerRules;
        if (CreepModels is not null) words["creep-model"] = [.. CreepModels.Select(m => m.Id)];
        if (Bases is null) return words;
        words["code"] = [.. Bases.Select(b => b.Id)];
        if (Bases.FirstOrDefault(b => b.Id == code) is not { } basis) return words;
        words["profile"] = [.. basis.Profiles];
        words["zone"] = [.. basis.ClimateZones];
        return words;
    }

    internal CodeBasis? BasisOf(string code) => Bases?.FirstOrDefault(b => b.Id == code);
}
