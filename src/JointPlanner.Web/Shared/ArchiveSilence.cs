using System.Data.Common;
using System.Net.Sockets;

namespace JointPlanner.Web.Shared;

/// <summary>Tells an archive that does not answer (stopped, restarting, out of reach) from an archive that refuses and from a fault of ours.</summary>
internal static class ArchiveSilence
{
    internal const string Says = "The archive does not answer. Nothing is lost: try again in a minute; what it took already is not done twice.";

    // Classes of SQLSTATE: connection, operator's intervention (shut down, starting up), system.
    private static readonly string[] Classes = ["08", "57", "58"];

    /// <summary>True where the archive was silent.</summary>
    internal static bool Is(Exception problem) => problem switch
    {
        DbException { SqlState: { Length: > 2 } state } => Classes.Contains(state[..2]),
        DbException { IsTransient: true } or SocketException or IOException or TimeoutException => true,
        _ => problem.InnerException is { } within && Is(within),
    };
}
