using JointPlanner.Archive.Acts;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Shared;

/// <summary>A part of a page that does acts: tells refusals, waits for the password where an act needs it, and says when something has changed.</summary>
public abstract class ActingPart : ComponentBase
{
    private Guid request = Guid.CreateVersion7();

    /// <summary>Something was done: the page reads anew.</summary>
    [Parameter]
    public EventCallback OnDone { get; set; }

    /// <summary>Who does it.</summary>
    [Inject]
    protected Caller Caller { get; set; } = null!;

    /// <summary>What stood in the way; empty for nothing.</summary>
    protected string Says { get; set; } = "";

    /// <summary>What waits for the password.</summary>
    protected EventCallback Waiting { get; private set; }

    /// <summary>Whether an act is under way.</summary>
    protected bool IsWorking { get; private set; }

    /// <summary>Does it; a second press while the first is under way carries the same id and gets the same answer.</summary>
    protected async Task Do(Func<ActCall, Task> act)
    {
        (IsWorking, Says, Waiting) = (true, "", default);
        try
        {
            await act(await Caller.Now(request));
            request = Guid.CreateVersion7();
            await OnDone.InvokeAsync();
        }
        catch (ActRefused refused) when (refused.Reason == RefusalReason.PasswordNeeded)
        {
            Waiting = EventCallback.Factory.Create(this, () => Do(act));
        }
        catch (Exception refused) when (refused is ActRefused or NotFound)
        {
            Says = refused.Message;
            request = Guid.CreateVersion7();
        }

        IsWorking = false;
    }

    /// <summary>Gives up what waits.</summary>
    protected void Leave() => Waiting = default;
}
