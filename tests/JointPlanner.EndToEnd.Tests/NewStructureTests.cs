using System.Globalization;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>From an empty screen to a setting table, counting what a person has to enter.</summary>
public sealed class NewStructureTests(RunningSite site, ITestOutputHelper output) : IClassFixture<RunningSite>
{
    private const int Aim = 25;

    [Fact]
    public async Task A_setting_table_in_metric_units_takes_few_entries()
    {
        var entries = await Begin("metric");
        await entries.Type("#e-name", "Heron Weir Bridge");
        await entries.Type("#e-number", "N-21");
        await entries.Type("#e-place", "Heron Weir, invented county");
        await entries.Type("#e-stations", "0; 35; 80; 115 m");
        await entries.Choose("#c-fixed-at", "2");
        await entries.Type("#e-lowest", "-24 °C");
        await entries.Type("#e-highest", "37 °C");
        await entries.Type("#e-set-at", "12 °C");
        await entries.Press("main button[type=submit]");
        await Judge(entries, "°C", "mm");
    }

    [Fact]
    public async Task A_setting_table_in_US_units_takes_few_entries()
    {
        var entries = await Begin("us");
        await entries.Press("[aria-label='Units shown'] button:has-text('°F')");
        await entries.Type("#e-name", "Otter Bend Bridge");
        await entries.Type("#e-number", "N-22");
        await entries.Type("#e-place", "Otter Bend, invented county");
        await entries.Type("#e-stations", "0; 90 ft; 201 ft 6 in; 291 ft 6 in");
        await entries.Choose("#c-fixed-at", "2");
        await entries.Choose("#c-zone", "moderate");
        await entries.Type("#e-set-at", "60 °F");
        await entries.Press("main button[type=submit]");
        await Judge(entries, "°F", "in");
    }

    [Fact]
    public async Task An_empty_beginning_says_beside_each_field_what_is_missing_and_loses_nothing()
    {
        var visitor = await site.Visit("designer");
        await visitor.Go("/structures/new");
        await visitor.Page.FillAsync("#e-stations", "0 m");
        await visitor.Page.FillAsync("#e-lowest", "-24");
        await visitor.Page.ClickAsync("main button[type=submit]");
        foreach (var (field, says) in new[] { ("name", "nothing is given"), ("stations", "“0 m” names 1 supports"), ("lowest", "°C"), ("set-at", "nothing is given") })
            await Assertions.Expect(visitor.Page.Locator($"#e-{field}-says .fault").First).ToContainTextAsync(says);
        Assert.Equal("-24", await visitor.Page.InputValueAsync("#e-lowest"));
        Assert.Equal("e-name", await visitor.Page.EvaluateAsync<string>("document.activeElement.id"));
        await visitor.Page.FillAsync("#e-set-at", "12 °C");
        await Assertions.Expect(visitor.Page.Locator("#e-set-at-says .fault")).ToHaveCountAsync(0);
        await visitor.Page.FillAsync("#e-lowest", "-24 °C");
        await visitor.Page.FillAsync("#e-stations", "0; 30 m");
        await Assertions.Expect(visitor.Page.Locator("#e-highest-says .fault").First).ToBeVisibleAsync();
    }

    [Fact]
    public async Task Elastomeric_pads_of_a_shortening_deck_are_asked_for_at_once()
    {
        var visitor = await site.Visit("designer");
        await visitor.Go("/structures/new");
        foreach (var (field, text) in new[] { ("name", "Curlew Sands Viaduct"), ("number", "N-23"), ("place", "Curlew Sands"), ("stations", "0; 40; 80 m"), ("skew", "15°"), ("lowest", "-18 °C"), ("highest", "36 °C"), ("set-at", "10 °C") })
            await visitor.Page.FillAsync($"#e-{field}", text);
        await visitor.Page.SelectOptionAsync("#c-deck", "concrete");
        await visitor.Page.SelectOptionAsync("#c-other-bearings", "elastomeric");
        foreach (var (field, text) in new[] { ("pad-count", "6"), ("pad-modulus", "0.9 MPa"), ("pad-area", "0.16 m2"), ("pad-thickness", "60 mm"), ("strain", "300 µε"), ("strain-source", "designer's estimate"), ("deck-age", "90 d") })
            await visitor.Page.FillAsync($"#e-{field}", text);
        await visitor.Page.ClickAsync("main button[type=submit]");
        await Assertions.Expect(visitor.Page.Locator(".setting-table")).ToHaveCountAsync(2);
        Assert.Equal("15°", await visitor.Page.InputValueAsync("[data-path='joints/j1/skew']"));
        Assert.Equal("60 mm", await visitor.Page.InputValueAsync("[data-path='bearings/b2/pads/elastomer-thickness']"));
    }

    private async Task<Entries> Begin(string what)
    {
        var visitor = await site.Visit("designer");
        var entries = new Entries(visitor, what);
        await entries.Press("text=New structure");
        await visitor.Page.WaitForSelectorAsync("#e-name");
        return entries;
    }

    private async Task Judge(Entries entries, string temperature, string opening)
    {
        var page = entries.Visitor.Page;
        await Assertions.Expect(page.Locator(".setting-table")).ToHaveCountAsync(2);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"entries to a setting table, {entries.What}: {entries.Count} ({entries.List})"));
        Assert.True(entries.Count <= Aim, $"{entries.Count} entries: {entries.List}");

        foreach (var table in await page.Locator(".setting-table").AllAsync())
        {
            var rows = await table.Locator("tbody tr:not(:has(.do-not-set))").AllInnerTextsAsync();
            Assert.NotEmpty(rows);
            Assert.All(rows, row => Assert.Matches($@"{temperature}.*\d.*{opening}", row.Replace('\n', ' ').Replace('\t', ' ')));
        }

        await EveryDefaultIsListed(page);
        Assert.Empty(await page.Locator(".finding-error").AllAsync());
        Assert.Empty(entries.Visitor.Troubles);
    }

    // Each field on screen that shows a default standing in must be a row of the list, by the mark of its item and its own name.
    private static async Task EveryDefaultIsListed(IPage page)
    {
        const string shown = """
            () => [...document.querySelectorAll('.field [data-path]')]
              .filter(f => f.tagName === 'SELECT' ? f.value === '' && f.selectedOptions[0].text.endsWith('(default)') : f.value === '' && f.placeholder.endsWith('(default)'))
              .map(f => `${f.dataset.path}|${f.tagName === 'SELECT' ? f.selectedOptions[0].text : f.placeholder}`)
            """;
        var onScreen = await page.EvaluateAsync<string[]>(shown);
        Assert.True(onScreen.Length >= 8, string.Join(", ", onScreen));
        var panel = page.Locator("details:has(h2:has-text('Defaults that stand in'))");
        await panel.Locator("summary").ClickAsync();
        var rows = await panel.Locator("tbody tr").EvaluateAllAsync<string[][]>("rows => rows.map(r => [r.dataset.default, r.cells[1].innerText, r.cells[2].innerText])");
        Assert.Equal($"Defaults that stand in: {rows.Length}", await panel.Locator("h2").InnerTextAsync());
        var listed = rows.ToDictionary(row => row[0], row => row[1]);
        Assert.All(onScreen, field => Assert.Equal(field.Split('|')[1], $"{Assert.Contains(field.Split('|')[0], listed)} (default)"));
        Assert.All(rows, row => Assert.True(row[2].Length > 10, $"{row[0]} says no reason"));
    }

    /// <summary>What a person enters, counted: a text, a choice, a press each counts one.</summary>
    private sealed class Entries(Visitor visitor, string what)
    {
        private readonly List<string> made = [];

        public Visitor Visitor { get; } = visitor;
        public string What { get; } = what;
        public int Count => made.Count;
        public string List => string.Join(", ", made);

        public Task Type(string field, string text) => Made(field, Visitor.Page.FillAsync(field, text));

        public Task Choose(string field, string word) => Made(field, Visitor.Page.SelectOptionAsync(field, word));

        public Task Press(string button) => Made(button, Visitor.Page.ClickAsync(button));

        private Task Made(string entry, Task act)
        {
            made.Add(entry);
            return act;
        }
    }
}
