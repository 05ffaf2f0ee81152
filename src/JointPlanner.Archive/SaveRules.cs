using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.ChangeTracking;

namespace JointPlanner.Archive;

/// <summary>What holds at every save, whoever saves.</summary>
internal static class SaveRules
{
    public static void Apply(ChangeTracker tracker)
    {
        foreach (var entry in tracker.Entries())
        {
            if (entry.State is not (EntityState.Added or EntityState.Modified)) continue;
            RefuseWhatIsNoNumber(entry);
            RefuseUnchained(entry);
            RaiseVersion(entry);
        }
    }

    // PostgreSQL would keep them, SQLite would throw: neither belongs in an archive.
    private static void RefuseWhatIsNoNumber(EntityEntry entry)
    {
        foreach (var property in entry.Properties)
        {
            if (property.CurrentValue is double value && !double.IsFinite(value))
                throw new ArgumentOutOfRangeException(
                    property.Metadata.Name,
                    $"{entry.Metadata.ClrType.Name}.{property.Metadata.Name} is {value}; only finite numbers are kept. Correct the value before saving.");
        }
    }

    private static void RefuseUnchained(EntityEntry entry)
    {
        if (entry is { State: EntityState.Added, Entity: ChainedRow { Position: 0 } })
            throw new InvalidOperationException($"{entry.Metadata.ClrType.Name} was added without being joined to its chain.");
    }

    private static void RaiseVersion(EntityEntry entry)
    {
        if (entry.Entity is not IVersioned) return;
        var version = entry.Property(nameof(IVersioned.Version));
        version.CurrentValue = entry.State == EntityState.Added ? 1L : (long)version.OriginalValue! + 1;
    }
}
