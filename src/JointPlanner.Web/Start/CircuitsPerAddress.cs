using System.Collections.Concurrent;
using Microsoft.AspNetCore.SignalR;

namespace JointPlanner.Web.Start;

/// <summary>How many pages one address may hold open at once: each keeps memory and a calculation of its own.</summary>
internal sealed class CircuitsPerAddress(int most) : IHubFilter
{
    internal const int Usual = 20;

    private static readonly object Counted = new();
    private readonly ConcurrentDictionary<string, int> open = new(StringComparer.Ordinal);

    public async Task OnConnectedAsync(HubLifetimeContext context, Func<HubLifetimeContext, Task> next)
    {
        var address = context.Context.GetHttpContext()?.Connection.RemoteIpAddress?.ToString() ?? "unknown";
        if (!Enter(address)) throw new HubException($"This address holds {most} pages open already. Close some, then load this one again.");
        context.Context.Items[Counted] = address;
        await next(context);
    }

    public async Task OnDisconnectedAsync(HubLifetimeContext context, Exception? exception, Func<HubLifetimeContext, Exception?, Task> next)
    {
        if (context.Context.Items.Remove(Counted, out var address)) Leave((string)address!);
        await next(context, exception);
    }

    internal bool Enter(string address)
    {
        if (open.AddOrUpdate(address, 1, (_, held) => held + 1) <= most) return true;
        Leave(address);
        return false;
    }

    internal void Leave(string address)
    {
        open.AddOrUpdate(address, 0, (_, held) => held - 1);
        // Taken out only if still nought, so that a page that came meanwhile stays counted.
        open.TryRemove(new KeyValuePair<string, int>(address, 0));
    }
}
