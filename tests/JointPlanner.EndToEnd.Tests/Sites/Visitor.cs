using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>One browser window and everything that went wrong in it.</summary>
public sealed class Visitor
{
    private readonly string address;
    private readonly List<string> troubles = [];
    private string ownPassword = "";

    public Visitor(IPage page, string address)
    {
        (Page, this.address) = (page, address);
        page.Console += (_, said) => { if (said.Type == "error") troubles.Add($"console: {said.Text}"); };
        page.PageError += (_, error) => troubles.Add($"script: {error}");
        page.Request += (_, request) =>
        {
            if (!request.Url.StartsWith(address, StringComparison.Ordinal) && !request.Url.StartsWith("data:", StringComparison.Ordinal)) troubles.Add($"other host: {request.Url}");
        };
    }

    public IPage Page { get; }

    /// <summary>Errors of the page and requests to other hosts, so far.</summary>
    public IReadOnlyList<string> Troubles => troubles;

    public async Task Go(string path)
    {
        await Page.GotoAsync(address + path);
        // Until the circuit is up, a press on the prerendered page is lost.
        await Page.WaitForSelectorAsync("[data-interactive=true],[data-interactive=static]");
    }

    public async Task Enter(string account, string password)
    {
        ownPassword = password;
        await Go("/account/enter");
        await Page.FillAsync("#account", account);
        await Page.FillAsync("#password", password);
        await Page.ClickAsync("main button[type=submit]");
        await Page.WaitForSelectorAsync("[data-interactive=true]");
    }

    /// <summary>Does something grave (confirm, sign, issue, withdraw, give roles): the password is typed once more where the page asks for it.</summary>
    /// <param name="press">The press; null where the page asks before there is anything to press.</param>
    /// <param name="done">What is to be seen when it is done.</param>
    public async Task Gravely(Func<Task>? press, ILocator done)
    {
        if (press is not null) await press();
        var asked = Page.Locator("form[data-again]");
        await Assertions.Expect(asked.Or(done).First).ToBeVisibleAsync();
        if (await asked.CountAsync() > 0)
        {
            await asked.Locator("input[type=password]").FillAsync(ownPassword);
            await asked.Locator("button[type=submit]").ClickAsync();
        }

        await Assertions.Expect(done).ToBeVisibleAsync();
    }

    /// <summary>Opens a demo structure from the list.</summary>
    public async Task Open(string structure)
    {
        await Go("/");
        await Page.ClickAsync($"text={structure}");
        await Page.WaitForSelectorAsync(".ledger-picture svg", new() { State = WaitForSelectorState.Attached });
    }

    /// <summary>What the accessibility checker finds, one line each.</summary>
    public async Task<IReadOnlyList<string>> Barriers()
    {
        var found = await Page.RunAxe(new AxeRunOptions { RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa", "best-practice"] } });
        return [.. found.Violations.Select(v => $"{v.Id}: {v.Nodes[0].Html}")];
    }
}
