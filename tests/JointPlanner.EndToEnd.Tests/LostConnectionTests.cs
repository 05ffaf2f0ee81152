using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>The wire between browser and server is cut in mid-edit.</summary>
public sealed class LostConnectionTests(RunningSite site, Chromium chromium) : IClassFixture<RunningSite>
{
    private const string Station = "[data-path='supports/p2/station']", Skew = "[data-path='joints/j1/skew']";

    [Fact]
    public async Task What_is_typed_while_the_wire_is_cut_reaches_the_draft_when_it_is_mended()
    {
        await using var wire = new Relay(site.Address);
        var page = await Edit(wire, "Kestrel Lane Overbridge");
        await page.FillAsync(Station, "111 ft");
        wire.Cut();
        await Assertions.Expect(page.Locator(".reconnect-trying")).ToBeVisibleAsync();
        await page.FillAsync(Skew, "21°");
        wire.Mend();
        await Assertions.Expect(page.Locator("#components-reconnect-modal")).ToBeHiddenAsync(new() { Timeout = 60_000 });
        await Assertions.Expect(page.Locator($"{Station}[data-known='111 ft']")).ToHaveCountAsync(1);
        await Assertions.Expect(page.Locator($"{Skew}[data-known='21°']")).ToHaveCountAsync(1);
        await Assertions.Expect(page.Locator("[data-draft=saved]")).ToHaveTextAsync("draft saved");
        await page.ReloadAsync();
        await page.WaitForSelectorAsync("[data-draft]");
        Assert.Equal("111 ft", await page.InputValueAsync(Station));
        Assert.Equal("21°", await page.InputValueAsync(Skew));
        await Assertions.Expect(page.Locator(".unsent")).ToHaveCountAsync(0);
    }

    private async Task<IPage> Edit(Relay wire, string structure)
    {
        var visitor = await chromium.Visit(wire.Address);
        await visitor.Enter("designer", site.Password("designer"));
        await visitor.Open(structure);
        await visitor.Page.WaitForSelectorAsync("[data-draft]");
        return visitor.Page;
    }
}
