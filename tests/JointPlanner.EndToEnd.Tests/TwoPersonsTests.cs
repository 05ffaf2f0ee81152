using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Two persons edit one structure; the server dies between edit and save; both go on where they were.</summary>
public sealed class TwoPersonsTests(Chromium chromium)
{
    private const string Place = "[data-path='structure/place']", Station = "[data-path='supports/p2/station']", Skew = "[data-path='joints/j1/skew']";

    [Fact]
    public async Task Disjoint_edits_merge_overlapping_ones_are_chosen_field_by_field_and_a_killed_server_loses_neither_draft()
    {
        await using var site = new SiteProcess(chromium);
        await site.Start();
        await site.Kill();
        await site.MakeCheckerDesigner();
        await site.Start();
        var ada = await site.Visit("designer");
        var milan = await site.Visit("checker");
        foreach (var person in new[] { ada, milan })
        {
            await person.Open("Kestrel Lane Overbridge");
            await person.Page.ClickAsync("summary:has-text('Site, code and climate')");
        }

        await ada.Page.FillAsync(Station, "110 ft");
        await ada.Page.FillAsync(Skew, "20°");
        await milan.Page.FillAsync(Station, "115 ft");
        await milan.Page.FillAsync(Place, "Kestrel Lane, north end");
        await Saved(ada, (Station, "110 ft"), (Skew, "20°"));
        await Saved(milan, (Station, "115 ft"), (Place, "Kestrel Lane, north end"));

        await site.Kill();
        await Assertions.Expect(ada.Page.Locator(".reconnect-trying")).ToBeVisibleAsync();
        await Assertions.Expect(milan.Page.Locator(".reconnect-trying")).ToBeVisibleAsync();
        await site.Start();
        foreach (var person in new[] { ada, milan })
        {
            // The page finds the server again by itself.
            await Assertions.Expect(person.Page.Locator("#components-reconnect-modal")).ToBeHiddenAsync(new() { Timeout = 60_000 });
            await Assertions.Expect(person.Page.Locator("[data-draft=saved]")).ToBeVisibleAsync();
            await Assertions.Expect(person.Page.Locator(".unsent")).ToHaveCountAsync(0);
        }

        Assert.Equal(["110 ft", "20°"], await Values(ada, Station, Skew));
        Assert.Equal(["115 ft", "Kestrel Lane, north end"], await Values(milan, Station, Place));

        await SaveForAll(ada);
        await Assertions.Expect(ada.Page.Locator(".share-done")).ToHaveTextAsync("Saved for all.");

        await SaveForAll(milan);
        var clash = milan.Page.Locator("[data-clash]");
        await Assertions.Expect(clash).ToHaveCountAsync(1);
        Assert.Equal("supports/p2/station", await clash.GetAttributeAsync("data-clash"));
        await Assertions.Expect(clash).ToContainTextAsync("Pier 2: station of the support");
        await Assertions.Expect(clash.Locator("label").Nth(0)).ToContainTextAsync("mine: 115 ft");
        await Assertions.Expect(clash.Locator("label").Nth(1)).ToContainTextAsync("theirs: 110 ft");
        await Assertions.Expect(clash).ToContainTextAsync("was: 112 ft 6 in");
        Assert.Empty(await milan.Barriers());

        await clash.Locator("label").Nth(1).ClickAsync();
        await milan.Page.ClickAsync("text=Save with these choices");
        await Assertions.Expect(milan.Page.Locator(".share-done")).ToContainTextAsync("Saved for all.");
        Assert.Equal(["110 ft", "20°", "Kestrel Lane, north end"], await Values(milan, Station, Skew, Place));

        await SaveForAll(ada);
        await Assertions.Expect(ada.Page.Locator(Place)).ToHaveValueAsync("Kestrel Lane, north end");
        Assert.Equal(["110 ft", "20°"], await Values(ada, Station, Skew));
    }

    // The server knows each entry, and all it knows is saved.
    private static async Task Saved(Visitor person, params (string Field, string Text)[] entries)
    {
        foreach (var (field, text) in entries) await Assertions.Expect(person.Page.Locator($"{field}[data-known='{text}']")).ToHaveCountAsync(1);
        await Assertions.Expect(person.Page.Locator("[data-draft=saved]")).ToHaveTextAsync("draft saved");
    }

    private static Task SaveForAll(Visitor person) => person.Page.ClickAsync("button:has-text('Save for all')");

    private static async Task<IReadOnlyList<string>> Values(Visitor person, params string[] fields)
    {
        var values = new List<string>();
        foreach (var field in fields) values.Add(await person.Page.InputValueAsync(field));
        return values;
    }
}
