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
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;

namespace JointPlanner.Archive;

/// <summary>Tables, keys and what may stand only once.</summary>
internal static class ArchiveModel
{
    // Nothing goes by cascade: what must not vanish has no road by which it could.
    private const DeleteBehavior Stay = DeleteBehavior.Restrict;

    public static void Describe(ModelBuilder model)
    {
        Accounts(model);
        Structures(model);
        Revisions(model);
        Setting(model);
        Records(model);
        foreach (var type in model.Model.GetEntityTypes()) EveryTable(type);
    }

    private static void Accounts(ModelBuilder model)
    {
        model.Entity<Person>().ToTable("People");
        model.Entity<IdentityRole<Guid>>().ToTable("AccountRoles");
        model.Entity<IdentityUserRole<Guid>>().ToTable("PersonRoles");
        model.Entity<IdentityUserClaim<Guid>>().ToTable("PersonClaims");
        model.Entity<IdentityUserLogin<Guid>>().ToTable("PersonLogins");
        model.Entity<IdentityUserToken<Guid>>().ToTable("PersonTokens");
        model.Entity<IdentityRoleClaim<Guid>>().ToTable("AccountRoleClaims");

        model.Entity<Organisation>().ToTable("Organisations").HasIndex(row => row.Name).IsUnique();
        model.Entity<Membership>(table =>
        {
            table.ToTable("Memberships").HasKey(row => new { row.PersonId, row.OrganisationId, row.Role });
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
            table.HasOne<Organisation>().WithMany(row => row.Memberships).HasForeignKey(row => row.OrganisationId).OnDelete(Stay);
        });
        model.Entity<PasswordLink>(table =>
        {
            table.ToTable("PasswordLinks").HasIndex(row => row.TokenHash).IsUnique();
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.MadeById).OnDelete(Stay);
        });
        model.Entity<Certificate>(table =>
        {
            table.ToTable("Certificates").HasIndex(row => row.Fingerprint).IsUnique();
            table.HasIndex(row => row.PublicKeyHash);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
    }

    private static void Structures(ModelBuilder model)
    {
        model.Entity<Structure>(table =>
        {
            table.ToTable("Structures");
            table.HasOne<Organisation>().WithMany().HasForeignKey(row => row.OrganisationId).OnDelete(Stay);
        });
        model.Entity<StructureAccess>(table =>
        {
            table.ToTable("StructureAccess").HasKey(row => new { row.StructureId, row.OrganisationId, row.Role });
            table.HasOne<Structure>().WithMany(row => row.Access).HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.HasOne<Organisation>().WithMany().HasForeignKey(row => row.OrganisationId).OnDelete(Stay);
        });
        model.Entity<Draft>(table =>
        {
            table.ToTable("Drafts").HasIndex(row => new { row.StructureId, row.PersonId }).IsUnique().HasFilter("\"BinnedAt\" IS NULL");
            table.HasOne<Structure>().WithMany().HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
            table.HasOne<Revision>().WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
        });
    }

    private static void Revisions(ModelBuilder model)
    {
        model.Entity<Revision>(table =>
        {
            table.ToTable("Revisions").HasIndex(row => new { row.StructureId, row.Number }).IsUnique();
            table.HasOne(row => row.Structure).WithMany(row => row.Revisions).HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.Ignore(row => row.State);
        });
        model.Entity<StateEntry>(table =>
        {
            table.ToTable("StateEntries").HasIndex(row => new { row.RevisionId, row.Ordinal }).IsUnique();
            table.HasOne(row => row.Revision).WithMany(row => row.States).HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<RevisionEdit>(table =>
        {
            table.ToTable("RevisionEdits");
            table.HasOne(row => row.Revision).WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<Remark>(table =>
        {
            table.ToTable("Remarks");
            table.HasOne(row => row.Revision).WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<FrozenPackage>(table =>
        {
            table.ToTable("FrozenPackages").HasIndex(row => row.RevisionId).IsUnique();
            table.HasIndex(row => row.PackageHash);
            table.HasOne(row => row.Revision).WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.DesignerId).OnDelete(Stay);
        });
        model.Entity<PdfSegment>(table =>
        {
            table.ToTable("PdfSegments").HasIndex(row => new { row.RevisionId, row.Ordinal }).IsUnique();
            table.HasIndex(row => new { row.RevisionId, row.Field }).IsUnique();
            table.HasIndex(row => row.PrefixHash);
            table.HasOne(row => row.Revision).WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne(row => row.Blob).WithMany().HasForeignKey(row => row.BlobId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.SignerId).OnDelete(Stay);
        });
        model.Entity<Blob>().ToTable("Blobs");
    }

    private static void Setting(ModelBuilder model)
    {
        model.Entity<SettingRecord>(table =>
        {
            table.ToTable("SettingRecords").HasIndex(row => new { row.StructureId, row.Joint });
            table.HasOne<Structure>().WithMany().HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.HasOne<Revision>().WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<FieldLink>().WithMany().HasForeignKey(row => row.FieldLinkId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);

            // The points are part of the record's hash: it is never read without them.
            table.HasMany(row => row.Points).WithOne().HasForeignKey(row => row.SettingRecordId).OnDelete(Stay);
            table.Navigation(row => row.Points).AutoInclude();
        });
        model.Entity<SettingPoint>().ToTable("SettingPoints").HasKey(row => new { row.SettingRecordId, row.Ordinal });
        model.Entity<SettingAcceptance>(table =>
        {
            table.ToTable("SettingAcceptances").HasIndex(row => row.SettingRecordId).IsUnique();
            table.HasOne(row => row.Record).WithMany().HasForeignKey(row => row.SettingRecordId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<Reading>(table =>
        {
            table.ToTable("Readings").HasIndex(row => new { row.StructureId, row.Joint, row.Date });
            table.HasOne<Structure>().WithMany().HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<FieldLink>(table =>
        {
            table.ToTable("FieldLinks").HasIndex(row => row.TokenHash).IsUnique();
            table.HasOne<Structure>().WithMany().HasForeignKey(row => row.StructureId).OnDelete(Stay);
            table.HasOne<Revision>().WithMany().HasForeignKey(row => row.RevisionId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.MadeById).OnDelete(Stay);
        });
    }

    private static void Records(ModelBuilder model)
    {
        model.Entity<Confirmation>(table =>
        {
            table.ToTable("Confirmations").HasIndex(row => new { row.OrganisationId, row.ValueId });
            table.HasOne<Organisation>().WithMany().HasForeignKey(row => row.OrganisationId).OnDelete(Stay);
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
            table.HasOne(row => row.Revocation).WithOne().HasForeignKey<ConfirmationRevocation>(row => row.ConfirmationId).OnDelete(Stay);
        });
        model.Entity<ConfirmationRevocation>(table =>
        {
            table.ToTable("ConfirmationRevocations");
            table.HasOne<Person>().WithMany().HasForeignKey(row => row.PersonId).OnDelete(Stay);
        });
        model.Entity<ActReceipt>().ToTable("ActReceipts").HasKey(row => row.RequestId);
        model.Entity<AuditEntry>(table =>
        {
            table.ToTable("AuditEntries");
            table.HasIndex(row => row.StructureId);
        });
        model.Entity<ChainTip>(table =>
        {
            table.ToTable("ChainTips").HasKey(row => row.Chain);
            table.Property(row => row.Position).IsConcurrencyToken();
        });
    }

    private static void EveryTable(IMutableEntityType type)
    {
        // Ids are made by the program (UUIDv7), so that a row knows its id, and its hash, before it is saved.
        if (type.FindPrimaryKey() is { Properties: [{ Name: "Id" or "RequestId" } key] } && key.ClrType == typeof(Guid))
            key.ValueGenerated = ValueGenerated.Never;
        if (typeof(IVersioned).IsAssignableFrom(type.ClrType)) type.FindProperty(nameof(IVersioned.Version))!.IsConcurrencyToken = true;
        if (typeof(ChainedRow).IsAssignableFrom(type.ClrType))
        {
            type.AddIndex([type.FindProperty(nameof(ChainedRow.Chain))!, type.FindProperty(nameof(ChainedRow.Position))!]).IsUnique = true;
        }
    }
}
