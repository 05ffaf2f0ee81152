using System.Reflection;
using Xunit.Sdk;
using Xunit.v3;

namespace JointPlanner.Archive.Tests.Databases;

public enum Kind
{
    Sqlite,
    PostgreSql,
}

/// <summary>Runs a theory once on each kind of database.</summary>
[AttributeUsage(AttributeTargets.Method)]
public sealed class BothDatabasesAttribute : DataAttribute
{
    public override ValueTask<IReadOnlyCollection<ITheoryDataRow>> GetData(MethodInfo testMethod, DisposalTracker disposalTracker) =>
        ValueTask.FromResult<IReadOnlyCollection<ITheoryDataRow>>([.. Enum.GetValues<Kind>().Select(kind => new TheoryDataRow(kind))]);

    public override bool SupportsDiscoveryEnumeration() => true;
}
