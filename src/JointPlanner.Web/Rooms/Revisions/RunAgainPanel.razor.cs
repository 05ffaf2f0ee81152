using JointPlanner.Archive.Acts;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Comparing;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>Runs a frozen revision again, as an act without effect.</summary>
public sealed partial class RunAgainPanel : IDisposable
{
    private readonly CancellationTokenSource left = new();
    private RunAgain? again;
    private string says = "";
    private bool isWorking;

    /// <summary>Id of the revision.</summary>
    [Parameter, EditorRequired]
    public Guid RevisionId { get; set; }

    /// <summary>Units shown.</summary>
    [Parameter]
    public DisplayProfile Profile { get; set; } = DisplayProfile.Metric;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private RevisionDesk Desk { get; set; } = null!;

    /// <inheritdoc/>
    public void Dispose()
    {
        left.Cancel();
        left.Dispose();
    }

    private async Task Run()
    {
        if (await Caller.Person() is not { } person) return;
        (isWorking, says, again) = (true, "", null);
        try
        {
            again = await Desk.RunAgain(person, RevisionId, left.Token);
        }
        catch (Exception refused) when (refused is InvalidDataException or NotFound)
        {
            says = refused.Message;
        }
        finally
        {
            isWorking = false;
        }
    }
}
