using System.Security.Claims;
using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;

namespace JointPlanner.Web.Start;

/// <summary>
/// What the sign-in cookie says of a person: id and printed name. What a person may do is never in it: roles are read from the archive at each act.
/// </summary>
internal sealed class PersonClaims(UserManager<Person> people, IOptions<IdentityOptions> options) : UserClaimsPrincipalFactory<Person>(people, options)
{
    internal const string PrintedName = "printed-name";

    protected override async Task<ClaimsIdentity> GenerateClaimsAsync(Person user)
    {
        var identity = await base.GenerateClaimsAsync(user);
        identity.AddClaim(new Claim(PrintedName, user.Name.Length > 0 ? user.Name : user.UserName ?? ""));
        return identity;
    }

    /// <summary>Id of the signed-in person.</summary>
    internal static Guid? IdOf(ClaimsPrincipal? user) =>
        Guid.TryParse(user?.FindFirstValue(ClaimTypes.NameIdentifier), out var id) ? id : null;
}
