using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Values;

namespace JointPlanner.Archive.Tests.Databases;

/// <summary>
/// A small invented world in a database of its own: an owner with one structure, an engineers' office to which it is opened, a contractor, and strangers.
/// </summary>
public sealed class World : IAsyncDisposable
{
    public const string FirstPlan = """{"schema":"joint-plan/1","segments":[{"id":"s1","length":"40 m"},{"id":"s2","length":"35 m"}],"joints":[{"id":"j1","mark":"A"}]}""";

    private World(TestDatabase database, ArchiveDatabase archive)
    {
        Database = database;
        Archive = archive;
        Desk = new ActDesk(Archive, Clock);
        Audit = new AuditTrail(Archive, Clock);
        Links = new FieldLinks(Archive, Desk, Audit, Clock);
    }

    public TestDatabase Database { get; }
    public ArchiveDatabase Archive { get; }
    public SetClock Clock { get; } = new();
    public ActDesk Desk { get; }
    public AuditTrail Audit { get; }

    public BeginRevision Begin => new(Desk);
    public FreezeRevision Freeze => new(Desk);
    public ReturnRevision Return => new(Desk);
    public AcceptRevision Accept => new(Desk);
    public SignRevision Sign => new(Desk);
    public IssueRevision Issue => new(Desk);
    public WithdrawRevision Withdraw => new(Desk);
    public DraftShelf Drafts => new(Archive, Desk, Clock);
    public Confirmations Confirmations => new(Desk);
    public FieldLinks Links { get; }
    public SettingBook Setting => new(Desk, Links);
    public StructureRegister Structures => new(Desk);
    public OrganisationRegister Organisations => new(Desk);
    public AccountRegister Accounts => new(Desk);
    public PasswordLinks PasswordLinks => new(Archive, Desk, Clock);
    public CertificateRegister Certificates => new(Desk);

    public Organisation Owner { get; } = new() { Name = "Roads Board of Northmark" };
    public Organisation Office { get; } = new() { Name = "Alder and Quist, engineers" };
    public Organisation Builder { get; } = new() { Name = "Deck and Pier Contractors" };
    public Organisation Elsewhere { get; } = new() { Name = "Canal Board of Südwerth" };

    public Person Mara { get; } = Named("Mara Ekholm");
    public Person Ines { get; } = Named("Ines Brandt");
    public Person Jon { get; } = Named("Jon Alder");
    public Person Otto { get; } = Named("Otto Quist");
    public Person Kim { get; } = Named("Kim Sand");
    public Person Stranger { get; } = Named("Vera Stranger");
    public Person Ada { get; } = Named("Ada Admin", administrator: true);

    public Guid StructureId { get; private set; }

    /// <summary>The first revision, a draft.</summary>
    public Guid RevisionId { get; private set; }

    public static async Task<World> Make(Kind kind)
    {
        var database = await TestDatabase.Migrated(kind);
        return await On(database, database.Archive);
    }

    /// <summary>The same on a database as the caller opened it.</summary>
    public static async Task<World> On(TestDatabase database, ArchiveDatabase archive)
    {
        var world = new World(database, archive);
        await world.Populate();
        return world;
    }

    public string From { get; init; } = "test";

    public ActCall By(Person person) => new(Guid.CreateVersion7(), person.Id, From) { PasswordAt = Clock.Now };

    public Task<ArchiveScope> As(Person person) => ArchiveScope.Enter(Archive, person.Id);

    public static string PlanHash(string plan) => Fingerprint.Of(plan);

    public ValueTask DisposeAsync() => Database.DisposeAsync();

    private static Person Named(string name, bool administrator = false)
    {
        var account = name.Split(' ')[0].ToLowerInvariant();
        return new Person { Name = name, UserName = account, NormalizedUserName = account.ToUpperInvariant(), Administrator = administrator };
    }

    private async Task Populate()
    {
        await using (var context = Archive.CreateDbContext())
        {
            context.Organisations.AddRange(Owner, Office, Builder, Elsewhere);
            context.Users.AddRange(Mara, Ines, Jon, Otto, Kim, Stranger, Ada);
            await context.SaveChangesAsync();
            Member(Mara, Owner, Role.Owner);
            Member(Ines, Office, Role.Designer);
            Member(Jon, Office, Role.Designer);
            Member(Otto, Office, Role.Checker);
            Member(Otto, Office, Role.Designer);
            Member(Kim, Builder, Role.Contractor);
            Member(Stranger, Elsewhere, Role.Owner);
            Member(Stranger, Elsewhere, Role.Designer);
            await context.SaveChangesAsync();

            void Member(Person person, Organisation organisation, Role role) =>
                context.Memberships.Add(new Membership { PersonId = person.Id, OrganisationId = organisation.Id, Role = role });
        }

        var created = await Structures.Create(By(Mara), new CreateRequest(Owner.Id, "Tarn Street overbridge", "Europe/Oslo", FirstPlan));
        StructureId = created.StructureId;
        RevisionId = created.RevisionId;
        await Structures.GiveAccess(By(Mara), StructureId, Office.Id, [Role.Designer, Role.Checker]);
        await Structures.GiveAccess(By(Mara), StructureId, Builder.Id, [Role.Contractor]);
    }
}

/// <summary>A clock that stands until it is set.</summary>
public sealed class SetClock : TimeProvider
{
    public DateTimeOffset Now { get; set; } = new(2031, 5, 4, 9, 30, 0, TimeSpan.FromHours(2));

    public override DateTimeOffset GetUtcNow() => Now.ToUniversalTime();
}
