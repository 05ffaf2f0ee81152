using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace JointPlanner.Archive.PostgreSql;

/// <summary>For `dotnet ef`; the server is never asked by it.</summary>
internal sealed class DesignTime : IDesignTimeDbContextFactory<ArchiveContext>
{
    public ArchiveContext CreateDbContext(string[] args)
    {
        var options = new DbContextOptionsBuilder<ArchiveContext>();
        PostgreSqlArchive.Configure(options, "Host=localhost;Database=design");
        return new ArchiveContext(options.Options);
    }
}
