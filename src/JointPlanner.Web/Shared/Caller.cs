using JointPlanner.Archive.Acts;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components.Authorization;

namespace JointPlanner.Web.Shared;

/// <summary>Who does an act from this page, and from where.</summary>
public sealed class Caller(AuthenticationStateProvider signedIn, IHttpContextAccessor request)
{
    // A circuit keeps the address of the request that opened it.
    private readonly string from = request.HttpContext?.Connection.RemoteIpAddress?.ToString() ?? "browser";

    /// <summary>Id of the signed-in person; null where nobody is.</summary>
    public async Task<Guid?> Person() => PersonClaims.IdOf((await signedIn.GetAuthenticationStateAsync()).User);

    /// <summary>A call with a request id of its own; take it when the button is shown where a second press must give the first answer.</summary>
    /// <exception cref="ActRefused">Nobody is signed in.</exception>
    public async Task<ActCall> Now(Guid? requestId = null) =>
        new(requestId ?? Guid.CreateVersion7(), await Person() ?? throw new ActRefused(RefusalReason.NotYourAct, "Sign in first."), from);
}
