using JointPlanner.Codes.AashtoLrfd7Us;
using JointPlanner.Codes.En1991Part1To5;
using JointPlanner.Codes.Own;
using JointPlanner.Engine.Bases;

namespace JointPlanner.Codes;

/// <summary>Every code edition there is, by its permanent id.</summary>
public static class Catalogue
{
    /// <summary>All editions, own basis first.</summary>
    public static IReadOnlyList<CodeBasis> All { get; } = [new OwnBasis(), new AashtoLrfd7UsBasis(), new En1991Part1To5Basis()];

    /// <summary>The edition with this id, or null.</summary>
    public static CodeBasis? Find(string id) => All.FirstOrDefault(b => b.Id == id);
}
