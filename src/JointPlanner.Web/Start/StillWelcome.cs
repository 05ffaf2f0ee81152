using JointPlanner.Archive.People;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Components.Server;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace JointPlanner.Web.Start;

/// <summary>Looks every two minutes whether the person of an open page may still be here: deactivated or with a changed password, they are signed out.</summary>
internal sealed class StillWelcome(ILoggerFactory logs, IServiceScopeFactory scopes, IOptions<IdentityOptions> options) : RevalidatingServerAuthenticationStateProvider(logs)
{
    protected override TimeSpan RevalidationInterval => TimeSpan.FromMinutes(2);

    protected override async Task<bool> ValidateAuthenticationStateAsync(AuthenticationState authenticationState, CancellationToken cancellationToken)
    {
        try
        {
            return await IsWelcome(authenticationState);
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            // Nobody is put out with work in their hands because the archive is down: nothing can be done or read without it, and the next look asks again.
            return true;
        }
    }

    private async Task<bool> IsWelcome(AuthenticationState authenticationState)
    {
        await using var scope = scopes.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<UserManager<Person>>();
        var person = await people.GetUserAsync(authenticationState.User);
        if (person is not { Active: true }) return false;
        var stamp = authenticationState.User.FindFirst(options.Value.ClaimsIdentity.SecurityStampClaimType)?.Value;
        return stamp == await people.GetSecurityStampAsync(person);
    }
}
