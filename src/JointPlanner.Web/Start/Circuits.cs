using Microsoft.AspNetCore.Components.Server;

namespace JointPlanner.Web.Start;

/// <summary>How long a browser's session on the server is kept after its connection drops, and how many.</summary>
internal static class Circuits
{
    internal static void Configure(CircuitOptions options)
    {
        options.DetailedErrors = false;
        // A dropped circuit costs as much memory as a live one; what was typed is in the saved draft, not here.
        options.DisconnectedCircuitMaxRetained = 50;
        options.DisconnectedCircuitRetentionPeriod = TimeSpan.FromMinutes(2);
    }
}
