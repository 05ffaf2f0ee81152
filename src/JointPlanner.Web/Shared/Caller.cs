using JointPlanner.Archive.Acts;
using JointPlanner.Web.Rooms.Accounts;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components.Authorization;

namespace JointPlanner.Web.Shared;

/// <summary>Who does an act from this page, and from where.</summary>
public sealed class Caller(AuthenticationStateProvider signedIn, IHttpContextAccessor request, PasswordMark mark, TimeProvider clock)
{
    // A circuit keeps the address of the request that opened it.
    private readonly string from = request.HttpContext?.Connection.RemoteIpAddress?.ToString() ?? "browser";
    private DateTimeOffset? typedHere;

    /// <summary>Id of the signed-in person; null where nobody is.</summary>
    public async Task<Guid?> Person() => PersonClaims.IdOf((await signedIn.GetAuthenticationStateAsync()).User);

    /// <summary>A call with a request id of its own; take it when the button is shown where a second press must give the first answer.</summary>
    /// <exception cref="ActRefused">Nobody is signed in.</exception>
    public async Task<ActCall> Now(Guid? requestId = null) =>
        new(requestId ?? Guid.CreateVersion7(), await Person() ?? throw new ActRefused(RefusalReason.NotYourAct, "Sign in first."), from) { PasswordAt = await PasswordAt() };

    /// <summary>Whether a grave act would go through now without the password.</summary>
    public async Task<bool> HasJustTyped() => PasswordAgain.Counts(await PasswordAt(), clock.GetUtcNow());

    /// <summary>Takes the mark that the plain request of this page brought back.</summary>
    public async Task<bool> Take(string sealedMark)
    {
        if (await Person() is not { } person || mark.Open(sealedMark, person) is not { } at) return false;
        typedHere = at;
        return true;
    }

    private async Task<DateTimeOffset?> PasswordAt() => typedHere ?? PasswordMark.Of((await signedIn.GetAuthenticationStateAsync()).User);
}
