using System.Net;

namespace JointPlanner.Web.Start;

/// <summary>Reasons not to start, each a sentence that says what to change. They are looked at before anything is opened.</summary>
public static class Refusals
{
    /// <summary>Every reason that the settings alone give.</summary>
    public static IReadOnlyList<string> Before(IConfiguration configuration, IHostEnvironment environment)
    {
        var reasons = new List<string>();
        var addresses = Addresses(configuration);
        if (configuration.GetValue("Demo:Enabled", false))
        {
            if (!environment.IsDevelopment())
                reasons.Add($"Demo:Enabled is true, but the environment is {environment.EnvironmentName}. Demo mode runs in Development only: set Demo:Enabled to false.");
            foreach (var address in addresses.Where(a => !IsLoopback(a)))
                reasons.Add($"Demo:Enabled is true, but the address {address} is open to other machines. Demo mode listens on loopback only: use http://127.0.0.1:5080.");
        }

        if (environment.IsProduction()) reasons.AddRange(InProduction(configuration, addresses));
        return reasons;
    }

    private static IEnumerable<string> InProduction(IConfiguration configuration, IReadOnlyList<string> addresses)
    {
        var address = configuration["PublicAddress"];
        if (!Uri.TryCreate(address, UriKind.Absolute, out var parsed) || parsed.Scheme != Uri.UriSchemeHttps)
            yield return $"PublicAddress is \"{address}\". Give the https address at which people reach this installation: links and QR codes are made from it.";
        if (string.IsNullOrWhiteSpace(configuration["Keys:Certificate"]) && !configuration.GetValue("Keys:ProtectedByDatabase", false))
            yield return "The keys that protect sign-in cookies would lie unprotected in the database. Give Keys:Certificate (path of a PFX), or set Keys:ProtectedByDatabase to true if the database itself is encrypted.";
        if (addresses.Any(a => a.StartsWith("http:", StringComparison.OrdinalIgnoreCase)) && Proxies.Trusted(configuration).Count == 0)
            yield return "It would listen on plain HTTP without a trusted proxy. List the proxy's address in Proxies:Trusted, or listen on https.";
    }

    private static List<string> Addresses(IConfiguration configuration)
    {
        var addresses = new List<string>((configuration["urls"] ?? "").Split(';', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries));
        addresses.AddRange(configuration.GetSection("Kestrel:Endpoints").GetChildren().Select(e => e["Url"]).OfType<string>());
        foreach (var (key, scheme) in (ReadOnlySpan<(string, string)>)[("http_ports", "http"), ("https_ports", "https")])
            addresses.AddRange((configuration[key] ?? "").Split(';', StringSplitOptions.RemoveEmptyEntries).Select(port => $"{scheme}://*:{port}"));
        // With nothing said the server listens on plain HTTP, loopback.
        return addresses.Count > 0 ? addresses : ["http://localhost:5000"];
    }

    private static bool IsLoopback(string address)
    {
        var host = address.Split("://", 2)[^1];
        host = host.StartsWith('[') ? host[1..].Split(']')[0] : host.Split(':', '/')[0];
        return host.Equals("localhost", StringComparison.OrdinalIgnoreCase) || (IPAddress.TryParse(host, out var ip) && IPAddress.IsLoopback(ip));
    }
}
