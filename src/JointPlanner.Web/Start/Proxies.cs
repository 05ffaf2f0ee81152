using System.Net;
using Microsoft.AspNetCore.HttpOverrides;

namespace JointPlanner.Web.Start;

/// <summary>The reverse proxies whose word about the caller's address and scheme is believed; nobody else's is.</summary>
internal static class Proxies
{
    internal static IReadOnlyList<IPAddress> Trusted(IConfiguration configuration) =>
        [.. (configuration.GetSection("Proxies:Trusted").Get<string[]>() ?? []).Select(IPAddress.Parse)];

    internal static void AddTrustedProxies(this WebApplicationBuilder builder) =>
        builder.Services.Configure<ForwardedHeadersOptions>(options =>
        {
            var trusted = Trusted(builder.Configuration);
            options.ForwardedHeaders = trusted.Count == 0 ? ForwardedHeaders.None : ForwardedHeaders.XForwardedFor | ForwardedHeaders.XForwardedProto;
            options.KnownProxies.Clear();
            options.KnownIPNetworks.Clear();
            foreach (var proxy in trusted) options.KnownProxies.Add(proxy);
        });
}
