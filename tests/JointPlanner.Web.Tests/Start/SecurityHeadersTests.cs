using System.Net;
using System.Text.RegularExpressions;

namespace JointPlanner.Web.Tests.Start;

public sealed class SecurityHeadersTests
{
    [Theory]
    [InlineData("/")]
    [InlineData("/health")]
    [InlineData("/paper.css")]
    [InlineData("/no-such-page")]
    public async Task Every_answer_forbids_other_hosts(string path)
    {
        await using var site = new Site();
        var answer = await site.CreateClient().GetAsync(path);
        var policy = string.Join(' ', answer.Headers.GetValues("Content-Security-Policy"));
        Assert.StartsWith("default-src 'none'", policy, StringComparison.Ordinal);
        Assert.Contains("frame-ancestors 'none'", policy, StringComparison.Ordinal);
        Assert.DoesNotContain("unsafe-eval", policy, StringComparison.Ordinal);
        Assert.DoesNotMatch(@"https?:", policy);
        Assert.Equal("nosniff", Assert.Single(answer.Headers.GetValues("X-Content-Type-Options")));
    }

    [Fact]
    public async Task The_inline_script_carries_the_nonce_of_its_own_answer()
    {
        await using var site = new Site();
        var client = site.CreateClient();
        var nonces = new HashSet<string>();
        for (var i = 0; i < 2; i++)
        {
            var answer = await client.GetAsync("/verify");
            var said = Regex.Match(string.Join(' ', answer.Headers.GetValues("Content-Security-Policy")), "'nonce-([^']+)'").Groups[1].Value;
            Assert.Contains($"nonce=\"{WebUtility.HtmlEncode(said)}\"", WebUtility.HtmlDecode(await answer.Content.ReadAsStringAsync()), StringComparison.Ordinal);
            nonces.Add(said);
        }

        Assert.Equal(2, nonces.Count);
    }

    [Fact]
    public async Task Health_tells_nothing_but_health()
    {
        await using var site = new Site();
        Assert.Equal("Healthy", await site.CreateClient().GetStringAsync("/health"));
    }

    [Fact]
    public async Task A_page_that_is_not_there_is_said_so_with_its_code()
    {
        await using var site = new Site();
        var answer = await site.CreateClient().GetAsync("/no-such-page");
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Contains("Nothing here", await answer.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }
}
