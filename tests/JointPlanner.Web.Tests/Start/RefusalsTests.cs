using JointPlanner.Web.Start;
using Microsoft.Extensions.Configuration;
using Microsoft.Extensions.FileProviders;
using Microsoft.Extensions.Hosting;

namespace JointPlanner.Web.Tests.Start;

public sealed class RefusalsTests
{
    private static IReadOnlyList<string> Of(string environment, params (string Key, string Value)[] settings) =>
        Refusals.Before(
            new ConfigurationBuilder().AddInMemoryCollection(settings.GroupBy(s => s.Key).ToDictionary(s => s.Key, s => (string?)s.Last().Value)).Build(),
            new Place(environment));

    private static readonly (string, string)[] Sound =
        [("PublicAddress", "https://joints.example"), ("Keys:Certificate", "keys.pfx"), ("urls", "https://0.0.0.0:443")];

    [Fact]
    public void Sound_production_settings_start() => Assert.Empty(Of("Production", Sound));

    [Fact]
    public void Demo_mode_on_loopback_in_development_starts() =>
        Assert.Empty(Of("Development", ("Demo:Enabled", "true"), ("urls", "http://127.0.0.1:5080;http://[::1]:5080;http://localhost:1")));

    [Theory]
    [InlineData("Production")]
    [InlineData("Staging")]
    public void Demo_mode_outside_development_is_refused(string environment) =>
        Assert.Contains(Of(environment, [.. Sound, ("Demo:Enabled", "true"), ("urls", "https://127.0.0.1:443")]), r => r.Contains("Development only", StringComparison.Ordinal));

    [Theory]
    [InlineData("urls", "http://0.0.0.0:5080")]
    [InlineData("urls", "http://127.0.0.1:5080;http://*:5081")]
    [InlineData("urls", "http://[::]:5080")]
    [InlineData("urls", "http://192.0.2.7:5080")]
    [InlineData("http_ports", "8080")]
    [InlineData("Kestrel:Endpoints:Web:Url", "http://+:5080")]
    public void Demo_mode_open_to_other_machines_is_refused(string key, string address) =>
        Assert.Contains(Of("Development", ("Demo:Enabled", "true"), (key, address)), r => r.Contains("loopback only", StringComparison.Ordinal));

    [Theory]
    [InlineData("")]
    [InlineData("http://joints.example")]
    [InlineData("joints.example")]
    public void Production_without_a_secure_public_address_is_refused(string address) =>
        Assert.Contains(Of("Production", [.. Sound, ("PublicAddress", address)]), r => r.Contains("PublicAddress", StringComparison.Ordinal));

    [Fact]
    public void Production_with_unprotected_keys_is_refused() =>
        Assert.Contains(Of("Production", [.. Sound, ("Keys:Certificate", "")]), r => r.Contains("Keys:Certificate", StringComparison.Ordinal));

    [Fact]
    public void Plain_http_in_production_needs_a_trusted_proxy()
    {
        (string, string)[] plain = [.. Sound, ("urls", "http://127.0.0.1:8080")];
        Assert.Contains(Of("Production", plain), r => r.Contains("Proxies:Trusted", StringComparison.Ordinal));
        Assert.Empty(Of("Production", [.. plain, ("Proxies:Trusted:0", "127.0.0.1")]));
    }

    private sealed class Place(string environment) : IHostEnvironment
    {
        public string EnvironmentName { get; set; } = environment;
        public string ApplicationName { get; set; } = "test";
        public string ContentRootPath { get; set; } = "";
        public IFileProvider ContentRootFileProvider { get; set; } = new NullFileProvider();
    }
}
