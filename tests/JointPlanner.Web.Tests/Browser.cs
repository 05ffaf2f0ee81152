using System.Net;
using System.Text.Json;
using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.Web.Tests;

/// <summary>Plain requests as a browser would send them: cookies kept, the page's antiforgery token sent along.</summary>
public sealed class Browser(WebApplicationFactory<Program> site)
{
    public HttpClient Client { get; } = site.CreateClient(new WebApplicationFactoryClientOptions { AllowAutoRedirect = false, BaseAddress = new Uri("https://localhost") });

    public static string Password(Site site, string account) =>
        JsonSerializer.Deserialize<Dictionary<string, string>>(File.ReadAllText(Path.Combine(site.Folder, "demo-people.json")))![account];

    public static async Task<Browser> In(Site site, string account)
    {
        var browser = new Browser(site);
        Assert.Equal(HttpStatusCode.Redirect, (await browser.Enter(account, Password(site, account))).StatusCode);
        return browser;
    }

    public Task<HttpResponseMessage> Enter(string account, string password) =>
        Send("/account/enter", "/account/enter", ("_handler", "enter"), ("Entry.Account", account), ("Entry.Password", password));

    public Task<HttpResponseMessage> Again(string password) => Send("/people", "/account/again", ("password", password));

    /// <summary>Sends a form with the token of the page on which it stands.</summary>
    public async Task<HttpResponseMessage> Send(string page, string path, params (string Name, string Value)[] fields)
    {
        var token = Regex.Match(await Client.GetStringAsync(page), "name=\"__RequestVerificationToken\" value=\"([^\"]+)\"").Groups[1].Value;
        Assert.NotEmpty(token);
        return await Client.PostAsync(path, new FormUrlEncodedContent(fields.Append(("__RequestVerificationToken", token)).Select(f => KeyValuePair.Create(f.Item1, f.Item2))));
    }
}
