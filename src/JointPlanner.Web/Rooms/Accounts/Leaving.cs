using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Mvc;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>Signing out.</summary>
internal static class Leaving
{
    internal static void MapLeaving(this WebApplication app) =>
        app.MapPost("/account/leave", async ([FromForm] string? back, SignInManager<Person> signIns) =>
        {
            await signIns.SignOutAsync();
            return Results.LocalRedirect("/");
        }).ExcludeFromDescription();
}
