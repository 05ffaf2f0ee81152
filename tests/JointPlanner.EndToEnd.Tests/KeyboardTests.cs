using System.Text.RegularExpressions;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>One whole journey without a mouse: sign in, open a structure, change a station, unfold a number, read a setting row, save for all, freeze.</summary>
public sealed partial class KeyboardTests(RunningSite site, Chromium chromium) : IClassFixture<RunningSite>
{
    private const string Station = "[data-path='supports/p2/station']";

    // Accessible name, then the outline that shows the focus, then whether it can be seen on the screen.
    private const string Focused = """
        () => {
          const at = document.activeElement, look = getComputedStyle(at), box = at.getBoundingClientRect();
          const name = at.getAttribute('aria-label') ?? document.querySelector(`label[for="${at.id}"]`)?.innerText ?? at.innerText;
          return [name.trim(), `${look.outlineStyle} ${look.outlineWidth}`, box.bottom > 0 && box.top < innerHeight && box.width > 0 ? 'seen' : 'hidden', at.dataset.path ?? at.tagName];
        }
        """;

    [Fact]
    public async Task A_whole_journey_needs_no_mouse()
    {
        var visitor = await chromium.Visit(site.Address);
        var page = visitor.Page;
        await visitor.Go("/");
        await Assertions.Expect(page).ToHaveURLAsync(EnterUrl);
        await To(page, "Account");
        await page.Keyboard.TypeAsync("designer");
        await To(page, "Password");
        await page.Keyboard.TypeAsync(site.Password("designer"));
        await page.Keyboard.PressAsync("Enter");
        await page.WaitForSelectorAsync("h1:has-text('Structures')");
        await page.WaitForSelectorAsync("[data-interactive=true]");

        // The skip link is the first stop of a page and leads behind the bar.
        Assert.Equal("skip", await page.EvaluateAsync<string>("document.querySelector('a[href], button, input').className"));
        await page.Locator(".skip").FocusAsync();
        Assert.Equal("seen", (await At(page))[2]);
        await page.Keyboard.PressAsync("Enter");
        await To(page, "New structure", most: 1);
        await To(page, "Kestrel Lane Overbridge");
        await page.Keyboard.PressAsync("Enter");
        await page.WaitForSelectorAsync(".ledger-picture svg");
        await page.WaitForSelectorAsync("[data-draft]");
        Assert.NotEqual("BODY", (await At(page))[3]);
        await To(page, "station of the support", path: "supports/p2/station", most: 200);
        var opens = page.Locator("[data-column^='joints/'] .opens").First;
        var before = await opens.InnerTextAsync();
        await page.Keyboard.PressAsync("Control+a");
        await page.Keyboard.TypeAsync("105 ft");
        await Assertions.Expect(opens).Not.ToHaveTextAsync(before, new() { UseInnerText = true });
        Assert.Equal("supports/p2/station", (await At(page))[3]);

        // Unfold, read, fold with Esc: the focus goes along and comes back, also while results are drawn anew.
        await opens.Locator("button").FocusAsync();
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(page.Locator(".derivation")).ToBeFocusedAsync();
        await page.Keyboard.PressAsync("Escape");
        await Assertions.Expect(page.Locator(".derivation")).ToHaveCountAsync(0);
        await Assertions.Expect(opens.Locator("button")).ToBeFocusedAsync();
        await To(page, "setting table");
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(page.Locator("#joint-j1-setting")).ToBeInViewportAsync();
        var row = page.Locator("#joint-j1-setting tbody tr").First;
        Assert.Matches(@"°F.*in", (await row.InnerTextAsync()).Replace('\n', ' ').Replace('\t', ' '));

        await page.Keyboard.PressAsync("Control+z");
        await page.Keyboard.PressAsync("Control+y");
        await page.Locator("button:has-text('Save for all')").FocusAsync();
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(page.Locator(".share-done")).ToContainTextAsync("Saved for all");
        Assert.Equal("Save for all", (await At(page))[0]);

        await page.Locator("a.revision").FocusAsync();
        await page.Keyboard.PressAsync("Enter");
        await page.WaitForSelectorAsync("text=Freeze for checking");
        await To(page, "Freeze for checking");
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(page.Locator("h1 .state")).ToHaveTextAsync("in check");
        Assert.NotEqual("BODY", (await At(page))[3]);
    }

    [Theory]
    [InlineData("light")]
    [InlineData("dark")]
    public async Task Every_stop_of_the_ledger_shows_the_focus_and_none_holds_it(string paper)
    {
        var visitor = await site.Visit("designer");
        await visitor.Page.Context.AddCookiesAsync([new() { Name = "paper", Value = paper, Url = site.Address }]);
        await visitor.Open("Plover Flats Bridge");
        await visitor.Page.WaitForSelectorAsync("[data-draft]");
        await visitor.Page.EvaluateAsync("document.querySelector('.skip').focus()");
        var stops = new List<string>();
        for (var i = 0; i < 400; i++)
        {
            await visitor.Page.Keyboard.PressAsync("Tab");
            var at = await At(visitor.Page);
            if (at[3] == "BODY") break;
            stops.Add(at[0]);
            Assert.True(at[1] == "solid 2px", $"stop {i}, {at[3]} “{at[0]}”: outline {at[1]}");
            Assert.True(at[2] == "seen", $"stop {i}, {at[3]} “{at[0]}” is off the screen");
        }

        Assert.InRange(stops.Count, 40, 399);
        Assert.True(await visitor.Page.EvaluateAsync<double>(Contrast) >= 3, "the outline is hard to see on the paper");
    }

    // Contrast of the outline's colour with the paper, as WCAG 2.2 counts it (relative luminance).
    private const string Contrast = """
        () => {
          const of = name => { const probe = document.createElement('i'); probe.style.color = `var(${name})`; document.body.append(probe); const c = getComputedStyle(probe).color; probe.remove(); return c.match(/\d+/g).map(Number); };
          const light = c => { const [r, g, b] = c.map(v => v / 255).map(v => v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4); return 0.2126 * r + 0.7152 * g + 0.0722 * b; };
          const [a, b] = [light(of('--accent')), light(of('--sheet'))].sort((x, y) => y - x);
          return (a + 0.05) / (b + 0.05);
        }
        """;

    [GeneratedRegex("/account/enter")]
    private static partial Regex EnterUrl { get; }

    private static Task<string[]> At(IPage page) => page.EvaluateAsync<string[]>(Focused);

    private static async Task To(IPage page, string name, string? path = null, int most = 60)
    {
        var passed = new List<string>();
        for (var i = 0; i < most; i++)
        {
            await page.Keyboard.PressAsync("Tab");
            var at = await At(page);
            if (at[0] == name && (path is null || at[3] == path)) return;
            passed.Add(at[0]);
        }

        Assert.Fail($"“{name}” is not within {most} stops: {string.Join(" | ", passed)}");
    }
}
