using JointPlanner.Drawings;
using JointPlanner.Engine.Bases;
using JointPlanner.Exchange.Printing;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structure.Ledger;

/// <summary>The joints: what moves each, what fits it, how it is set, what it lies between.</summary>
public sealed partial class JointBand
{
    private static readonly string[] Shortenings = ["creep", "shrinkage", "concrete"];

    private IReadOnlyList<Cause> causes = [], shownCauses = [];
    private bool areCausesShown;

    /// <summary>Where columns stand; null while nothing is drawn.</summary>
    [Parameter]
    public LedgerGrid? Grid { get; set; }

    private IReadOnlyList<string> RowNames
    {
        get
        {
            // The rows stay while a fault stands in the way, so that nothing jumps while typing.
            if (Bench.Result is { } result) causes = [.. result.Joints.SelectMany(j => j.Movements).Select(m => m.Cause).Distinct().Order()];
            shownCauses = areCausesShown ? causes : [];
            return ["opens and closes by", .. shownCauses.Select(Words.Of), "joint that fits", "set opening", "skew", "set at", "deck age then", "uncertainties", "between", "mark on the drawing"];
        }
    }

    // Ages are asked for only where a deck at the joint shortens.
    private IEnumerable<string> Shortening(string path) => ((string[])["near", "far"]).Where(side =>
        Bench.Document.Has($"{path}/setting/{side}-deck-age")
        || (Bench.Document.TextAt($"{path}/{side}") is { } body && Shortenings.Any(word => Bench.Document.Has($"segments/{body}/{word}"))));

    private Task Add() => Bench.Take(PlanParts.WithJoint(Bench.Document, Bench.UsedIds("joints")), "joints");
}
