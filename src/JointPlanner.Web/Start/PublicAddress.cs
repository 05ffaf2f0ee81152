using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;

namespace JointPlanner.Web.Start;

/// <summary>The address under which people reach this installation. Links are made from it, never from what a request says of its host.</summary>
public sealed class PublicAddress(IConfiguration configuration, IServer server)
{
    /// <summary>The whole address of a page.</summary>
    /// <param name="path">Its path, with or without a leading slash.</param>
    public string To(string path) => $"{Root.TrimEnd('/')}/{path.TrimStart('/')}";

    // Production has it configured, or has not started; on a developer's machine the server's own address does.
    private string Root => configuration["PublicAddress"] is { Length: > 0 } given ? given
        : server.Features.Get<IServerAddressesFeature>()?.Addresses.FirstOrDefault() ?? "http://localhost";
}
