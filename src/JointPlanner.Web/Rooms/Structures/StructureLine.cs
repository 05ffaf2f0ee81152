using System.Globalization;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Exchange.Plans;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>One structure in the list: what people call it, where it stands, and its issued sheet.</summary>
/// <param name="Id">Its id.</param>
/// <param name="Name">Its name.</param>
/// <param name="Number">The owner's number for it; empty where none is given.</param>
/// <param name="Place">Where it is, in the owner's words; empty where none are given.</param>
/// <param name="Owner">The owner.</param>
/// <param name="Latest">Its latest revision's number; null for none.</param>
/// <param name="State">Where that stands.</param>
/// <param name="IssuedId">The revision that is issued; null for none.</param>
/// <param name="IssuedNumber">Its number.</param>
public sealed record StructureLine(Guid Id, string Name, string Number, string Place, string Owner, int? Latest, RevisionState? State, Guid? IssuedId, int? IssuedNumber)
{
    private static readonly CompareInfo Letters = CultureInfo.InvariantCulture.CompareInfo;

    /// <summary>True where every word stands in its name, number, place or owner; capitals and accents do not matter.</summary>
    public bool Answers(string sought) => sought.Split(' ', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries)
        .All(word => new[] { Name, Number, Place, Owner }.Any(text => Letters.IndexOf(text, word, CompareOptions.IgnoreCase | CompareOptions.IgnoreNonSpace) >= 0));

    /// <summary>Every structure that the person may read, by name.</summary>
    internal static async Task<IReadOnlyList<StructureLine>> All(ArchiveScope scope)
    {
        var all = scope.Revisions();
        var owners = await scope.Owners().ToDictionaryAsync(o => o.Id, o => o.Name);
        var revisions = (await all.Select(r => new { r.Id, r.StructureId, r.Number, State = r.States.OrderByDescending(s => s.Ordinal).Select(s => s.State).First() }).ToListAsync())
            .ToLookup(r => r.StructureId);
        // Only the latest plan of each is read: it says the owner's number and words.
        var plans = (await all.Where(r => !all.Any(later => later.StructureId == r.StructureId && later.Number > r.Number)).Select(r => new { r.StructureId, r.PlanText }).ToListAsync())
            .ToDictionary(r => r.StructureId, r => PlanDocument.Parse(r.PlanText).Document);
        return
        [
            .. (await scope.Structures().OrderBy(s => s.Name).ToListAsync()).Select(s =>
            {
                var last = revisions[s.Id].MaxBy(r => r.Number);
                var issued = revisions[s.Id].FirstOrDefault(r => r.State == RevisionState.Issued);
                var plan = plans.GetValueOrDefault(s.Id);
                return new StructureLine(s.Id, s.Name, plan?.TextAt("structure/number") ?? "", plan?.TextAt("structure/place") ?? "",
                    owners.GetValueOrDefault(s.OrganisationId, "another organisation"), last?.Number, last?.State, issued?.Id, issued?.Number);
            }),
        ];
    }
}
