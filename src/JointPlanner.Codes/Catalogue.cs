using JointPlanner.Codes.AashtoLrfd7Us;
using JointPlanner.Codes.En1991Part1To5;
using JointPlanner.Codes.Own;
using JointPlanner.Engine.Bases;

namespace JointPlanner.Codes;

/// <summary>Every code edition there is, by its permanent id.</summary>
public static class Catalogue
{
    /// <summary>All editions; own basis, which gives no figure of its own, last.</summary>
    public static IReadOnlyList<CodeBasis> All { get; } = [new En1991Part1To5Basis(), new AashtoLrfd7UsBasis(), new OwnBasis()];

    /// <summary>The edition with this id, or null.</summary>
    public static CodeBasis? Find(string id) => All.FirstOrDefault(b => b.Id == id);
}
