using System.Globalization;
using System.Text.Json;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

public sealed class LedgerTests(RunningSite site) : IClassFixture<RunningSite>
{
    // Middle of each column and of the name drawn under its support, in pixels; the name is centred on the support line.
    private const string Middles = """
        () => [...document.querySelectorAll('[data-column^="supports/"]')].map(column => {
          const name = document.querySelector(`.ledger-picture [data-path="${column.dataset.column}"] text`).getBoundingClientRect();
          const own = column.getBoundingClientRect();
          return [own.left + own.width / 2, name.left + name.width / 2];
        })
        """;

    [Theory]
    [InlineData(1280)]
    [InlineData(1440)]
    [InlineData(1900)]
    public async Task Each_column_stands_under_its_support(int width)
    {
        var visitor = await site.Visit("designer", width);
        await visitor.Open("Tarn Moss Viaduct");
        var pairs = (await visitor.Page.EvaluateAsync<JsonElement>(Middles)).EnumerateArray().Select(p => (Column: p[0].GetDouble(), Support: p[1].GetDouble())).ToList();
        Assert.True(pairs.Count >= 5, $"{pairs.Count} columns");
        Assert.All(pairs, p => Assert.Equal(p.Support, p.Column, 1.0));
    }

    [Fact]
    public async Task Typing_changes_the_movements_and_undo_takes_it_back()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Plover Flats Bridge");
        var opens = visitor.Page.Locator("[data-column^='joints/'] .opens").First;
        var before = await opens.InnerTextAsync();
        var warming = visitor.Page.Locator("[data-path='supports/a1/station']");
        await visitor.Page.Locator("[data-path='segments/deck/start']").FillAsync("-40 ft");
        await warming.FillAsync("-40 ft");
        await Assertions.Expect(opens).Not.ToHaveTextAsync(before, new() { UseInnerText = true });
        await visitor.Page.Keyboard.PressAsync("Control+z");
        await visitor.Page.Keyboard.PressAsync("Control+z");
        await Assertions.Expect(opens).ToHaveTextAsync(before, new() { UseInnerText = true });
        Assert.Empty(visitor.Troubles);
    }

    [Fact]
    public async Task A_wrong_entry_stays_as_typed_and_is_told_beside_its_field()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Kestrel Lane Overbridge");
        var skew = visitor.Page.Locator("[data-path='joints/j1/skew']");
        await skew.FillAsync("90°");
        var says = visitor.Page.Locator("#f-joints-j1-skew-says .fault");
        await Assertions.Expect(says).ToContainTextAsync("80°");
        Assert.Equal("90°", await skew.InputValueAsync());
        Assert.Equal("true", await skew.GetAttributeAsync("aria-invalid"));
    }

    [Fact]
    public async Task A_draft_comes_back_after_the_page_is_left()
    {
        var visitor = await site.Visit("designer");
        await visitor.Open("Sorrel Creek Crossing");
        var place = visitor.Page.Locator("[data-path='structure/place']");
        await visitor.Page.ClickAsync("summary:has-text('Site, code and climate')");
        await place.FillAsync("Sorrel Creek, moved a little");
        await Assertions.Expect(visitor.Page.GetByRole(AriaRole.Status).First).ToHaveTextAsync("draft saved", new() { Timeout = 4000 });
        var url = visitor.Page.Url;
        await visitor.Page.GotoAsync("about:blank");
        await visitor.Page.GotoAsync(url);
        await visitor.Page.WaitForSelectorAsync("[data-interactive=true]");
        Assert.Equal("Sorrel Creek, moved a little", await place.InputValueAsync());
    }

    [Theory]
    [InlineData(1440, "light")]
    [InlineData(1440, "dark")]
    [InlineData(390, "light")]
    public async Task Nobody_is_shut_out_and_no_other_host_is_asked(int width, string paper)
    {
        var visitor = await site.Visit("designer", width, 900);
        if (paper == "dark") await visitor.Page.Context.AddCookiesAsync([new() { Name = "paper", Value = "dark", Url = site.Address }]);
        await visitor.Open("Tarn Moss Viaduct");
        Assert.Equal(paper, await visitor.Page.EvaluateAsync<string>("document.documentElement.dataset.theme"));
        Assert.Empty(await visitor.Barriers());
        var overflow = await visitor.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
        Assert.True(overflow <= 0, string.Create(CultureInfo.InvariantCulture, $"the page is {overflow} px wider than the screen"));
        Assert.Empty(visitor.Troubles);
    }
}
