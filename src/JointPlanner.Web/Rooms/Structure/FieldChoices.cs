using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>The words that a field may hold, with their names for people.</summary>
internal static class FieldChoices
{
    /// <summary>The choices; null where the field is typed freely. A word that stands there and is none of them is shown as such, not hidden.</summary>
    internal static IReadOnlyList<(string Word, string Name)>? Of(Field? field, Workbench bench, string text) =>
        Known(field, bench) is not { } known ? null
        : text.Length == 0 || known.Any(k => k.Word == text) ? known
        : [.. known, (text, $"{text} (not known)")];

    private static IReadOnlyList<(string Word, string Name)>? Known(Field? field, Workbench bench) => field?.Entry switch
    {
        FalseEntry => [("false", "not counted")],
        WordEntry words => [.. words.Words.Select(w => (w, w.Replace('-', ' ')))],
        ReferenceEntry reference => [.. reference.Lists.SelectMany(list => bench.Document.Items(list).Select(id => (id, Mark(bench, list, id))))],
        OutsideWordEntry { Of: "code" } => [.. (bench.Known.Bases ?? []).Select(b => (b.Id, b.Title))],
        OutsideWordEntry { Of: "creep-model" } => [.. (bench.Known.CreepModels ?? []).Select(m => (m.Id, m.Title))],
        OutsideWordEntry { Of: "owner-rules" } => [.. (bench.Known.OwnerRules ?? []).Select(r => (r, r.Replace('-', ' ')))],
        OutsideWordEntry { Of: "zone" } => Words(Basis(bench)?.ClimateZones),
        OutsideWordEntry { Of: "profile" } => Words(Basis(bench)?.Profiles),
        OutsideWordEntry { Of: "family" } => [.. JointFamilies.All.Select(f => (f.Word, f.Word.Replace('-', ' ')))],
        _ => null,
    };

    private static Engine.Bases.CodeBasis? Basis(Workbench bench) =>
        bench.Known.Bases?.FirstOrDefault(b => b.Id == bench.Document.TextAt("basis/code"));

    private static IReadOnlyList<(string, string)>? Words(IReadOnlyList<string>? words) =>
        words is { Count: > 0 } ? [.. words.Select(w => (w, w.Replace('-', ' ')))] : null;

    private static string Mark(Workbench bench, string list, string id) =>
        bench.Document.TextAt($"{list}/{id}/mark") is { Length: > 0 } mark ? mark : id;
}
