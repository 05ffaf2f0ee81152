using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>One revision in the chain of a structure's revisions: where it stands, and who brought it there when.</summary>
/// <param name="Id">Its id; null for a number that the person sees nothing of.</param>
/// <param name="Number">Its number.</param>
/// <param name="State">Where it stands; null for a number that the person sees nothing of.</param>
/// <param name="Happened">What happened to it, in order.</param>
/// <param name="Remarks">What the checker wrote when returning it.</param>
public sealed record ChainLink(Guid? Id, int Number, RevisionState? State, IReadOnlyList<ChainEvent> Happened, IReadOnlyList<string> Remarks)
{
    /// <summary>All of them, latest first, gaps included.</summary>
    internal static async Task<IReadOnlyList<ChainLink>> All(ArchiveScope scope, Guid structureId)
    {
        var revisions = await scope.Revisions().Include(r => r.States).Where(r => r.StructureId == structureId).ToDictionaryAsync(r => r.Number);
        var remarks = (await scope.Remarks().Where(r => r.Revision!.StructureId == structureId).OrderBy(r => r.Position).ToListAsync()).ToLookup(r => r.RevisionId, r => r.Text);
        var names = await scope.Names();
        return
        [
            .. Enumerable.Range(1, revisions.Keys.DefaultIfEmpty(0).Max()).Reverse().Select(number => revisions.TryGetValue(number, out var found)
                ? new ChainLink(found.Id, number, found.State, [.. found.States.OrderBy(s => s.Ordinal).Select(s => Event(s, names))], [.. remarks[found.Id]])
                : new ChainLink(null, number, null, [], [])),
        ];
    }

    private static ChainEvent Event(StateEntry entry, IReadOnlyDictionary<Guid, string> names) =>
        new(entry.At, Did(entry), names.GetValueOrDefault(entry.PersonId, "a person of another organisation"), entry.Reason ?? "");

    private static string Did(StateEntry entry) => (entry.Act, entry.State) switch
    {
        (Act.Freeze, _) => "frozen for checking",
        (Act.Accept, _) => "checked and accepted",
        (Act.Issue, _) => "issued",
        (Act.Supersede, _) => "superseded",
        (Act.Withdraw, _) => "withdrawn",
        (Act.Return, RevisionState.Returned) => "returned with remarks",
        (Act.Return, _) => "begun, to go on after the return",
        _ => "begun",
    };
}

/// <summary>One thing that happened to a revision.</summary>
/// <param name="At">When.</param>
/// <param name="What">What, in words.</param>
/// <param name="Who">By whom.</param>
/// <param name="Reason">Why; empty where none is asked.</param>
public sealed record ChainEvent(DateTimeOffset At, string What, string Who, string Reason);
