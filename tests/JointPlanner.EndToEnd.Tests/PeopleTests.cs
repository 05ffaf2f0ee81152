using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>A new colleague from the administrator's "add" to a confirmed certificate.</summary>
public sealed class PeopleTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Own = "a bridge too near the river";

    [Fact]
    public async Task A_person_is_added_sets_the_password_hands_in_a_certificate_and_has_it_confirmed()
    {
        var administrator = await site.Visit("administrator");
        await administrator.Go("/people");
        await administrator.Page.FillAsync("#new-name", "Lena Falk");
        await administrator.Page.FillAsync("#new-account", "lena");
        var shown = administrator.Page.Locator("[data-link]");
        await administrator.Gravely(() => administrator.Page.ClickAsync("text=Add and make a link"), shown);
        var link = await shown.InnerTextAsync();
        Assert.StartsWith($"{site.Address}/account/link/", link, StringComparison.Ordinal);
        await administrator.Page.ClickAsync("text=Roles of Lena Falk");
        await administrator.Page.Locator("tr", new() { HasText = "Demonstration Roads" }).GetByRole(AriaRole.Checkbox, new() { Name = "Lena Falk: checker" }).ClickAsync();
        await Assertions.Expect(administrator.Page.Locator("li", new() { HasText = "Lena Falk" }).First).ToContainTextAsync("Demonstration Roads: checker");

        var lena = await site.Visit(null);
        await lena.Page.GotoAsync(link);
        await lena.Page.FillAsync("#first", Own);
        await lena.Page.FillAsync("#second", Own);
        await lena.Page.ClickAsync("text=Set the password");
        await Assertions.Expect(lena.Page.GetByRole(AriaRole.Status)).ToContainTextAsync("Your password is set");
        await lena.Enter("lena", Own);
        await lena.Go("/people");
        await lena.Page.SetInputFilesAsync("#certificate", new FilePayload { Name = "lena.cer", MimeType = "application/x-x509-ca-cert", Buffer = Certificate() });
        var fingerprint = await lena.Page.Locator("dd.hash").InnerTextAsync();
        await lena.Page.ClickAsync("text=Hand it in");
        await Assertions.Expect(lena.Page.Locator(".held .state")).ToContainTextAsync("waits for an administrator");

        await administrator.Go("/people");
        var waiting = administrator.Page.Locator("article", new() { HasText = "CN=Lena Falk" });
        Assert.DoesNotContain(fingerprint, await administrator.Page.ContentAsync(), StringComparison.Ordinal);
        await waiting.GetByLabel("Fingerprint as Lena Falk").FillAsync((fingerprint[0] == '0' ? '1' : '0') + fingerprint[1..]);
        await waiting.GetByRole(AriaRole.Button, new() { Name = "Confirm" }).ClickAsync();
        await Assertions.Expect(administrator.Page.Locator("section", new() { HasText = "Certificates to confirm" }).GetByRole(AriaRole.Alert)).ToContainTextAsync("is not that of the registered certificate");
        await waiting.GetByLabel("Fingerprint as Lena Falk").FillAsync(fingerprint);
        await administrator.Gravely(() => waiting.GetByRole(AriaRole.Button, new() { Name = "Confirm" }).ClickAsync(), administrator.Page.GetByText("None waits."));
        await lena.Go("/people");
        await Assertions.Expect(lena.Page.Locator(".held .state")).ToHaveTextAsync("confirmed");
        Assert.Empty(administrator.Troubles.Concat(lena.Troubles));
    }

    [Theory]
    [InlineData("administrator", 1440, "light")]
    [InlineData("administrator", 390, "light")]
    [InlineData("designer", 1440, "dark")]
    public async Task Nobody_is_shut_out_of_the_people_page(string account, int width, string paper)
    {
        var visitor = await site.Visit(account, width, 900);
        if (paper == "dark") await visitor.Page.Context.AddCookiesAsync([new() { Name = "paper", Value = "dark", Url = site.Address }]);
        await visitor.Go("/people");
        if (account == "administrator")
        {
            await visitor.Page.GetByRole(AriaRole.Button, new() { Name = "Roles of Milan Prochazka" }).ClickAsync();
            await visitor.Page.FillAsync("#new-organisation", "Another board");
            await visitor.Page.ClickAsync("text=Add it");
            await Assertions.Expect(visitor.Page.Locator("form[data-again]")).ToBeVisibleAsync();
        }

        Assert.Empty(await visitor.Barriers());
        Assert.True(await visitor.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth") <= 0, "the page is wider than the screen");
        if (Environment.GetEnvironmentVariable("JOINT_PLANNER_PICTURES") is { Length: > 0 } folder)
            await visitor.Page.ScreenshotAsync(new() { Path = Path.Combine(folder, $"people-{account}-{width}-{paper}.png"), FullPage = true });
        Assert.Empty(visitor.Troubles);
    }

    private static byte[] Certificate()
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var request = new CertificateRequest("CN=Lena Falk", key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.NonRepudiation, critical: true));
        var today = TimeProvider.System.GetUtcNow();
        using var certificate = request.CreateSelfSigned(today.AddDays(-1), today.AddYears(1));
        return certificate.RawData;
    }
}
