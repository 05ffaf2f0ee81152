using System.Collections.Immutable;
using System.Globalization;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Packages;

/// <summary>Reads a calculation package.</summary>
public static class PackageReader
{
    /// <summary>Reads a file's bytes.</summary>
    public static PackageReading Read(ReadOnlySpan<byte> utf8)
    {
        var parsed = DocumentParser.Parse(utf8, DocumentLimits.OfPackages);
        if (parsed.Root is not { } root) return new(null, parsed.Faults);
        if (SchemaCheck.Of(PackageFields.Table, root) is { } schema) return new(null, [schema]);
        var form = FormCheck.Of(PackageFields.Table, root);
        var fields = FieldReading.Of(PackageFields.Table, root, form.Broken);
        var faults = form.Faults.Concat(fields.Faults).Where(f => !f.IsWarning).ToList();
        if (root["plan"] is null)
            faults.Add(new("package.no-plan", "plan", "", "The package holds no plan.", "Allowed: a plan.", "Choose the right file; a package is made by freezing a calculation."));
        var confirmations = Confirmations(fields.Values, faults);
        if (faults.Count > 0) return new(null, [.. faults]);
        var values = fields.Values;
        return new(new CalculationPackage
        {
            Plan = PlanDocument.Of((MapNode)root["plan"]!),
            OwnerRules = root["owner-rules"] as MapNode,
            CodeId = values.Text("code/id"),
            CodeRevision = values.Whole("code/revision"),
            Units = values.Text("units"),
            RoundingStep = values.Number("rounding-step"),
            EngineVersion = values.Text("engine"),
            ClimateRecord = values.Text("climate-record"),
            Confirmations = confirmations,
        }, []);
    }

    private static ImmutableArray<Confirmation> Confirmations(FieldValues values, List<Fault> faults)
    {
        var confirmations = ImmutableArray.CreateBuilder<Confirmation>();
        foreach (var path in values.Items("confirmations"))
        {
            var text = values.Text($"{path}/date");
            if (!DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var date) && text.Length > 0)
                faults.Add(new("package.date", $"{path}/date", text, $"“{text}” is not a day.", "Allowed: a day as 2026-05-31.", "Correct the date."));
            confirmations.Add(new(values.Text($"{path}/value-id"), values.Text($"{path}/document"), values.Text($"{path}/edition"), values.Text($"{path}/place"),
                values.Text($"{path}/person"), date));
        }
        return confirmations.ToImmutable();
    }
}
