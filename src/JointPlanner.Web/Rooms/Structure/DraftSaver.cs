using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Web.Shared;
using PlanDocument = JointPlanner.Exchange.Plans.PlanDocument;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>
/// Saves a person's draft soon after each change: within two seconds, and not at every key. What could not be saved stays in the page and is tried again.
/// </summary>
/// <param name="shelf">Keeps the drafts.</param>
/// <param name="person">Whose draft it is.</param>
/// <param name="draft">The draft as opened.</param>
/// <param name="follow">Takes into the page what came into the draft from elsewhere: text before, text now; says what it was.</param>
/// <param name="log">For what went wrong.</param>
public sealed partial class DraftSaver(DraftShelf shelf, Guid person, Draft draft, Func<string, string, Task<string>> follow, ILogger log) : IAsyncDisposable
{
    private static readonly TimeSpan Gather = TimeSpan.FromMilliseconds(700), TryAgain = TimeSpan.FromSeconds(2);

    private readonly CancellationTokenSource closing = new();
    // One save or one sharing at a time: the version of the draft moves with each.
    private readonly SemaphoreSlim gate = new(1);
    private long version = draft.Version;
    private string saved = draft.Text;
    // Handed over, and no answer came: it may stand in the archive all the same.
    private string? unanswered;
    private PlanDocument? pending;
    private Task loop = Task.CompletedTask;

    /// <summary>Where saving stands, for the person.</summary>
    public string Says { get; private set; } = "draft saved";

    /// <summary>True where nothing typed waits to be saved.</summary>
    public bool IsSaved => pending is null && !IsOvertaken;

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

    /// <summary>Saves what is typed, then merges the draft into the plan that all share.</summary>
    /// <param name="share">The merge.</param>
    /// <returns>The answer and what came in with it; null where the draft could not be saved, and then <see cref="Says"/> tells why.</returns>
    public async Task<(ShareAnswer Answer, string CameIn)?> Share(Func<Task<ShareAnswer>> share)
    {
        await gate.WaitAsync(CancellationToken.None);
        try
        {
            if (!await SaveOnce() || IsOvertaken) return null;
            var answer = await share();
            return (answer, answer.Shared ? await TakeUp(await shelf.Open(person, draft.StructureId, CancellationToken.None)) : "");
        }
        finally
        {
            gate.Release();
        }
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        await closing.CancelAsync();
        await loop;
        if (pending is not null && !IsOvertaken) await SaveOnce();
        closing.Dispose();
        gate.Dispose();
    }

    [LoggerMessage(LogLevel.Warning, "A draft could not be saved.")]
    private static partial void NotSaved(ILogger log, Exception problem);

    private async Task SaveAll()
    {
        Tell("saving…");
        while (pending is not null && !IsOvertaken && !closing.IsCancellationRequested)
        {
            await Pause(Gather);
            await gate.WaitAsync(CancellationToken.None);
            bool isSaved;
            try
            {
                isSaved = await SaveOnce();
            }
            finally
            {
                gate.Release();
            }

            if (!isSaved) await Pause(TryAgain);
        }
    }

    private async Task<bool> SaveOnce()
    {
        var taken = pending;
        if (taken is null || IsOvertaken) return true;
        var text = taken.ToJson();
        try
        {
            if (unanswered is not null) await LookAgain();
            unanswered = text;
            version = await shelf.Save(person, draft.Id, version, text, CancellationToken.None);
            (saved, unanswered) = (text, null);
            if (ReferenceEquals(taken, pending)) pending = null;
            Tell(pending is null ? "draft saved" : "saving…");
            return true;
        }
        catch (ActRefused refused)
        {
            if (refused.Reason == RefusalReason.PlanMoved && await Joins(text)) return await SaveOnce();
            IsOvertaken = true;
            Tell(refused.Message);
            return true;
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem) || problem is System.Data.Common.DbException or InvalidOperationException)
        {
            NotSaved(log, problem);
            Tell("not saved: the archive does not answer. What you typed is still here; trying again.");
            return false;
        }
    }

    private async Task LookAgain()
    {
        var there = await shelf.Open(person, draft.StructureId, CancellationToken.None);
        if (there.Text == unanswered) (version, saved) = (there.Version, there.Text);
    }

    // Another window of the same person saved. What it changed elsewhere comes in; the same field changed in both is for the person to decide.
    private async Task<bool> Joins(string mine)
    {
        var there = await shelf.Open(person, draft.StructureId, CancellationToken.None);
        if (PlanMerge.Merge(saved, mine, there.Text).Clashes.Count > 0) return false;
        await TakeUp(there);
        return true;
    }

    private async Task<string> TakeUp(Draft there)
    {
        var before = saved;
        (version, saved) = (there.Version, there.Text);
        return await follow(before, there.Text);
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
