using System.Security.Claims;
using JointPlanner.Archive.People;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>Signing out, and the password once more. Plain requests, never through a circuit: only their answers can set the cookie.</summary>
internal static class AccountRoutes
{
    internal static void MapAccounts(this WebApplication app)
    {
        var account = app.MapGroup("/account").RequireAuthorization().ExcludeFromDescription();
        account.MapPost("/leave", Leave).AllowAnonymous();
        account.MapPost("/again", Again).RequireRateLimiting(RateLimits.Entering);
    }

    // The field keeps the antiforgery check on.
    private static async Task<IResult> Leave([FromForm] string? back, ClaimsPrincipal user, HttpContext context, Door door, UserManager<Person> people)
    {
        await door.Leave(await people.GetUserAsync(user), From(context));
        return Results.LocalRedirect("/");
    }

    private static async Task<IResult> Again([FromForm] string? password, ClaimsPrincipal user, HttpContext context, Door door, UserManager<Person> people, PasswordMark mark)
    {
        context.Response.Headers.CacheControl = "no-store";
        if (await people.GetUserAsync(user) is not { Active: true } person)
            return Results.Text("You are signed out. Sign in in another tab, then type the password here again.", statusCode: StatusCodes.Status401Unauthorized);
        var (at, answer) = await door.Again(person, password ?? "", From(context));
        if (at is { } given) return Results.Text(mark.Seal(person.Id, given));
        return Results.Text(
            answer.IsLockedOut ? "Too many wrong tries: this account is closed for ten minutes. What you entered on this page stays." : "This is not your password. Type it again; after five wrong tries the account is closed for ten minutes.",
            statusCode: StatusCodes.Status403Forbidden);
    }

    internal static string From(HttpContext context) => context.Connection.RemoteIpAddress?.ToString() ?? "unknown";
}
