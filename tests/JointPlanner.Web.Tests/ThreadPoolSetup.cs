using System.Runtime.CompilerServices;

namespace JointPlanner.Web.Tests;

/// <summary>Component tests block a thread while they wait for a render. With as many threads as cores at the start, the renderer itself would wait for one of them.</summary>
internal static class ThreadPoolSetup
{
    [ModuleInitializer]
    internal static void RaiseMinThreads()
    {
        ThreadPool.GetMinThreads(out var workers, out var ports);
        ThreadPool.SetMinThreads(Math.Max(workers, 64), Math.Max(ports, 64));
    }
}
