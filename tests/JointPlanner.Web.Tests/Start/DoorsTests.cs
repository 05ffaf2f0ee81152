using System.Net;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Builder;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Http;
using Microsoft.AspNetCore.Routing;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests.Start;

/// <summary>Every route says who may use it, and what is open to strangers stands here by name.</summary>
public sealed class DoorsTests
{
    private static readonly string[] OpenPages = ["/account/enter", "/account/leave", "/account/link/{Token}", "/error", "/health", "/missing", "/status/{Code:int}", "/verify"];

    private static readonly string[] Machinery = ["/_blazor", "/_framework"];

    private static IReadOnlyList<RouteEndpoint> Routes(IServiceProvider services) =>
        [.. services.GetRequiredService<EndpointDataSource>().Endpoints.OfType<RouteEndpoint>()];

    private static string Path(RouteEndpoint endpoint) => "/" + endpoint.RoutePattern.RawText!.TrimStart('/');

    private static IEnumerable<string> Silent(IEnumerable<RouteEndpoint> endpoints) =>
        endpoints.Where(e => e.Metadata.GetMetadata<IAuthorizeData>() is null && e.Metadata.GetMetadata<IAllowAnonymous>() is null).Select(Path);

    private static IEnumerable<string> Unguarded(IEnumerable<RouteEndpoint> endpoints) =>
        endpoints.Where(TakesForms).Where(e => e.Metadata.GetMetadata<IAntiforgeryMetadata>() is not { RequiresValidation: true }).Select(Path);

    private static bool TakesForms(RouteEndpoint endpoint) =>
        endpoint.Metadata.GetMetadata<HttpMethodMetadata>()?.HttpMethods.Contains("POST") == true && !Machinery.Any(m => Path(endpoint).StartsWith(m, StringComparison.Ordinal));

    [Fact]
    public async Task Every_route_says_who_may_use_it()
    {
        await using var site = new Site();
        var routes = Routes(site.Services);
        Assert.Contains(routes, e => Path(e) == "/structures/{Id:guid}" && e.Metadata.GetMetadata<IAuthorizeData>() is not null);
        // Development alone has this one, for files that are not on the list yet; it is closed to strangers by default.
        Assert.DoesNotContain(Silent(routes), path => path != "/{**path:file}");
    }

    [Fact]
    public async Task What_is_open_to_strangers_is_this_list_and_nothing_else()
    {
        await using var site = new Site();
        var open = Routes(site.Services).Where(e => e.Metadata.GetMetadata<IAllowAnonymous>() is not null).Select(Path).Distinct()
            // Style sheets, scripts, typefaces and their licence carry nothing of anybody.
            .Where(p => !Machinery.Any(m => p.StartsWith(m, StringComparison.Ordinal)) && !p.StartsWith("/_content/", StringComparison.Ordinal) && System.IO.Path.GetExtension(p) is not (".css" or ".js" or ".svg" or ".woff2" or ".txt" or ".gz" or ".br"));
        Assert.Equal(OpenPages, open.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task A_route_that_says_nothing_is_found_and_closed_to_strangers()
    {
        await using var site = new Site();
        await using var planted = site.WithWebHostBuilder(host => host.ConfigureServices(services => services.AddSingleton<IStartupFilter, PlantedRoute>()));
        var answer = await planted.CreateClient(new() { AllowAutoRedirect = false }).GetAsync("/planted");
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        Assert.Contains("/account/enter", answer.Headers.Location!.ToString(), StringComparison.Ordinal);
        Assert.Equal(["/planted"], Silent([PlantedRoute.Endpoint]));
    }

    [Fact]
    public void A_page_that_says_nothing_is_shown_to_nobody()
    {
        Assert.False(Doors.Says(typeof(SilentPage)));
        var pages = typeof(Program).Assembly.GetTypes().Where(t => t.GetCustomAttributes(typeof(RouteAttribute), inherit: false).Length > 0).ToList();
        Assert.True(pages.Count >= 10, $"{pages.Count} pages");
        Assert.All(pages, page => Assert.True(Doors.Says(page), page.Name));
    }

    [Fact]
    public async Task Every_form_is_guarded_against_other_sites()
    {
        await using var site = new Site();
        var forms = Routes(site.Services).Where(TakesForms).ToList();
        Assert.True(forms.Count >= 10, $"{forms.Count} forms");
        Assert.Empty(Unguarded(forms));

        var open = new RouteEndpointBuilder(_ => Task.CompletedTask, Microsoft.AspNetCore.Routing.Patterns.RoutePatternFactory.Parse("/planted"), 0)
        {
            Metadata = { new HttpMethodMetadata(["POST"]) },
        };
        Assert.Equal(["/planted"], Unguarded([(RouteEndpoint)open.Build()]));
    }

    [Theory]
    [InlineData("/account/again")]
    [InlineData("/account/leave")]
    [InlineData("/account/enter")]
    [InlineData("/account/link/AAAAAAAAAAAAAAAAAAAAAA")]
    [InlineData("/verify")]
    [InlineData("/people")]
    [InlineData("/revisions/019b0000-0000-7000-8000-000000000000/signed")]
    [InlineData("/revisions/019b0000-0000-7000-8000-000000000000/sign")]
    public async Task A_form_without_the_pages_token_is_refused(string path)
    {
        await using var site = new Site();
        var browser = await Browser.In(site, "designer");
        using var form = new MultipartFormDataContent { { new StringContent("Designer"), "field" }, { new StringContent("x"), "expected" }, { new StringContent("x"), "password" } };
        form.Add(new ByteArrayContent([1]), "sheet", "a.pdf");
        form.Add(new ByteArrayContent([1]), "key", "a.pfx");
        var answer = await browser.Client.PostAsync(path, form);
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
    }

    private sealed class SilentPage : ComponentBase;

    private sealed class PlantedRoute : IStartupFilter
    {
        public static RouteEndpoint Endpoint { get; } = (RouteEndpoint)new RouteEndpointBuilder(
            context => context.Response.WriteAsync("reached"), Microsoft.AspNetCore.Routing.Patterns.RoutePatternFactory.Parse("/planted"), 0).Build();

        public Action<IApplicationBuilder> Configure(Action<IApplicationBuilder> next) => app =>
        {
            app.Use(async (context, following) =>
            {
                if (context.Request.Path == "/planted") context.SetEndpoint(Endpoint);
                await following(context);
            });
            next(app);
        };
    }
}
