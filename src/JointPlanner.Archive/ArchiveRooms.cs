using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;

namespace JointPlanner.Archive;

public static class ArchiveRooms
{
    /// <summary>Makes the archive, its acts and (for Identity) a scoped context known to the program.</summary>
    public static IServiceCollection AddArchive(this IServiceCollection services, ArchiveDatabase database)
    {
        services.TryAddSingleton(TimeProvider.System);
        services.AddSingleton(database);
        services.AddDbContextFactory<ArchiveContext>(database.Configure);
        return services
            .AddSingleton<ActDesk>().AddSingleton<AuditTrail>()
            .AddSingleton<BeginRevision>().AddSingleton<FreezeRevision>().AddSingleton<ReturnRevision>().AddSingleton<AcceptRevision>()
            .AddSingleton<SignRevision>().AddSingleton<IssueRevision>().AddSingleton<WithdrawRevision>()
            .AddSingleton<DraftShelf>().AddSingleton<Confirmations>().AddSingleton<SettingBook>().AddSingleton<FieldLinks>()
            .AddSingleton<OrganisationRegister>().AddSingleton<AccountRegister>().AddSingleton<PasswordLinks>().AddSingleton<CertificateRegister>().AddSingleton<StructureRegister>()
            .AddSingleton<SheetLookup>();
    }
}
