using System.Globalization;
using System.Security.Claims;
using System.Security.Cryptography;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>
/// The mark that somebody has typed the password again: a claim in the sign-in cookie for plain requests, and a sealed text that the open page hands to its
/// own circuit, which cannot see the new cookie.
/// </summary>
public sealed class PasswordMark(IDataProtectionProvider protection)
{
    internal const string Claim = "password-again-at";

    private readonly IDataProtector seal = protection.CreateProtector("joint-planner.password-again");

    /// <summary>What the answer carries to the page.</summary>
    public string Seal(Guid person, DateTimeOffset at) => seal.Protect(FormattableString.Invariant($"{person:N} {at.ToUnixTimeMilliseconds()}"));

    /// <summary>The instant, where the text was sealed here for this person; else null.</summary>
    public DateTimeOffset? Open(string text, Guid person)
    {
        try
        {
            return seal.Unprotect(text).Split(' ') is [var whose, var at] && whose == person.ToString("N", CultureInfo.InvariantCulture) ? Instant(at) : null;
        }
        catch (CryptographicException)
        {
            return null;
        }
    }

    internal static Claim ClaimOf(DateTimeOffset at) => new(Claim, at.ToUnixTimeMilliseconds().ToString(CultureInfo.InvariantCulture));

    internal static DateTimeOffset? Of(ClaimsPrincipal user) => Instant(user.FindFirstValue(Claim));

    /// <summary>Every two minutes the cookie is made anew from the account; the mark belongs to this browser and is carried over.</summary>
    internal static Task Keep(SecurityStampRefreshingPrincipalContext refreshed)
    {
        if (refreshed is { CurrentPrincipal: { } before, NewPrincipal.Identity: ClaimsIdentity after } && before.FindFirst(Claim) is { } mark)
            after.AddClaim(mark.Clone());
        return Task.CompletedTask;
    }

    private static DateTimeOffset? Instant(string? text) =>
        long.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var at) ? DateTimeOffset.FromUnixTimeMilliseconds(at) : null;
}
