using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>One revision: what was frozen, who signed, and the next step of its life.</summary>
public sealed partial class RevisionPage
{
    private RevisionView? view;
    private Guid request = Guid.CreateVersion7();
    private string says = "", remark = "";
    private bool isMissing, isWorking;
    private EventCallback waiting;

    /// <summary>Id of the revision.</summary>
    [Parameter]
    public Guid Id { get; set; }

    /// <summary>What a plain form that led here had to say.</summary>
    [SupplyParameterFromQuery(Name = "says")]
    public string? Said { get; set; }

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private RevisionDesk Desk { get; set; } = null!;

    [Inject]
    private ReturnRevision Returning { get; set; } = null!;

    [Inject]
    private AcceptRevision Accepting { get; set; } = null!;

    [Inject]
    private WithdrawRevision Withdrawing { get; set; } = null!;

    /// <inheritdoc/>
    protected override Task OnParametersSetAsync() => Read();

    private async Task Read()
    {
        if (await Caller.Person() is not { } person) return;
        try
        {
            await using var scope = await ArchiveScope.Enter(Archive, person);
            view = await RevisionView.Read(scope, Id);
        }
        catch (NotFound)
        {
            isMissing = true;
        }
    }

    private Task Freeze() => Do(call => Desk.Freeze(call, Id));

    private Task Accept() => Do(call => Accepting.Do(call, new AcceptRequest(Id, view!.Package!.PackageHash)));

    private Task Return() => Do(call => Returning.Do(call, new ReturnRequest(Id, [new RemarkText(remark)])));

    private Task Issue() => Do(call => Desk.Issue(call, Id));

    private Task Withdraw() => Do(call => Withdrawing.Do(call, new WithdrawRequest(Id, remark)));

    private async Task Do(Func<ActCall, Task> act)
    {
        (isWorking, says, waiting) = (true, "", default);
        try
        {
            // A second press while the first is under way carries the same id and gets the same answer.
            await act(await Caller.Now(request));
            remark = "";
        }
        catch (ActRefused refused) when (refused.Reason == RefusalReason.PasswordNeeded)
        {
            waiting = EventCallback.Factory.Create(this, () => Do(act));
        }
        catch (Exception refused) when (refused is ActRefused or NotFound or InvalidDataException)
        {
            says = refused.Message;
        }

        request = Guid.CreateVersion7();
        await Read();
        isWorking = false;
    }
}
