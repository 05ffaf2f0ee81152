using System.Collections.Immutable;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>A plan file that a person handed in: the plan as typed, or why it cannot be opened.</summary>
/// <param name="Name">The file's name.</param>
/// <param name="Document">The plan; null where the file is refused.</param>
/// <param name="Faults">Where it is refused, why; else what is to be put right in the ledger, and what is unusual.</param>
public sealed record PlanFile(string Name, PlanDocument? Document, ImmutableArray<Fault> Faults)
{
    /// <summary>Bytes that a file may have; more is not taken in.</summary>
    public const int MostBytes = DocumentLimits.Bytes;

    /// <summary>Reads the file. A wrong value is no reason to refuse it: it stands in the ledger as typed, with its fault beside it. A wrong form is, because the ledger could not show what stands there.</summary>
    /// <param name="name">The file's name.</param>
    /// <param name="bytes">Its bytes.</param>
    /// <param name="known">Codes and rule sets of this installation.</param>
    public static PlanFile Read(string name, ReadOnlySpan<byte> bytes, KnownWords known)
    {
        var (document, faults) = PlanDocument.Parse(bytes);
        if (document is null) return new PlanFile(name, null, faults);
        if (SchemaCheck.Of(PlanFields.Table, document.Root) is { } other) return new PlanFile(name, null, [other]);
        var form = FormCheck.Of(PlanFields.Table, document.Root).Faults;
        return form.Count > 0 ? new PlanFile(name, null, [.. form]) : new PlanFile(name, document, new PlanReader(known).Read(document).Faults);
    }

    /// <summary>The answer to a file that is too large, without reading it.</summary>
    public static PlanFile TooLarge(string name, long bytes) => new(name, null,
    [
        new Fault("form.too-large", "", FormattableString.Invariant($"{bytes >> 20} MiB"), $"The file is larger than {MostBytes >> 20} MiB; nothing of it was read.",
            $"Allowed: up to {MostBytes >> 20} MiB.", "Check that this is the right file; a plan of 200 joints takes a few hundred kB."),
    ]);
}
