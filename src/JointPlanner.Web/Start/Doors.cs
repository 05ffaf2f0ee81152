using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components.Endpoints;

namespace JointPlanner.Web.Start;

/// <summary>Nothing is open that does not say so: a route without a word on who may use it is for people who are signed in.</summary>
internal static class Doors
{
    internal static void AddDoors(this IServiceCollection services) => services.AddAuthorizationBuilder().SetFallbackPolicy(new AuthorizationPolicyBuilder()
        // Where there is no route at all, "nothing here" is the answer for everybody.
        .RequireAssertion(asked => asked.User.Identity is { IsAuthenticated: true } || asked.Resource is HttpContext request && request.GetEndpoint() is null)
        .Build());

    /// <summary>The page's own machinery (its script, its connection) is open; the pages themselves say for each who may see them.</summary>
    internal static void OpenMachinery(this RazorComponentsEndpointConventionBuilder pages) => pages.Add(endpoint =>
    {
        if (!endpoint.Metadata.OfType<ComponentTypeMetadata>().Any()) endpoint.Metadata.Add(new AllowAnonymousAttribute());
    });

    /// <summary>Whether a page says who may see it.</summary>
    internal static bool Says(Type page) => page.GetCustomAttributes(inherit: true).Any(a => a is IAuthorizeData or IAllowAnonymous);
}
