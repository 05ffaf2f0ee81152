using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Chains;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Confirming;

/// <param name="Place">Clause, table or page.</param>
public sealed record ConfirmRequest(
    Guid OrganisationId, string ValueId, string Document, string Edition, string Place, DateOnly Date, bool DemonstrationOnly = false);

public sealed record ConfirmAnswer(Guid ConfirmationId);

/// <summary>Owners' confirmations of values held from memory.</summary>
public sealed class Confirmations(ActDesk desk)
{
    public Task<ConfirmAnswer> Confirm(ActCall call, ConfirmRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.ConfirmValue, $"organisation {request.OrganisationId:D} value {request.ValueId}", (run, stop) => Confirm(run, request, stop), cancel);

    public Task<ConfirmAnswer> Revoke(ActCall call, Guid confirmationId, string reason, CancellationToken cancel = default) =>
        desk.Once(call, Act.RevokeConfirmation, $"confirmation {confirmationId:D}", (run, stop) => Revoke(run, confirmationId, reason, stop), cancel);

    /// <summary>What counts now for packages of this organisation's structures: per value the latest that is not revoked.</summary>
    public static async Task<IReadOnlyDictionary<string, Confirmation>> InForce(ArchiveScope scope, Guid organisationId, CancellationToken cancel = default)
    {
        var rows = await scope.Confirmations().Where(row => row.OrganisationId == organisationId && row.Revocation == null)
            .OrderBy(row => row.Position).ToListAsync(cancel);
        return rows.GroupBy(row => row.ValueId, StringComparer.Ordinal).ToDictionary(group => group.Key, group => group.Last(), StringComparer.Ordinal);
    }

    private static async Task<ConfirmAnswer> Confirm(ActRun run, ConfirmRequest request, CancellationToken cancel)
    {
        await run.NeedIn(Act.ConfirmValue, request.OrganisationId, cancel);
        var row = new Confirmation
        {
            OrganisationId = request.OrganisationId,
            ValueId = PlainText.Required("value", request.ValueId, PlainText.NameLimit),
            Document = PlainText.Required("document", request.Document, PlainText.NameLimit),
            Edition = PlainText.Required("edition", request.Edition, PlainText.NameLimit),
            Place = PlainText.Required("place", request.Place, PlainText.NameLimit),
            PersonId = run.Person.Id,
            PersonName = run.Person.Name,
            Date = request.Date,
            DemonstrationOnly = request.DemonstrationOnly,
        };
        await run.Append(ChainName.Organisation(request.OrganisationId), row, cancel);
        return new ConfirmAnswer(row.Id);
    }

    private static async Task<ConfirmAnswer> Revoke(ActRun run, Guid confirmationId, string reason, CancellationToken cancel)
    {
        var row = await run.Scope.Confirmations().FirstOrDefaultAsync(row => row.Id == confirmationId, cancel) ?? throw new NotFound("confirmation");
        await run.NeedIn(Act.RevokeConfirmation, row.OrganisationId, cancel);
        if (row.Revocation is not null) throw new ActRefused(RefusalReason.AlreadyDone, "This confirmation is revoked already.");
        var revocation = new ConfirmationRevocation
        {
            ConfirmationId = confirmationId,
            PersonId = run.Person.Id,
            Reason = PlainText.Required("reason", reason, PlainText.NoteLimit),
        };
        await run.Append(ChainName.Organisation(row.OrganisationId), revocation, cancel);
        return new ConfirmAnswer(confirmationId);
    }
}
