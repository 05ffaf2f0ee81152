using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>
/// Saves a person's draft soon after each change: within two seconds, and not at every key. What could not be saved stays in the page and is tried again.
/// </summary>
public sealed partial class DraftSaver(DraftShelf shelf, Guid person, Draft draft, ILogger log) : IAsyncDisposable
{
    private static readonly TimeSpan Gather = TimeSpan.FromMilliseconds(700), TryAgain = TimeSpan.FromSeconds(2);

    private readonly CancellationTokenSource closing = new();
    private long version = draft.Version;
    private PlanDocument? pending;
    private Task loop = Task.CompletedTask;

    /// <summary>Where saving stands, for the person.</summary>
    public string Says { get; private set; } = "draft saved";

    /// <summary>True where another window took the draft over and this one may not save any more.</summary>
    public bool IsOvertaken { get; private set; }

    /// <summary>Told after each change of <see cref="Says"/>.</summary>
    public event Action? Changed;

    /// <summary>Notes a change to be saved.</summary>
    public void Note(PlanDocument document)
    {
        if (IsOvertaken) return;
        pending = document;
        if (loop.IsCompleted) loop = SaveAll();
    }

    /// <summary>Saves what is not saved yet, now.</summary>
    public async Task Flush()
    {
        await loop;
        if (pending is not null && !IsOvertaken) await SaveOnce();
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        await closing.CancelAsync();
        await Flush();
        closing.Dispose();
    }

    [LoggerMessage(LogLevel.Warning, "A draft could not be saved.")]
    private static partial void NotSaved(ILogger log, Exception problem);

    private async Task SaveAll()
    {
        Tell("saving…");
        while (pending is not null && !IsOvertaken && !closing.IsCancellationRequested)
        {
            await Pause(Gather);
            if (!await SaveOnce()) await Pause(TryAgain);
        }
    }

    private async Task<bool> SaveOnce()
    {
        var taken = pending;
        if (taken is null) return true;
        try
        {
            version = await shelf.Save(person, draft.Id, version, taken.ToJson(), CancellationToken.None);
            if (ReferenceEquals(taken, pending)) pending = null;
            Tell("draft saved");
            return true;
        }
        catch (ActRefused refused)
        {
            IsOvertaken = true;
            Tell(refused.Message);
            return true;
        }
        catch (Exception problem) when (problem is System.Data.Common.DbException or InvalidOperationException or TimeoutException or IOException)
        {
            NotSaved(log, problem);
            Tell("not saved: the archive does not answer. What you typed is still here; trying again.");
            return false;
        }
    }

    private async Task Pause(TimeSpan time)
    {
        try
        {
            await Task.Delay(time, closing.Token);
        }
        catch (OperationCanceledException)
        {
            // The page is going: save at once.
        }
    }

    private void Tell(string says)
    {
        Says = says;
        Changed?.Invoke();
    }
}
