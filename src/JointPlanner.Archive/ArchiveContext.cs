using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Drafts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;
using JointPlanner.Archive.Structures;
using JointPlanner.Archive.Values;
using Microsoft.AspNetCore.DataProtection.EntityFrameworkCore;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive;

/// <summary>
/// The one database context, on SQLite and PostgreSQL alike. Its own sets are internal: other rooms read through
/// <see cref="Rights.ArchiveScope"/> and write through the acts.
/// </summary>
public sealed class ArchiveContext(DbContextOptions<ArchiveContext> options)
    : IdentityDbContext<Person, IdentityRole<Guid>, Guid>(options), IDataProtectionKeyContext
{
    public DbSet<DataProtectionKey> DataProtectionKeys => Set<DataProtectionKey>();

    internal DbSet<Organisation> Organisations => Set<Organisation>();
    internal DbSet<Membership> Memberships => Set<Membership>();
    internal DbSet<PasswordLink> PasswordLinks => Set<PasswordLink>();
    internal DbSet<Certificate> Certificates => Set<Certificate>();
    internal DbSet<Structure> Structures => Set<Structure>();
    internal DbSet<StructureAccess> StructureAccess => Set<StructureAccess>();
    internal DbSet<Revision> Revisions => Set<Revision>();
    internal DbSet<StateEntry> StateEntries => Set<StateEntry>();
    internal DbSet<RevisionEdit> RevisionEdits => Set<RevisionEdit>();
    internal DbSet<Remark> Remarks => Set<Remark>();
    internal DbSet<FrozenPackage> FrozenPackages => Set<FrozenPackage>();
    internal DbSet<PdfSegment> PdfSegments => Set<PdfSegment>();
    internal DbSet<Blob> Blobs => Set<Blob>();
    internal DbSet<Draft> Drafts => Set<Draft>();
    internal DbSet<Confirmation> Confirmations => Set<Confirmation>();
    internal DbSet<ConfirmationRevocation> ConfirmationRevocations => Set<ConfirmationRevocation>();
    internal DbSet<SettingRecord> SettingRecords => Set<SettingRecord>();
    internal DbSet<SettingAcceptance> SettingAcceptances => Set<SettingAcceptance>();
    internal DbSet<Reading> Readings => Set<Reading>();
    internal DbSet<FieldLink> FieldLinks => Set<FieldLink>();
    internal DbSet<ActReceipt> ActReceipts => Set<ActReceipt>();
    internal DbSet<AuditEntry> AuditEntries => Set<AuditEntry>();
    internal DbSet<ChainTip> ChainTips => Set<ChainTip>();

    public bool IsSqlite => Database.ProviderName == "Microsoft.EntityFrameworkCore.Sqlite";

    /// <summary>Fixed here, so that the tables do not depend on how the host set Identity up.</summary>
    protected override Version SchemaVersion => IdentitySchemaVersions.Version2;

    public override int SaveChanges(bool acceptAllChangesOnSuccess)
    {
        SaveRules.Apply(ChangeTracker);
        return base.SaveChanges(acceptAllChangesOnSuccess);
    }

    public override Task<int> SaveChangesAsync(bool acceptAllChangesOnSuccess, CancellationToken cancellationToken = default)
    {
        SaveRules.Apply(ChangeTracker);
        return base.SaveChangesAsync(acceptAllChangesOnSuccess, cancellationToken);
    }

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder)
    {
        base.ConfigureConventions(configurationBuilder);
        if (IsSqlite) configurationBuilder.Properties<DateTimeOffset>().HaveConversion<UtcMoments.AsTicks>();
        else configurationBuilder.Properties<DateTimeOffset>().HaveConversion<UtcMoments.AsUniversal>();

        // Words, not numbers: guards and people who read the tables need no key to them.
        configurationBuilder.Properties<Role>().HaveConversion<string>();
        configurationBuilder.Properties<IssuedBy>().HaveConversion<string>();
        configurationBuilder.Properties<RevisionState>().HaveConversion<string>();
        configurationBuilder.Properties<SignatureField>().HaveConversion<string>();
        configurationBuilder.Properties<Act>().HaveConversion<string>();
    }

    protected override void OnModelCreating(ModelBuilder builder)
    {
        base.OnModelCreating(builder);
        ArchiveModel.Describe(builder);
    }
}
