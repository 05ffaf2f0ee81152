using JointPlanner.Codes.AashtoLrfd7Us;
using JointPlanner.Codes.AashtoLrfdCreep;
using JointPlanner.Codes.Aci209;
using JointPlanner.Codes.En1991Part1To5;
using JointPlanner.Codes.En1992Part1To1Of2004;
using JointPlanner.Codes.En1992Part1To1Of2023;
using JointPlanner.Codes.ModelCode1990;
using JointPlanner.Codes.ModelCode2010;
using JointPlanner.Codes.Own;
using JointPlanner.Engine.Bases;

namespace JointPlanner.Codes;

/// <summary>Every code edition there is, by its permanent id.</summary>
public static class Catalogue
{
    /// <summary>All editions; own basis, which gives no figure of its own, last.</summary>
    public static IReadOnlyList<CodeBasis> All { get; } = [new En1991Part1To5Basis(), new AashtoLrfd7UsBasis(), new OwnBasis()];

    /// <summary>All models of creep and shrinkage. A plan may use another document's model than its basis's own.</summary>
    public static IReadOnlyList<CreepModel> CreepModels { get; } =
        [
            new En1992Part1To1Of2004Model(), new En1992Part1To1Of2023Model(), new ModelCode2010Model(), new ModelCode1990Model(),
            new To2004Model(), new From2005To2014Model(), new From2015Model(), new Aci209Model(),
        ];

    /// <summary>The model of creep and shrinkage with this id, or null.</summary>
    public static CreepModel? FindCreepModel(string id) => CreepModels.FirstOrDefault(m => m.Id == id);

    /// <summary>The edition with this id, or null.</summary>
    public static CodeBasis? Find(string id) => All.FirstOrDefault(b => b.Id == id);
}
