using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>What this person may do with the revision where it stands.</summary>
public sealed partial class RevisionActs
{
    // Made when the buttons are shown: a second press carries the same id and gets the first answer.
    private Guid request = Guid.CreateVersion7();
    private string remark = "";
    private bool isWorking;
    private EventCallback waiting;

    /// <summary>The revision.</summary>
    [Parameter, EditorRequired]
    public RevisionView View { get; set; } = null!;

    /// <summary>Told after an act: the refusal, or nothing where it was done.</summary>
    [Parameter]
    public EventCallback<string> OnDone { get; set; }

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private RevisionDesk Desk { get; set; } = null!;

    [Inject]
    private BeginRevision Beginning { get; set; } = null!;

    [Inject]
    private ReturnRevision Returning { get; set; } = null!;

    [Inject]
    private AcceptRevision Accepting { get; set; } = null!;

    [Inject]
    private WithdrawRevision Withdrawing { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    private RevisionState State => View.Revision.State;

    private Guid Id => View.Revision.Id;

    private Task Freeze() => Do(call => Desk.Freeze(call, Id));

    private Task Accept() => Do(call => Accepting.Do(call, new AcceptRequest(Id, View.Package!.PackageHash)));

    private Task Return() => Do(call => Returning.Do(call, new ReturnRequest(Id, [new RemarkText(remark)])));

    private Task Issue() => Do(call => Desk.Issue(call, Id));

    private Task Withdraw() => Do(call => Withdrawing.Do(call, new WithdrawRequest(Id, remark)));

    private Task Begin() => Do(async call =>
    {
        await Beginning.Do(call, new BeginRequest(View.Structure.Id));
        Navigation.NavigateTo($"structures/{View.Structure.Id}");
    });

    private async Task Do(Func<ActCall, Task> act)
    {
        if (isWorking) return;
        (isWorking, waiting) = (true, default);
        var refusal = "";
        try
        {
            await act(await Caller.Now(request));
            remark = "";
        }
        catch (ActRefused refused) when (refused.Reason == RefusalReason.PasswordNeeded)
        {
            // Not done yet, and so still the same request.
            waiting = EventCallback.Factory.Create(this, () => Do(act));
            isWorking = false;
            return;
        }
        catch (Exception refused) when (refused is ActRefused or NotFound or InvalidDataException)
        {
            refusal = refused.Message;
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            // The next press carries the same id: what was done before the silence is not done twice.
            await OnDone.InvokeAsync(ArchiveSilence.Says);
            isWorking = false;
            return;
        }

        request = Guid.CreateVersion7();
        await OnDone.InvokeAsync(refusal);
        isWorking = false;
    }
}
