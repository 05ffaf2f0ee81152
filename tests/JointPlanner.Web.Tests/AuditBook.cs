using JointPlanner.Archive;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests;

/// <summary>The installation's audit, as its administrator reads it.</summary>
public static class AuditBook
{
    public static async Task<IReadOnlyList<AuditEntry>> Entries(Site site)
    {
        await using var scope = await ArchiveScope.Enter(site.Services.GetRequiredService<IDbContextFactory<ArchiveContext>>(), await IdOf(site, "administrator"));
        return await scope.Audit().OrderBy(entry => entry.Position).ToListAsync();
    }

    public static async Task<Guid> IdOf(Site site, string account)
    {
        await using var services = site.Services.CreateAsyncScope();
        return (await services.ServiceProvider.GetRequiredService<UserManager<Person>>().FindByNameAsync(account))!.Id;
    }
}
