using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Third pass, first half: what can only be seen in the document itself, before there is a plan: ids that lead nowhere, two ways to say one thing.</summary>
internal sealed class FieldsTogether
{
    private readonly PlanDocument document;
    private readonly FieldValues values;
    private readonly List<Fault> faults = [];

    private FieldsTogether(PlanDocument document, FieldValues values) => (this.document, this.values) = (document, values);

    public static IReadOnlyList<Fault> Check(PlanDocument document, FieldValues values, KnownWords known)
    {
        var check = new FieldsTogether(document, values);
        check.SharedIds();
        check.References();
        foreach (var path in values.Items("supports")) check.OneStiffness(path);
        foreach (var path in values.Items("segments"))
        {
            check.OneAxialStiffness(path);
            foreach (var fault in ConcreteMaking.Faults(path, document, values)) check.Add(fault);
        }
        foreach (var path in values.Items("bearings")) check.StationOnSegment(path);
        check.Answers();
        check.BasisWords(known);
        check.TimeZone();
        return check.faults;
    }

    /// <summary>A bearing stands on, and a joint lies at, a support or a segment: one id must not name both.</summary>
    private void SharedIds()
    {
        foreach (var id in document.Items("segments").Intersect(document.Items("supports")).Where(id => id[0] != '#'))
            Add(new("id.repeated", $"segments/{id}/id", id, $"A support has the id “{id}” already.", "Allowed: an id that no support and no other segment has.",
                "Give the segment another id, and change it where the segment is named."));
    }

    private void References()
    {
        foreach (var field in PlanFields.Table.Fields)
        {
            if (field.Entry is not ReferenceEntry { Lists: var lists }) continue;
            var ids = lists.SelectMany(l => values.Items(l).Select(p => p[(p.LastIndexOf('/') + 1)..])).ToHashSet();
            // An item whose own id could not be read may be the one that is meant.
            if (ids.Any(id => id[0] == '#') || lists.Any(values.Unread.Contains)) continue;
            var (list, word) = (field.Pattern[..field.Pattern.IndexOf('/', StringComparison.Ordinal)], field.Word);
            foreach (var path in values.Items(list).Select(item => $"{item}/{word}"))
            {
                if (values.Text(path) is not { Length: > 0 } id || ids.Contains(id)) continue;
                var nearest = Nearest.Of(id, ids);
                Add(new("reference.unknown", path, id, $"{field.Name}: there is no “{id}” among the {string.Join(" and ", lists)}.",
                    ids.Count is > 0 and <= 40 ? $"Allowed: {string.Join(", ", ids.Order(StringComparer.Ordinal))}." : FieldValueReader.AllowedBy(field),
                    nearest is null ? "Name one that there is, or add it." : $"Did you mean “{nearest}”?"));
            }
        }
    }

    private void OneStiffness(string path)
    {
        if (document.Has($"{path}/stiffness") && values.HasGroup($"{path}/column"))
            Add(new("supports.two-stiffnesses", $"{path}/stiffness", document.TextAt($"{path}/stiffness") ?? "", "Both a stiffness and a column are given.",
                "Allowed: one of the two.", "Take one of them out."));
    }

    private void OneAxialStiffness(string path)
    {
        if (document.Has($"{path}/axial-stiffness") && values.HasGroup($"{path}/section"))
            Add(new("segments.two-stiffnesses", $"{path}/axial-stiffness", document.TextAt($"{path}/axial-stiffness") ?? "", "Both an axial stiffness and a section are given.",
                "Allowed: one of the two.", "Take one of them out; the section gives the axial stiffness too."));
    }

    private void StationOnSegment(string path)
    {
        var on = values.Text($"{path}/on");
        if (document.Has($"{path}/station") || values.Unread.Contains($"{path}/station") || !document.Has($"segments/{on}")) return;
        Add(new("bearings.no-station", $"{path}/station", "", $"The bearing line stands on segment {on}, but its station is not given.",
            "Allowed: a station on both segments, or within 5 m of the end of the one that carries.", "Give the station of the bearing line."));
    }

    private void Answers()
    {
        var seen = new HashSet<(string, string)>();
        foreach (var path in values.Items("basis/answers"))
        {
            var (hasFactor, isUncounted) = (document.Has($"{path}/factor"), document.Has($"{path}/counted"));
            if (hasFactor == isUncounted && !values.Unread.Contains($"{path}/factor") && !values.Unread.Contains($"{path}/counted"))
                Add(new("answers.no-answer", $"{path}/factor", document.TextAt($"{path}/factor") ?? "",
                    hasFactor ? "The answer gives a factor and says that the movement is not counted." : "The answer gives no factor and does not say that the movement is not counted.",
                    "Allowed: either a factor, or “counted”: false.", "Give one of the two."));
            var (cause, column) = (values.Text($"{path}/cause"), values.Text($"{path}/column"));
            if (cause.Length > 0 && column.Length > 0 && !seen.Add((cause, column)))
                Add(new("answers.repeated", $"{path}/column", column, $"There is an answer for {cause}, {column} already.", "Allowed: one answer for each.", "Take one of them out."));
        }
    }

    /// <summary>Cures and formats that the code edition does not know.</summary>
    private void BasisWords(KnownWords known)
    {
        if (known.BasisOf(values.Text("basis/code")) is not { } basis) return;
        Among("basis/setting-doubt", basis.Doubts.Select(MemberWords.Of));
        Among("basis/safety", basis.SafetyFormats.Select(MemberWords.Of));

        void Among(string path, IEnumerable<string> words)
        {
            var word = values.Text(path);
            if (word.Length == 0 || words.Contains(word)) return;
            Add(new("basis.word", path, word, $"{basis.Title} does not know “{word}”.", $"Allowed: {string.Join(", ", words)}.", "Choose one of them, or leave the field empty for the code's own way."));
        }
    }

    private void TimeZone()
    {
        const string path = "structure/time-zone";
        var zone = values.Text(path);
        if (zone is "" or "Etc/UTC" || (TimeZoneInfo.TryFindSystemTimeZoneById(zone, out var found) && found.HasIanaId)) return;
        var all = TimeZoneInfo.GetSystemTimeZones().Where(z => z.HasIanaId).Select(z => z.Id).ToArray();
        // A machine without time zone data knows none; that is no fault of the plan.
        if (all.Length < 100) return;
        var nearest = Nearest.Of(zone, all);
        Add(new("structure.time-zone", path, zone, $"“{zone}” is not a time zone.", "Allowed: an IANA name such as Europe/Paris, America/Denver, Etc/UTC.",
            nearest is null ? "Write the IANA name of the site's time zone." : $"Did you mean “{nearest}”?"));
    }

    private void Add(Fault fault)
    {
        faults.Add(fault);
        values.Miss(fault.Path);
    }
}
