using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Setting;

/// <param name="Opening">Metres.</param>
/// <param name="Temperature">Effective temperature, °C.</param>
/// <param name="Uncertainty">Standard uncertainty of the temperature, kelvin.</param>
public sealed record MeasuredPoint(string Place, double Opening, string Direction, double Temperature, string Method, double Uncertainty);

/// <summary>Whether the opening as set, carried to an end of the temperature range, still fits, and the sentence that says so.</summary>
public sealed record EndVerdict(bool Holds, string Sentence);

/// <param name="DeckAge">Seconds; null where it plays no part.</param>
/// <param name="TemperaturesRead">What was read at each measuring point, in words.</param>
public sealed record RecordRequest(
    Guid RevisionId, string Joint, string Device, DateTimeOffset MeasuredAt, string HoldPoint, IReadOnlyList<MeasuredPoint> Points,
    EndVerdict AtMinimum, EndVerdict AtMaximum, string? Reason = null, double? DeckAge = null, string? TemperaturesRead = null);

public sealed record RecordAnswer(Guid RecordId, bool Holds);

/// <summary>What was set on site, and its acceptance.</summary>
public sealed class SettingBook(ActDesk desk, FieldLinks links)
{
    public Task<RecordAnswer> Record(ActCall call, RecordRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.RecordSetting, Subject(request), async (run, stop) =>
        {
            var revision = await run.Scope.Revisions().Include(row => row.States).FirstOrDefaultAsync(row => row.Id == request.RevisionId, stop) ?? throw new NotFound("revision");
            await run.Structure(revision.StructureId, Act.RecordSetting, stop);
            return await Add(run, revision, request, run.Person.Name, link: null, stop);
        }, cancel);

    /// <summary>By the holder of a field link: unconfirmed until a designer accepts it.</summary>
    public Task<RecordAnswer> RecordByLink(Guid requestId, string from, string token, string personName, RecordRequest request, CancellationToken cancel = default) =>
        desk.OnceByLink(requestId, from, Act.RecordSetting, Subject(request), async (run, stop) =>
        {
            var link = await links.Usable(run.Archive, token, stop);
            if (link.RevisionId != request.RevisionId || link.Joint != request.Joint) throw new NotFound("joint");
            var revision = await run.Archive.Revisions.Include(row => row.States).Include(row => row.Structure).SingleAsync(row => row.Id == link.RevisionId, stop);
            run.StructureId = revision.StructureId;
            run.OrganisationId = revision.Structure!.OrganisationId;
            return await Add(run, revision, request, PlainText.Required("name", personName, PlainText.NameLimit), link, stop);
        }, cancel);

    /// <summary>A designer takes the record as right; one that fails only with a reason.</summary>
    public Task<RecordAnswer> Accept(ActCall call, Guid recordId, string? reason, CancellationToken cancel = default) =>
        desk.Once(call, Act.AcceptSetting, $"setting record {recordId:D}", async (run, stop) =>
        {
            var record = await run.Scope.SettingRecords().FirstOrDefaultAsync(row => row.Id == recordId, stop) ?? throw new NotFound("setting record");
            await run.Structure(record.StructureId, Act.AcceptSetting, stop);
            if (await run.Archive.SettingAcceptances.AnyAsync(row => row.SettingRecordId == recordId, stop))
                throw new ActRefused(RefusalReason.AlreadyDone, "This record is accepted already.");
            var kept = PlainText.Optional("reason", reason, PlainText.NoteLimit);
            if (!record.Holds && kept is null)
                throw new ActRefused(RefusalReason.ReasonMissing, $"This record fails ({(record.HoldsAtMinimum ? record.VerdictAtMaximum : record.VerdictAtMinimum)}); it is accepted only with a reason. Write why it may stay, or have the joint set again.");
            var acceptance = new SettingAcceptance { SettingRecordId = recordId, PersonId = run.Person.Id, Reason = kept };
            await run.Append(ChainName.Joint(record.StructureId, record.Joint), acceptance, stop);
            return new RecordAnswer(recordId, record.Holds);
        }, cancel);

    private static async Task<RecordAnswer> Add(ActRun run, Revision revision, RecordRequest request, string personName, FieldLink? link, CancellationToken cancel)
    {
        if (revision.State != RevisionState.Issued)
            throw new ActRefused(RefusalReason.WrongState, $"Revision {revision.Number} is {Transitions.Words(revision.State)}; a joint is set by an issued revision only. Ask the designer which one holds.");
        if (request.Points.Count == 0) throw new ActRefused(RefusalReason.TextMissing, "A setting record needs at least one measured point.");
        var structure = await run.Archive.Structures.AsNoTracking().SingleAsync(row => row.Id == revision.StructureId, cancel);
        var id = Guid.CreateVersion7();
        var record = new SettingRecord
        {
            Id = id,
            StructureId = revision.StructureId,
            Joint = PlainText.Required("joint", request.Joint, PlainText.NameLimit),
            Device = PlainText.Required("device", request.Device, PlainText.NameLimit),
            RevisionId = revision.Id,
            PersonId = link is null ? run.Person.Id : null,
            FieldLinkId = link?.Id,
            PersonName = personName,
            MeasuredAt = request.MeasuredAt,
            Zone = structure.Zone,
            HoldPoint = PlainText.Required("hold point", request.HoldPoint, PlainText.NameLimit),
            DeckAge = request.DeckAge is { } age ? Within("deck age", age, 0, 200 * 365.25 * 86400, "s") : null,
            TemperaturesRead = PlainText.Optional("temperatures read", request.TemperaturesRead, PlainText.NoteLimit),
            HoldsAtMinimum = request.AtMinimum.Holds,
            VerdictAtMinimum = PlainText.Required("verdict at the lowest temperature", request.AtMinimum.Sentence, PlainText.NoteLimit),
            HoldsAtMaximum = request.AtMaximum.Holds,
            VerdictAtMaximum = PlainText.Required("verdict at the highest temperature", request.AtMaximum.Sentence, PlainText.NoteLimit),
            Reason = PlainText.Optional("reason", request.Reason, PlainText.NoteLimit),
            Points = [.. request.Points.Select((point, index) => Kept(point, id, index + 1))],
        };
        await run.Append(ChainName.Joint(revision.StructureId, record.Joint), record, cancel);
        return new RecordAnswer(record.Id, record.Holds);
    }

    private static SettingPoint Kept(MeasuredPoint point, Guid recordId, int ordinal) => new()
    {
        SettingRecordId = recordId,
        Ordinal = ordinal,
        Place = PlainText.Required("point", point.Place, PlainText.NameLimit),
        Opening = Within("opening", point.Opening, 0, 10, "m"),
        Direction = PlainText.Required("direction", point.Direction, PlainText.NameLimit),
        Temperature = Within("temperature", point.Temperature, -90, 90, "°C"),
        Method = PlainText.Required("method", point.Method, PlainText.NameLimit),
        Uncertainty = Within("uncertainty of the temperature", point.Uncertainty, 0, 30, "K"),
    };

    private static double Within(string field, double value, double least, double most, string unit) =>
        value >= least && value <= most
            ? value
            : throw new ActRefused(RefusalReason.ValueOutOfRange, FormattableString.Invariant($"The field \"{field}\" is {value} {unit}; allowed is {least} to {most} {unit}. Measure or type it again."));

    private static string Subject(RecordRequest request) => $"revision {request.RevisionId:D} joint {request.Joint}";
}
