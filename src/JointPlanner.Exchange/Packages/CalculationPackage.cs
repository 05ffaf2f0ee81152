using System.Collections.Immutable;
using System.Globalization;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.OwnerRules;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Exchange.Packages;

/// <summary>
/// Everything that can change a number of one calculation, by value, so that it can be computed again from this alone. Its hash is that of
/// its bytes as they were written once; they are kept and never written anew.
/// </summary>
public sealed record CalculationPackage
{
    /// <summary>The plan, texts as typed.</summary>
    public required PlanDocument Plan { get; init; }
    /// <summary>The owner's rule set as a document; null where the plan uses none.</summary>
    public MapNode? OwnerRules { get; init; }
    /// <summary>Id of the code edition.</summary>
    public required string CodeId { get; init; }
    /// <summary>Number of our own corrections to the code edition's folder.</summary>
    public required int CodeRevision { get; init; }
    /// <summary>Word of the units and rounding profile: metric or us.</summary>
    public required string Units { get; init; }
    /// <summary>Step to which set values are rounded where the owner's rules state none, m.</summary>
    public required double RoundingStep { get; init; }
    /// <summary>Version of the program.</summary>
    public required string EngineVersion { get; init; }
    /// <summary>Confirmations of values held from memory.</summary>
    public ImmutableArray<Confirmation> Confirmations { get; init; } = [];
    /// <summary>SHA-256 of the climate record from which the plan's extremes come; empty for none.</summary>
    public string ClimateRecord { get; init; } = "";

    /// <summary>The file in UTF-8. Equal packages give equal bytes.</summary>
    public byte[] ToUtf8()
    {
        var step = UnitTable.Of(Quantity.Opening);
        var root = MapNode.Empty
            .With("schema", new TextNode(PackageFields.Table.Schema))
            .With("engine", new TextNode(EngineVersion))
            .With("code", MapNode.Empty.With("id", new TextNode(CodeId)).With("revision", new NumberNode(CodeRevision.ToString(CultureInfo.InvariantCulture))))
            .With("units", new TextNode(Units))
            .With("rounding-step", new TextNode(QuantityText.Write(RoundingStep, Units == "us" ? step.Us : step.Metric)));
        if (ClimateRecord.Length > 0) root = root.With("climate-record", new TextNode(ClimateRecord));
        root = root.With("confirmations", new ListNode([.. Confirmations.Select(Node)]));
        if (OwnerRules is not null) root = root.With("owner-rules", DocumentWriter.InOrder(OwnerRuleFields.Table, OwnerRules));
        return DocumentWriter.ToUtf8(PackageFields.Table, root.With("plan", DocumentWriter.InOrder(PlanFields.Table, Plan.Root)));
    }

    private static DocumentNode Node(Confirmation confirmation)
    {
        var node = MapNode.Empty.With("value-id", new TextNode(confirmation.ValueId)).With("document", new TextNode(confirmation.Document));
        if (confirmation.Edition.Length > 0) node = node.With("edition", new TextNode(confirmation.Edition));
        if (confirmation.Place.Length > 0) node = node.With("place", new TextNode(confirmation.Place));
        return node.With("person", new TextNode(confirmation.Person))
            .With("date", new TextNode(confirmation.Date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)));
    }
}

/// <summary>What a package file says.</summary>
/// <param name="Package">The package; null where a fault stands in its way.</param>
/// <param name="Faults">What is wrong with the package itself; its plan and rule set are judged by their own readers.</param>
public sealed record PackageReading(CalculationPackage? Package, ImmutableArray<Fault> Faults);
