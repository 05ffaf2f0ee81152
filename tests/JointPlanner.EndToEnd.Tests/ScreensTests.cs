using System.Reflection;
using Microsoft.AspNetCore.Components;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Every page with data loaded, on light and dark paper, wide and narrow, in both systems of units: nobody is shut out, no other host is asked, nothing fails.</summary>
public sealed class ScreensTests(RunningSite site) : IClassFixture<RunningSite>
{
    /// <summary>Route, who looks, and how the page is reached from the list of structures; empty where the route itself is the address.</summary>
    private static readonly Screen[] Screens =
    [
        new("/", "designer"),
        new("/structures/new", "designer"),
        new("/structures/{Id:guid}", "designer", "text=Tarn Moss Viaduct"),
        new("/revisions/{Id:guid}", "designer", "text=Tarn Moss Viaduct", "a.revision"),
        new("/verify", "designer"),
        new("/people", "administrator"),
        new("/missing", "designer"),
        new("/status/{Code:int}", "designer") { Address = "/status/403" },
        new("/account/enter", null),
        new("/account/link/{Token}", null) { Address = "/account/link/none" },
        new("/error", null),
    ];

    // A page whose own tests hold it to the same (axe at phone and desktop width, both papers).
    private static readonly string[] HeldElsewhere = ["/structures/{StructureId:guid}/joints/{Joint}/set"];

    public static TheoryData<string> Routes => [.. Screens.Select(screen => screen.Route)];

    [Theory]
    [MemberData(nameof(Routes))]
    public async Task A_page_shuts_nobody_out_and_asks_no_other_host(string route)
    {
        var screen = Screens.Single(s => s.Route == route);
        var visitor = await site.Visit(screen.Account);
        var address = await Address(visitor, screen);
        var before = visitor.Troubles.Count;
        var found = new List<string>();
        foreach (var paper in (string[])["light", "dark"])
            foreach (var units in (string[])["metric", "us"])
            {
                await visitor.Page.Context.AddCookiesAsync([Cookie("paper", paper), Cookie("units", units)]);
                await visitor.Page.SetViewportSizeAsync(1440, 1000);
                await visitor.Go(address);
                foreach (var width in (int[])[1440, 390])
                {
                    await visitor.Page.SetViewportSizeAsync(width, 900);
                    Assert.Equal(paper, await visitor.Page.EvaluateAsync<string>("document.documentElement.dataset.theme"));
                    found.AddRange((await visitor.Barriers()).Select(b => $"{paper} {units} {width}: {b}"));
                    var over = await visitor.Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
                    if (over > 0) found.Add($"{paper} {units} {width}: {over} px wider than the screen");
                }
            }

        Assert.Empty(found);
        Assert.DoesNotContain(visitor.Troubles.Skip(before), trouble => !IsAnswerOf(screen, trouble));
    }

    [Fact]
    public void Every_routable_page_is_on_the_list()
    {
        var routes = typeof(Program).Assembly.GetTypes().SelectMany(type => type.GetCustomAttributes<RouteAttribute>()).Select(route => route.Template).Order(StringComparer.Ordinal).ToList();
        Assert.True(routes.Count > 8);
        Assert.Equal(routes, Screens.Select(s => s.Route).Concat(HeldElsewhere).Order(StringComparer.Ordinal));
    }

    private static async Task<string> Address(Visitor visitor, Screen screen)
    {
        if (screen.Way.Length == 0) return screen.Address ?? screen.Route;
        await visitor.Go("/");
        foreach (var step in screen.Way)
        {
            var was = visitor.Page.Url;
            await visitor.Page.ClickAsync(step);
            await visitor.Page.WaitForURLAsync(url => url != was);
        }

        return new Uri(visitor.Page.Url).AbsolutePath;
    }

    // A browser writes the status of an error page to its console; that is the page's point.
    private static bool IsAnswerOf(Screen screen, string trouble) =>
        screen.Route is "/error" or "/missing" or "/status/{Code:int}" or "/account/link/{Token}" && trouble.Contains("the server responded with a status of", StringComparison.Ordinal);

    private Cookie Cookie(string name, string value) => new() { Name = name, Value = value, Url = site.Address };

    private sealed record Screen(string Route, string? Account, params string[] Way)
    {
        public string? Address { get; init; }
    }
}
