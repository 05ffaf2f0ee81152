using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>The one place where passwords are tried. Each try is written to the audit; what was typed never is, for it may be a password in the wrong field.</summary>
public sealed class Door(SignInManager<Person> signIns, UserManager<Person> people, IPasswordHasher<Person> hasher, AuditTrail audit, TimeProvider clock)
{
    // Trying a password against nobody's takes as long as against somebody's.
    private static string? nobodys;

    /// <summary>Signs in.</summary>
    public async Task<SignInResult> Enter(string account, string password, string from)
    {
        var person = await people.FindByNameAsync(account.Trim());
        if (person is not { Active: true })
        {
            hasher.VerifyHashedPassword(new Person(), nobodys ??= hasher.HashPassword(new Person(), Guid.NewGuid().ToString()), password);
            await Write("SignInFailed", person, from, person is null ? "unknown account" : "deactivated account");
            return SignInResult.Failed;
        }

        var wasClosed = await people.IsLockedOutAsync(person);
        var answer = await signIns.PasswordSignInAsync(person, password, isPersistent: false, lockoutOnFailure: true);
        await Write(answer, "SignedIn", "SignInFailed", person, from, wasClosed);
        return answer;
    }

    /// <summary>Tries the password of somebody who is signed in; when it fits, the cookie carries the mark from now on.</summary>
    /// <returns>The instant of the mark; null with the answer where it did not fit.</returns>
    public async Task<(DateTimeOffset? At, SignInResult Answer)> Again(Person person, string password, string from)
    {
        var wasClosed = await people.IsLockedOutAsync(person);
        var answer = await signIns.CheckPasswordSignInAsync(person, password, lockoutOnFailure: true);
        await Write(answer, "PasswordAgain", "PasswordAgainFailed", person, from, wasClosed);
        if (!answer.Succeeded) return (null, answer);
        var at = clock.GetUtcNow();
        await signIns.SignInWithClaimsAsync(person, isPersistent: false, [PasswordMark.ClaimOf(at)]);
        return (at, answer);
    }

    /// <summary>Signs out.</summary>
    public async Task Leave(Person? person, string from)
    {
        await signIns.SignOutAsync();
        if (person is not null) await Write("SignedOut", person, from, null);
    }

    private async Task Write(SignInResult answer, string fits, string fails, Person person, string from, bool wasClosed)
    {
        await Write(answer.Succeeded ? fits : fails, person, from, wasClosed ? "the account was closed" : null);
        if (answer.IsLockedOut && !wasClosed)
            await Write("LockedOut", person, from, FormattableString.Invariant($"until {person.LockoutEnd:yyyy-MM-dd HH:mm:ss} UTC"));
    }

    private Task Write(string what, Person? person, string from, string? detail) =>
        audit.Write(new AuditNote(what, from, person is null ? "account" : $"person {person.Id:D}") { PersonId = person?.Id, PersonName = person?.Name, Detail = detail });
}
