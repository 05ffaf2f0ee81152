using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace JointPlanner.Archive.Sqlite;

/// <summary>For `dotnet ef`; the file is never opened by it.</summary>
internal sealed class DesignTime : IDesignTimeDbContextFactory<ArchiveContext>
{
    public ArchiveContext CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<ArchiveContext>();
        SqliteArchive.Configure(options, "design.db");
        return new ArchiveContext(options.Options);
    }
}
