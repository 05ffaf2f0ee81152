using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Setting;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;

namespace JointPlanner.Archive.Guarding;

/// <summary>Which tables the database itself keeps from being changed.</summary>
public static class GuardedTables
{
    /// <summary>Rows are added and never changed or removed.</summary>
    public static readonly IReadOnlyList<Type> InsertOnly =
    [
        typeof(StateEntry), typeof(RevisionEdit), typeof(Remark), typeof(FrozenPackage), typeof(PdfSegment), typeof(Blob),
        typeof(SettingRecord), typeof(SettingPoint), typeof(SettingAcceptance), typeof(Reading),
        typeof(Confirmation), typeof(ConfirmationRevocation), typeof(ActReceipt), typeof(AuditEntry),
    ];

    /// <summary>Rows are never removed and change only under a condition of their own: a revision while it is a draft, a chain's end forward.</summary>
    public static readonly IReadOnlyList<Type> Conditional = [typeof(Revision), typeof(ChainTip)];

    public static string TableOf(IModel model, Type type) =>
        model.FindEntityType(type)?.GetTableName() ?? throw new InvalidOperationException($"{type.Name} has no table.");

    /// <summary>For each key and unique index, the columns by which a new row could take an old one's place.</summary>
    public static IEnumerable<IReadOnlyList<string>> UniqueColumns(IModel model, Type type)
    {
        var entity = model.FindEntityType(type)!;
        var keys = entity.GetKeys().Select(key => key.Properties);
        var indexes = entity.GetIndexes().Where(index => index.IsUnique).Select(index => index.Properties);
        return keys.Concat(indexes).Select(properties => properties.Select(property => property.GetColumnName()).ToList());
    }
}
