using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Tests.Databases;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Archive.Tests;

public class ArchiveRoomsTests
{
    [Theory, BothDatabases]
    public async Task A_host_gets_every_act_and_an_identity_store_on_the_same_tables(Kind kind)
    {
        await using var database = await TestDatabase.Migrated(kind);
        var services = new ServiceCollection();
        services.AddLogging();
        services.AddArchive(database.Archive);
        services.AddIdentityCore<Person>().AddEntityFrameworkStores<ArchiveContext>();
        await using var provider = services.BuildServiceProvider(new ServiceProviderOptions { ValidateOnBuild = true, ValidateScopes = true });
        await using var scope = provider.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<UserManager<Person>>();
        var person = new Person { UserName = "ada", Name = "Ada Admin", Administrator = true };
        var made = await people.CreateAsync(person, "A long pass phrase, 1 of them");
        Assert.True(made.Succeeded, string.Join(" ", made.Errors.Select(error => error.Description)));

        var organisations = scope.ServiceProvider.GetRequiredService<OrganisationRegister>();
        await organisations.Create(ActCall.AtConsole(person.Id, TimeProvider.System.GetUtcNow()), "Roads Board of Northmark");
        foreach (var act in (Type[])
                 [
                     typeof(BeginRevision), typeof(FreezeRevision), typeof(ReturnRevision), typeof(AcceptRevision), typeof(SignRevision), typeof(IssueRevision),
                     typeof(WithdrawRevision), typeof(DraftShelf), typeof(SettingBook), typeof(FieldLinks), typeof(StructureRegister), typeof(CertificateRegister),
                 ])
            Assert.NotNull(provider.GetRequiredService(act));

        // The host's options must not change the tables.
        await using var context = await provider.GetRequiredService<IDbContextFactory<ArchiveContext>>().CreateDbContextAsync();
        Assert.False(context.Database.HasPendingModelChanges());
    }
}
