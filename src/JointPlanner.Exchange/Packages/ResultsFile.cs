using System.Collections.Immutable;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using JointPlanner.Engine;
using JointPlanner.Engine.Fitting.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Packages;

/// <summary>Makes, writes and reads results.json.</summary>
public static class ResultsFile
{
    /// <summary>What the file says it is.</summary>
    public const string Schema = "results/1";

    /// <summary>Largest file that is looked at, bytes.</summary>
    public const int MostBytes = 64 * 1024 * 1024;

    private static readonly JsonSerializerOptions Options = new(JsonSerializerOptions.Strict)
    {
        PropertyNamingPolicy = JsonNamingPolicy.KebabCaseLower,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        MaxDepth = 16,
        // Thousands of rows: what a row does not say is left out.
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
    };

    /// <summary>What is stored of a result.</summary>
    /// <param name="result">The result.</param>
    /// <param name="engineVersion">Version of the program.</param>
    /// <param name="packageHash">SHA-256 of the package that was computed.</param>
    /// <param name="day">What holds for every joint on the day of setting; null where no joint is set by these results.</param>
    /// <param name="days">Tables of each joint for the day of setting.</param>
    public static StoredResults Of(Result result, string engineVersion, string packageHash, StoredDay? day, ImmutableArray<JointDay> days) => new(
        Schema, engineVersion, packageHash,
        [.. result.ByKey().Values.OrderBy(s => s.Index).Select(s => new StoredValue(s.Key, s.Quantity.Id, s.Value, MadeBy(s.Origin)))],
        [.. result.Joints.Select(j => Joint(j, days.FirstOrDefault(d => d.Joint == j.Joint.Id)))],
        [.. result.Findings.Select(Finding)], day);

    /// <summary>A setting table as it is stored.</summary>
    /// <param name="table">The table.</param>
    /// <param name="method">Id of the method by which the temperature is measured; empty for the table of the sheet.</param>
    /// <param name="temperatureUncertainty">One standard deviation of the temperature so measured, K.</param>
    /// <param name="isSkewed">True where openings along the road differ from those normal to the joint.</param>
    public static StoredTable Table(SettingTable table, string method, double temperatureUncertainty, bool isSkewed) => new(
        method, temperatureUncertainty, table.Rate.Value, table.Min.Value, table.Max.Value, [.. table.Rows.Select(r => Row(r, isSkewed))], table.LeastAge);

    /// <summary>The file in UTF-8.</summary>
    public static byte[] ToUtf8(StoredResults results) => [.. JsonSerializer.SerializeToUtf8Bytes(results, Options), (byte)'\n'];

    /// <summary>Reads a file's bytes.</summary>
    /// <returns>The results, or null with the fault.</returns>
    public static (StoredResults? Results, Fault? Fault) Read(ReadOnlySpan<byte> utf8)
    {
        const string remedy = "Choose the right file; results are attached to the issued sheet.";
        if (utf8.Length > MostBytes)
            return (null, new("form.too-large", "", "", $"The file is larger than {MostBytes >> 20} MiB.", $"Allowed: up to {MostBytes >> 20} MiB.", remedy));
        try
        {
            var results = JsonSerializer.Deserialize<StoredResults>(utf8, Options);
            return results is { Schema: Schema }
                ? (results, null)
                : (null, new("schema.other", "schema", PersonText.Shown(results?.Schema ?? ""), "This is not a file of results that can be read here.", $"Allowed: \"{Schema}\".", remedy));
        }
        catch (JsonException fault)
        {
            return (null, new("form.json", (fault.Path ?? "").TrimStart('$', '.'), "", FormattableString.Invariant($"The file cannot be read as results (line {(fault.LineNumber ?? 0) + 1})."),
                "Allowed: results as this program wrote them.", remedy));
        }
    }

    private static string MadeBy(Origin origin) => origin switch
    {
        FormulaOrigin made => made.Formula.Id,
        SolvedOrigin => "solved",
        SearchOrigin => "search",
        TableOrigin => "table",
        _ => "given",
    };

    private static StoredJoint Joint(JointResult joint, JointDay? day) => new(
        joint.Joint.Id, joint.Joint.Mark, joint.Fit?.Chosen?.Family ?? "", joint.Fit?.Chosen?.Size ?? "", joint.Joint.Skew,
        [.. (joint.Fit?.Chosen?.Limits ?? []).Select(l => new StoredLimit(l.Name, l.Value.Value, MemberWords.Of(l.Bound), MemberWords.Of(l.Measure),
            l.JudgedBy is { } column ? MemberWords.Of(column) : null))],
        joint.Table is { } table
            ?
            [
                Table(table, "", joint.Joint.TemperatureUncertainty, joint.Joint.Skew != 0),
                .. (day?.Tables ?? []).Select(t => Table(t.Table, t.Method.Id, t.Method.TemperatureUncertainty, joint.Joint.Skew != 0)),
            ]
            : [],
        [.. (day?.ToCome ?? []).Select(m => new StoredMovement(MemberWords.Of(m.JudgedBy), [.. m.Swings.Select(s => new StoredSwing(s.Rate, s.Min, s.Max))], m.ClosesBy, m.OpensBy, m.DeckAge))]);

    private static StoredRow Row(SettingRow row, bool isSkewed) => new(
        row.Temperature, row.DeckAge, row.Window?.Least.Value, row.Set?.Value, row.Window?.Greatest.Value, row.Minus?.Value, row.Plus?.Value, row.Reserve?.Value,
        row.Window?.LeastBy.Name, row.Window?.GreatestBy.Name, row.Refusal is { } refusal ? Finding(refusal) : null,
        isSkewed && row.Along is { } along ? new StoredOpening(along.Set.Value, along.Minus.Value, along.Plus.Value) : null);

    private static StoredFinding Finding(Finding finding) => new(
        finding.Id, MemberWords.Of(finding.Severity), finding.Path, finding.Template, [.. finding.Values.Select(v => new StoredNumber(v.Quantity.Id, v.Value))]);
}
