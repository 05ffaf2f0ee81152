using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Setting;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Issuing.Setting;

/// <summary>The day of setting: which issued revision holds, whether it may still be used, what was recorded. It reads issued results only.</summary>
public sealed class SetDayDesk(IDbContextFactory<ArchiveContext> archive, SettingBook book, TimeProvider clock)
{
    /// <summary>One joint, by the revision that holds now or by the one asked for.</summary>
    /// <param name="personId">Who asks.</param>
    /// <param name="structureId">The structure.</param>
    /// <param name="joint">Id of the joint.</param>
    /// <param name="number">Number of the revision; null for the one that holds.</param>
    /// <exception cref="NotFound">There is no such structure or revision for this person.</exception>
    public async Task<SetDay> Open(Guid personId, Guid structureId, string joint, int? number = null)
    {
        await using var scope = await ArchiveScope.Enter(archive, personId);
        var structure = await scope.Structures().FirstOrDefaultAsync(s => s.Id == structureId) ?? throw new NotFound("structure");
        var issued = await Issued(scope, structureId);
        var revision = number is { } asked ? issued.FirstOrDefault(r => r.Number == asked) ?? throw new NotFound("revision") : Holding(issued);
        var day = new SetDay
        {
            StructureId = structureId,
            Structure = structure.Name,
            Zone = structure.Zone,
            JointId = joint,
            Revision = revision,
            MayRecord = revision?.State == RevisionState.Issued && await scope.May(Act.RecordSetting, structureId),
            MayAccept = await scope.May(Act.AcceptSetting, structureId),
            Records = await Records(scope, structureId, joint, issued),
        };
        if (revision is null) return day with { WhyNot = "No revision of this structure was issued yet. Ask the designer." };
        return await ByRevision(scope, day, revision, Holding(issued));
    }

    /// <summary>The joints that the revision which holds now has tables for.</summary>
    public async Task<IReadOnlyList<JointToSet>> Joints(Guid personId, Guid structureId)
    {
        await using var scope = await ArchiveScope.Enter(archive, personId);
        var issued = await Issued(scope, structureId);
        if (Holding(issued) is not { } revision || await Package(scope, revision.Id) is not { IsIntact: true } package) return [];
        var joints = new List<JointToSet>();
        foreach (var joint in IssuedJoint.All(package.ResultsText))
            joints.Add(new(joint.Id, joint.Mark, joint.Device, await Records(scope, structureId, joint.Id, issued) is [var latest, ..] ? latest : null));
        return joints;
    }

    /// <summary>Carries what was set to both ends of the temperatures and keeps it, also where it fails.</summary>
    /// <exception cref="ActRefused">It was not kept; the message says why.</exception>
    public async Task<RecordAnswer> Record(ActCall call, WhatWasSet set)
    {
        await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
        if (await scope.Revisions().AnyAsync(r => r.Id == set.RevisionId) is false || await Package(scope, set.RevisionId) is not { } package) throw new NotFound("revision");
        if (!package.IsIntact) throw new ActRefused(RefusalReason.Altered, Altered);
        var joint = IssuedJoint.All(package.ResultsText).FirstOrDefault(j => j.Id == set.Joint) ?? throw new NotFound("joint");
        if (set.Points.Count == 0) throw new ActRefused(RefusalReason.TextMissing, "A setting record needs at least one measured point.");
        var (atMinimum, atMaximum) = joint.Judge(set.Points, set.DeckAge);
        var methods = joint.Methods.ToDictionary(m => m.Id);
        return await book.Record(call, new RecordRequest(set.RevisionId, set.Joint, set.Device, set.MeasuredAt, set.HoldPoint,
            [.. set.Points.Select(p => new MeasuredPoint(p.Place, p.Opening, Words(p.Direction), p.Temperature, methods[p.Method].Name, methods[p.Method].TemperatureUncertainty))],
            atMinimum, atMaximum, set.Remark, set.DeckAge, set.TemperaturesRead));
    }

    /// <summary>A direction of measure in the trade's words.</summary>
    public static string Words(Direction direction) => direction == Direction.Along ? "along the road" : "normal to the joint";

    private const string Altered = "The stored calculation was altered since it was frozen. Nothing is set by it: tell the administrator to run `verify-archive`.";

    private async Task<SetDay> ByRevision(ArchiveScope scope, SetDay day, Revision revision, Revision? holding)
    {
        var site = new SiteTime(day.Zone);
        var issuedAt = revision.States.First(s => s.State == RevisionState.Issued).At;
        var package = await Package(scope, revision.Id);
        var joint = package is { IsIntact: true } ? IssuedJoint.All(package.ResultsText).FirstOrDefault(j => j.Id == day.JointId) : null;
        day = day with { Issued = issuedAt, Joint = joint };
        if (revision.State != RevisionState.Issued)
        {
            var last = revision.States.MaxBy(s => s.Ordinal)!;
            var instead = holding is { State: RevisionState.Issued } ? $" Revision {holding.Number} holds." : " Ask the designer which one holds.";
            return day with { WhyNot = $"Revision {revision.Number} was {Transitions.Words(revision.State)} on {site.Moment(last.At)}. {last.Reason}{instead}" };
        }
        if (package is not { IsIntact: true }) return day with { WhyNot = Altered };
        if (joint is null) return day with { WhyNot = $"Revision {revision.Number} has no setting table for this joint. Ask the designer." };
        var until = joint.UseBefore(issuedAt);
        return day with
        {
            UseBefore = until,
            WhyNot = clock.GetUtcNow() <= until ? null
                : $"Revision {revision.Number} was to be used before {site.Moment(until)}. Ask the designer whether it still holds, and for a fresh issue.",
        };
    }

    private static Task<List<Revision>> Issued(ArchiveScope scope, Guid structureId) => scope.Revisions().Include(r => r.States)
        .Where(r => r.StructureId == structureId && r.States.Any(s => s.State == RevisionState.Issued)).OrderByDescending(r => r.Number).ToListAsync();

    private static Revision? Holding(List<Revision> issued) => issued.FirstOrDefault(r => r.State == RevisionState.Issued) ?? issued.FirstOrDefault();

    private static Task<FrozenPackage?> Package(ArchiveScope scope, Guid revisionId) => scope.Packages().FirstOrDefaultAsync(p => p.RevisionId == revisionId);

    private static async Task<IReadOnlyList<KeptRecord>> Records(ArchiveScope scope, Guid structureId, string joint, List<Revision> issued)
    {
        var records = await scope.SettingRecords().Where(r => r.StructureId == structureId && r.Joint == joint).OrderByDescending(r => r.Position).Take(50).ToListAsync();
        if (records.Count == 0) return [];
        var ids = records.Select(r => r.Id).ToArray();
        var accepted = await scope.SettingAcceptances().Where(a => ids.Contains(a.SettingRecordId)).ToDictionaryAsync(a => a.SettingRecordId);
        var names = await scope.Names();
        return
        [
            .. records.Select(r => new KeptRecord(r, issued.FirstOrDefault(i => i.Id == r.RevisionId)?.Number ?? 0, accepted.GetValueOrDefault(r.Id),
                accepted.GetValueOrDefault(r.Id) is { } by ? names.GetValueOrDefault(by.PersonId, "") : "")),
        ];
    }
}
