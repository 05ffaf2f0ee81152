using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.People;

/// <summary>Whose password a link sets.</summary>
public sealed record PasswordLinkView(Guid PersonId, string Account, string Name, DateTimeOffset ExpiresAt);

public sealed record PasswordAnswer(Guid PersonId);

/// <summary>Opens the links by which passwords are set. Unknown, used and expired ones are all "not found".</summary>
public sealed class PasswordLinks(IDbContextFactory<ArchiveContext> archive, ActDesk desk, TimeProvider clock)
{
    /// <summary>Whom the link is for; looking does not use it up.</summary>
    public async Task<PasswordLinkView> Look(string token, CancellationToken cancel = default)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var (link, person) = await Find(context, token, clock.GetUtcNow(), cancel);
        return new PasswordLinkView(person.Id, person.UserName ?? "", person.Name, link.ExpiresAt);
    }

    /// <summary>Sets the password once: the link is used up, sessions that are open end, a closed account opens.</summary>
    /// <param name="passwordHash">Hash as the accounts keep it; the password itself never comes here.</param>
    public async Task<PasswordAnswer> Use(Guid requestId, string token, string passwordHash, string from, CancellationToken cancel = default)
    {
        var whose = await Look(token, cancel);
        return await desk.Once(new ActCall(requestId, whose.PersonId, from), Act.SetPassword, $"person {whose.PersonId:D}", async (run, stop) =>
        {
            var (link, person) = await Find(run.Archive, token, run.Now, stop);
            await AccountRegister.CloseLinks(run, person.Id, stop);
            person.PasswordHash = passwordHash;
            person.SecurityStamp = Guid.NewGuid().ToString();
            person.AccessFailedCount = 0;
            person.LockoutEnd = null;
            run.Detail = $"by link {link.Id:D}";
            return new PasswordAnswer(person.Id);
        }, cancel);
    }

    private static async Task<(PasswordLink, Person)> Find(ArchiveContext context, string token, DateTimeOffset now, CancellationToken cancel)
    {
        var hash = LinkToken.HashOf(token) ?? throw new NotFound("link");
        var link = await context.PasswordLinks.FirstOrDefaultAsync(row => row.TokenHash == hash, cancel);
        if (link is null || !link.IsOpen(now)) throw new NotFound("link");
        var person = await context.Users.SingleAsync(row => row.Id == link.PersonId, cancel);
        return person.Active ? (link, person) : throw new NotFound("link");
    }
}
