using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;

namespace JointPlanner.Archive.Acts;

/// <summary>One row of the life of a revision.</summary>
/// <param name="From">Null before there is a revision.</param>
/// <param name="By">Roles that may; none when it follows from another act.</param>
/// <param name="Needs">What has to hold, in words.</param>
public sealed record Transition(RevisionState? From, Act Act, IReadOnlyList<Role> By, RevisionState To, string Needs);

/// <summary>The life of a revision as a table. The database's own guard on states is made from it too.</summary>
public static class Transitions
{
    public static readonly IReadOnlyList<Transition> Table =
    [
        new(null, Act.Begin, [Role.Designer], RevisionState.Draft, "no other draft of the structure"),
        new(RevisionState.Draft, Act.Freeze, [Role.Designer], RevisionState.InCheck, "no fault; computed from the plan as it stands; package, results and PDF"),
        new(RevisionState.InCheck, Act.Return, [Role.Checker], RevisionState.Returned, "a remark; the work goes on in a new draft"),
        new(RevisionState.InCheck, Act.Accept, [Role.Checker], RevisionState.Checked, "not a designer of it, by person and by key; hash shown equals frozen hash"),
        new(RevisionState.InCheck, Act.Sign, [Role.Designer], RevisionState.InCheck, "own field; expected previous hash"),
        new(RevisionState.Checked, Act.Sign, [Role.Designer, Role.Checker], RevisionState.Checked, "own field; expected previous hash"),
        new(RevisionState.Checked, Act.Issue, [Role.Designer, Role.Owner], RevisionState.Issued, "by the owner's rule; no unconfirmed memory value, no unanswered silence, no cause left out; required signatures verify"),
        new(RevisionState.Issued, Act.Withdraw, [Role.Designer, Role.Owner], RevisionState.Withdrawn, "a reason"),
        new(RevisionState.Issued, Act.Supersede, [], RevisionState.Superseded, "a later revision is issued"),
    ];

    /// <summary>The rows that change the state.</summary>
    public static IEnumerable<Transition> Moves => Table.Where(row => row.From != row.To);

    /// <summary>The row for this act from this state, or a refusal that says what the act is done from.</summary>
    public static Transition Find(RevisionState? from, Act act)
    {
        var row = Table.FirstOrDefault(row => row.From == from && row.Act == act);
        if (row is not null) return row;
        var possible = Table.Where(row => row.Act == act).Select(row => Words(row.From)).Distinct();
        throw new ActRefused(
            RefusalReason.WrongState,
            $"\"{act}\" is not possible: the revision is {Words(from)}; it would have to be {string.Join(" or ", possible)}. Load the page again to see where it stands.");
    }

    public static string Words(RevisionState? state) => state switch
    {
        null => "not begun",
        RevisionState.Draft => "a draft",
        RevisionState.InCheck => "in check",
        RevisionState.Returned => "returned",
        RevisionState.Checked => "checked",
        RevisionState.Issued => "issued",
        RevisionState.Superseded => "superseded",
        RevisionState.Withdrawn => "withdrawn",
        _ => throw new ArgumentOutOfRangeException(nameof(state), state, "No such state."),
    };
}
