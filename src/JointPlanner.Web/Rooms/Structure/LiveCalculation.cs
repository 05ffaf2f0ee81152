namespace JointPlanner.Web.Rooms.Structure;

/// <summary>One calculation at a time for one open page, off the page's own thread; a newer one stops the older. All pages together use as many threads as there are cores.</summary>
/// <param name="compute">The calculation.</param>
/// <typeparam name="TGiven">What it starts from.</typeparam>
/// <typeparam name="TFound">What it finds.</typeparam>
public sealed class LiveCalculation<TGiven, TFound>(Func<TGiven, CancellationToken, TFound> compute) : IDisposable
    where TFound : class
{
    private CancellationTokenSource? running;

    /// <summary>Computes; null where a newer one has taken its place.</summary>
    public async Task<TFound?> Newest(TGiven given)
    {
        // Newest from this moment on: a call that comes while the older one is still being stopped must not be overtaken by this one.
        var mine = new CancellationTokenSource();
        var before = Interlocked.Exchange(ref running, mine);
        if (before is not null) await before.CancelAsync();
        var entered = false;
        try
        {
            await WorkLimit.Cores.WaitAsync(mine.Token);
            entered = true;
            var found = await Task.Run(() => compute(given, mine.Token), mine.Token);
            return ReferenceEquals(mine, running) ? found : null;
        }
        catch (OperationCanceledException)
        {
            return null;
        }
        finally
        {
            if (entered) WorkLimit.Cores.Release();
            if (ReferenceEquals(mine, running)) running = null;
            mine.Dispose();
        }
    }

    /// <inheritdoc/>
    public void Dispose() => running?.Cancel();
}

/// <summary>As many calculations at once as there are cores.</summary>
internal static class WorkLimit
{
    internal static readonly SemaphoreSlim Cores = new(Environment.ProcessorCount);
}
