using System.Net;
using System.Text.RegularExpressions;
using Microsoft.AspNetCore.Mvc.Testing;

namespace JointPlanner.Web.Tests.Rooms.Revisions;

/// <summary>The site with its demonstration, for tests that share it; each test takes a structure of its own where it changes one.</summary>
public sealed class RevisionHouse : IAsyncLifetime
{
    private readonly Site site = new();
    private readonly Dictionary<string, HttpClient> entered = [];

    public RevisionLife Life { get; private set; } = null!;

    public string Folder => site.Folder;

    public ValueTask InitializeAsync()
    {
        using var started = site.CreateClient();
        Life = new RevisionLife(site.Services, site.Folder);
        return ValueTask.CompletedTask;
    }

    public ValueTask DisposeAsync() => site.DisposeAsync();

    /// <summary>Somebody without an account.</summary>
    public HttpClient Stranger() => site.CreateClient(new WebApplicationFactoryClientOptions { AllowAutoRedirect = false });

    /// <summary>A browser in which a demo person is signed in and has just typed the password again.</summary>
    public async Task<HttpClient> Browser(string account)
    {
        // One address may enter only so often in a minute.
        if (entered.TryGetValue(account, out var known)) return known;
        var browser = entered[account] = Stranger();
        var password = Life.Password(account);
        var form = await browser.GetStringAsync("/account/enter");
        var answer = await browser.PostAsync("/account/enter", Form(form, ("_handler", "enter"), ("Entry.Account", account), ("Entry.Password", password)));
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        var again = await browser.PostAsync("/account/again", Form(await browser.GetStringAsync("/"), ("password", password)));
        Assert.Equal(HttpStatusCode.OK, again.StatusCode);
        return browser;
    }

    /// <summary>The text of a page, marks and scripts left out.</summary>
    public static string Text(string page)
    {
        var bare = Regex.Replace(Regex.Replace(page, "<(script|style)[^>]*>.*?</\\1>", " ", RegexOptions.Singleline), "<[^>]+>", " ");
        return Regex.Replace(WebUtility.HtmlDecode(bare), "\\s+", " ");
    }

    /// <summary>The value of a hidden field of the first form that has it.</summary>
    public static string Hidden(string page, string name) => Regex.Match(page, $"name=\"{name}\" value=\"([^\"]*)\"").Groups[1].Value;

    public static FormUrlEncodedContent Form(string page, params (string Name, string Value)[] fields) =>
        new(fields.Prepend(("__RequestVerificationToken", Hidden(page, "__RequestVerificationToken"))).Select(f => KeyValuePair.Create(f.Item1, f.Item2)));

    /// <summary>A form with a file, sent as the page would send it.</summary>
    public static MultipartFormDataContent Upload(string page, string file, string name, byte[] bytes, params (string Name, string Value)[] fields)
    {
        var content = new MultipartFormDataContent();
        foreach (var (field, value) in fields.Prepend(("__RequestVerificationToken", Hidden(page, "__RequestVerificationToken")))) content.Add(new StringContent(value), field);
        content.Add(new ByteArrayContent(bytes), file, name);
        return content;
    }

    /// <summary>Follows the answer to a form to the page that it leads to.</summary>
    public static async Task<string> Landed(HttpClient browser, HttpResponseMessage answer)
    {
        Assert.True(answer.StatusCode == HttpStatusCode.Redirect, $"{answer.StatusCode}: {Text(await answer.Content.ReadAsStringAsync())}");
        return Text(await browser.GetStringAsync(answer.Headers.Location));
    }
}
