using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Auditing;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.Setting;

/// <param name="Token">Made by <see cref="FieldLinks.NewToken"/> before the button is shown, so that a second press shows the same link though only its hash is kept.</param>
public sealed record LinkRequest(Guid RevisionId, string Joint, string Token, DateTimeOffset ExpiresAt);

public sealed record LinkAnswer(Guid LinkId, DateTimeOffset ExpiresAt);

/// <summary>What the holder of a link may see.</summary>
/// <param name="ResultsText">The issued results; null with <paramref name="WhyNot"/>.</param>
/// <param name="WhyNot">Why there is nothing to set by, as a sentence.</param>
public sealed record FieldView(string StructureName, string Zone, string Joint, Guid RevisionId, int RevisionNumber, string? ResultsText, string? WhyNot);

/// <summary>Links by which somebody on site opens one joint of one revision without an account.</summary>
public sealed class FieldLinks(IDbContextFactory<ArchiveContext> archive, ActDesk desk, AuditTrail audit, TimeProvider clock)
{
    /// <summary>128 random bits, as 22 characters that fit an address.</summary>
    public static string NewToken() => LinkToken.New();

    public Task<LinkAnswer> Make(ActCall call, LinkRequest request, CancellationToken cancel = default) =>
        desk.Once(call, Act.MakeLink, $"revision {request.RevisionId:D} joint {request.Joint}", async (run, stop) =>
        {
            var revision = await run.Scope.Revisions().Include(row => row.States).FirstOrDefaultAsync(row => row.Id == request.RevisionId, stop) ?? throw new NotFound("revision");
            await run.Structure(revision.StructureId, Act.MakeLink, stop);
            if (revision.State != RevisionState.Issued)
                throw new ActRefused(RefusalReason.WrongState, $"Revision {revision.Number} is {Transitions.Words(revision.State)}; links are made to issued revisions only.");
            if (request.ExpiresAt <= run.Now)
                throw new ActRefused(RefusalReason.ValueOutOfRange, "The link would have expired already; choose a later day.");
            if (LinkToken.HashOf(request.Token) is not { } hash)
                throw new ActRefused(RefusalReason.ValueOutOfRange, "The link's token is not one of 128 random bits; load the page again.");
            var link = new FieldLink
            {
                TokenHash = hash,
                StructureId = revision.StructureId,
                RevisionId = revision.Id,
                Joint = PlainText.Required("joint", request.Joint, PlainText.NameLimit),
                MadeById = run.Person.Id,
                MadeAt = run.Now,
                ExpiresAt = request.ExpiresAt,
            };
            run.Archive.FieldLinks.Add(link);
            return new LinkAnswer(link.Id, link.ExpiresAt);
        }, cancel);

    public Task<LinkAnswer> Revoke(ActCall call, Guid linkId, CancellationToken cancel = default) =>
        desk.Once(call, Act.RevokeLink, $"link {linkId:D}", async (run, stop) =>
        {
            var link = await run.Scope.FieldLinks().FirstOrDefaultAsync(row => row.Id == linkId, stop) ?? throw new NotFound("link");
            await run.Structure(link.StructureId, Act.RevokeLink, stop);
            link.RevokedAt ??= run.Now;
            return new LinkAnswer(link.Id, link.ExpiresAt);
        }, cancel);

    /// <summary>Opens a link; unknown, expired and revoked ones are not found. The use is audited.</summary>
    public async Task<FieldView> Open(string token, string from, CancellationToken cancel = default)
    {
        await using var context = await archive.CreateDbContextAsync(cancel);
        var link = await Usable(context, token, cancel);
        var revision = await context.Revisions.AsNoTracking().Include(row => row.States).Include(row => row.Structure).SingleAsync(row => row.Id == link.RevisionId, cancel);
        await audit.Write(
            new AuditNote("LinkUsed", from, $"link {link.Id:D}") { StructureId = link.StructureId, OrganisationId = revision.Structure!.OrganisationId }, cancel);
        var view = new FieldView(revision.Structure.Name, revision.Structure.Zone, link.Joint, revision.Id, revision.Number, null, null);
        if (revision.State != RevisionState.Issued)
        {
            var reason = revision.States.MaxBy(entry => entry.Ordinal)!.Reason;
            return view with { WhyNot = $"Do not set: revision {revision.Number} is {Transitions.Words(revision.State)}. {reason} Ask the designer." };
        }

        return view with { ResultsText = (await StoredPackage.Intact(context, revision.Id, cancel)).ResultsText };
    }

    internal async Task<FieldLink> Usable(ArchiveContext context, string token, CancellationToken cancel)
    {
        var hash = LinkToken.HashOf(token) ?? throw new NotFound("link");
        var link = await context.FieldLinks.AsNoTracking().FirstOrDefaultAsync(row => row.TokenHash == hash, cancel);
        return link is { RevokedAt: null } && link.ExpiresAt > clock.GetUtcNow() ? link : throw new NotFound("link");
    }
}
