using System.Text.RegularExpressions;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.People;

/// <param name="Token">Made by <see cref="LinkToken.New"/> before the button is shown, so that a second press shows the same link though only its hash is kept.</param>
public sealed record AccountRequest(string Account, string Name, bool Administrator, string Token);

public sealed record AccountAnswer(Guid PersonId, DateTimeOffset LinkExpiresAt);

/// <summary>Accounts: made, switched off and on, and the links by which their passwords are set. Persons are never removed.</summary>
public sealed partial class AccountRegister(ActDesk desk)
{
    /// <summary>Adds a person, who gets in by the link.</summary>
    public Task<AccountAnswer> Add(ActCall call, AccountRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.ManageAccounts, $"account {request.Account}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ManageAccounts);
            return await Add(run, request, run.Person.Id, stop);
        }, cancel);

    /// <summary>The same at the console, where nobody is signed in: whoever reaches the database may make its administrator.</summary>
    public Task<AccountAnswer> AddAtConsole(AccountRequest request, CancellationToken cancel = default) =>
        desk.OnceAtConsole(Act.ManageAccounts, $"account {request.Account}", (run, stop) => Add(run, request, null, stop), cancel);

    /// <summary>A new link for a person who has lost the password or the first link; older ones end.</summary>
    public Task<AccountAnswer> MakeLink(ActCall call, Guid personId, string token, CancellationToken cancel = default) =>
        desk.Once(call, Act.ManageAccounts, $"password link for person {personId:D}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ManageAccounts);
            var person = await run.Archive.Users.FirstOrDefaultAsync(row => row.Id == personId, stop) ?? throw new NotFound("person");
            return await Link(run, person, token, run.Person.Id, stop);
        }, cancel);

    /// <summary>The same at the console, by the account's name.</summary>
    public Task<AccountAnswer> MakeLinkAtConsole(string account, string token, CancellationToken cancel = default) =>
        desk.OnceAtConsole(Act.ManageAccounts, $"password link for account {account}", async (run, stop) =>
        {
            var person = await Find(run, account, stop)
                ?? throw new ActRefused(RefusalReason.ValueOutOfRange, $"There is no account \"{account}\". Make it with `admin create`.");
            return await Link(run, person, token, null, stop);
        }, cancel);

    /// <summary>A link for oneself, to change the password.</summary>
    public Task<AccountAnswer> MakeOwnLink(ActCall call, string token, CancellationToken cancel = default) =>
        desk.Once(call, Act.ChangePassword, $"password link for person {call.PersonId:D}", async (run, stop) =>
            await Link(run, await run.Archive.Users.SingleAsync(row => row.Id == call.PersonId, stop), token, call.PersonId, stop), cancel);

    /// <summary>Switches an account off or on. One administrator always stays.</summary>
    public Task<RolesAnswer> SetActive(ActCall call, Guid personId, bool active, CancellationToken cancel = default) =>
        desk.Once(call, Act.ManageAccounts, $"person {personId:D} active {active}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ManageAccounts);
            var person = await run.Archive.Users.FirstOrDefaultAsync(row => row.Id == personId, stop) ?? throw new NotFound("person");
            if (!active && person.Administrator && !await run.Archive.Users.AnyAsync(row => row.Id != personId && row.Administrator && row.Active, stop))
                throw new ActRefused(RefusalReason.ValueOutOfRange, $"{person.Name} is the only administrator left. Add another administrator first, then switch this account off.");
            person.Active = active;

            // A new stamp ends the sessions that are open.
            person.SecurityStamp = Guid.NewGuid().ToString();
            if (!active) await CloseLinks(run, personId, stop);
            return new RolesAnswer(Guid.Empty, personId, []);
        }, cancel);

    private static async Task<AccountAnswer> Add(ActRun run, AccountRequest request, Guid? madeBy, CancellationToken cancel)
    {
        if (!AccountForm().IsMatch(request.Account))
            throw new ActRefused(RefusalReason.ValueOutOfRange, $"The account \"{request.Account}\" cannot be made: 2 to 50 of the signs a-z, 0-9, dot, hyphen and underscore are allowed, beginning with a letter.");
        var name = PlainText.Required("name", request.Name, PlainText.NameLimit);
        if (await Find(run, request.Account, cancel) is not null)
            throw new ActRefused(RefusalReason.AlreadyDone, $"There is an account \"{request.Account}\" already. Choose another, or make a new password link for that one.");
        var person = new Person
        {
            UserName = request.Account,
            NormalizedUserName = Normal(request.Account),
            Name = name,
            Administrator = request.Administrator,
            SecurityStamp = Guid.NewGuid().ToString(),
            LockoutEnabled = true,
        };
        run.Archive.Users.Add(person);
        if (request.Administrator) run.Detail = "administrator";
        return await Link(run, person, request.Token, madeBy, cancel);
    }

    private static async Task<AccountAnswer> Link(ActRun run, Person person, string token, Guid? madeBy, CancellationToken cancel)
    {
        if (!person.Active) throw new ActRefused(RefusalReason.ValueOutOfRange, $"The account of {person.Name} is switched off. Switch it on first.");
        await CloseLinks(run, person.Id, cancel);
        var link = new PasswordLink
        {
            PersonId = person.Id,
            TokenHash = LinkToken.HashOf(token) ?? throw new ActRefused(RefusalReason.ValueOutOfRange, "The link's token is not one of 128 random bits; load the page again."),
            MadeById = madeBy,
            MadeAt = run.Now,
            ExpiresAt = run.Now + PasswordLink.Holds,
        };
        run.Archive.PasswordLinks.Add(link);
        return new AccountAnswer(person.Id, link.ExpiresAt);
    }

    internal static async Task CloseLinks(ActRun run, Guid personId, CancellationToken cancel)
    {
        foreach (var link in await run.Archive.PasswordLinks.Where(row => row.PersonId == personId && row.ClosedAt == null).ToListAsync(cancel)) link.ClosedAt = run.Now;
    }

    private static Task<Person?> Find(ActRun run, string account, CancellationToken cancel)
    {
        var normal = Normal(account);
        return run.Archive.Users.FirstOrDefaultAsync(row => row.NormalizedUserName == normal, cancel);
    }

    // As Identity looks accounts up.
    private static string Normal(string account) => account.Normalize().ToUpperInvariant();

    [GeneratedRegex("^[a-z][a-z0-9._-]{1,49}$")]
    private static partial Regex AccountForm();
}
