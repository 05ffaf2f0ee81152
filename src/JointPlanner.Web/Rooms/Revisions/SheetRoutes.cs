using System.Security.Claims;
using System.Security.Cryptography;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Issuing;
using JointPlanner.Pdf.Signing;
using JointPlanner.Web.Rooms.Accounts;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Mvc;
using Microsoft.EntityFrameworkCore;
using SignRequest = JointPlanner.Pdf.Signing.SignRequest;

namespace JointPlanner.Web.Rooms.Revisions;

/// <summary>Files that go out and come in beside the pages: the sheet, the signed sheet, and in demo mode a key file. Plain requests, never through a circuit.</summary>
internal static class SheetRoutes
{
    private const int LargestSheet = 25 * 1024 * 1024, RoomForTheRest = 65536;

    internal static void MapSheets(this WebApplication app)
    {
        var sheets = app.MapGroup("/revisions/{id:guid}").RequireAuthorization().ExcludeFromDescription();
        sheets.MapGet("/sheet.pdf", Download);
        sheets.MapPost("/signed", HandIn).WithMetadata(new RequestSizeLimitAttribute(LargestSheet + RoomForTheRest));
        if (app.Services.GetRequiredService<DemoMode>().IsOn) sheets.MapPost("/sign", SignHere).WithMetadata(new RequestSizeLimitAttribute(RoomForTheRest));
    }

    private static async Task<IResult> Download(Guid id, ClaimsPrincipal user, IDbContextFactory<ArchiveContext> archive)
    {
        if (PersonClaims.IdOf(user) is not { } person) return Results.Unauthorized();
        try
        {
            await using var scope = await ArchiveScope.Enter(archive, person);
            var sheet = await scope.Document(id);
            return Results.File(sheet.Bytes, "application/pdf", $"sheet-{sheet.Hash[..8]}.pdf");
        }
        catch (NotFound)
        {
            return Results.NotFound();
        }
    }

    private static Task<IResult> HandIn(
        Guid id, [FromForm] Guid request, [FromForm] SignatureField field, [FromForm] string expected, IFormFile sheet, HttpContext context, RevisionDesk desk, FormSays says) =>
        Once(id, request, field, context, desk, says, async call =>
        {
            if (sheet.Length > LargestSheet) throw new ActRefused(RefusalReason.TextTooLong, $"{sheet.FileName}: the file is larger than 25 MiB. Hand in the sheet that you downloaded, signed.");
            using var bytes = new MemoryStream();
            await sheet.CopyToAsync(bytes);
            await desk.Sign(call, id, field, expected, bytes.ToArray());
        });

    private static Task<IResult> SignHere(
        Guid id, [FromForm] Guid request, [FromForm] SignatureField field, [FromForm] string expected, [FromForm] string? password, IFormFile key, HttpContext context,
        RevisionDesk desk, FormSays says, IDbContextFactory<ArchiveContext> archive, TimeProvider clock) =>
        Once(id, request, field, context, desk, says, async call =>
        {
            await using var scope = await ArchiveScope.Enter(archive, call.PersonId);
            var stored = await scope.Document(id);
            var bytes = new byte[key.Length > Pfx.LargestFile ? Pfx.LargestFile + 1 : (int)key.Length];
            await using (var stream = key.OpenReadStream()) await stream.ReadAtLeastAsync(bytes, bytes.Length, throwOnEndOfStream: false);
            var opened = Pfx.Load(bytes, password);
            CryptographicOperations.ZeroMemory(bytes);
            using var held = opened.Key ?? throw new ActRefused(RefusalReason.SignatureObjection, opened.Text);
            var signed = await Signer.SignAsync(stored.Bytes, new SignRequest
            {
                Field = SignatureJudge.NameOf(field),
                Certificate = held.Certificate,
                Chain = held.Chain,
                Instant = clock.GetUtcNow(),
                SignerName = scope.Person.Name,
                Reason = field == SignatureField.Designer ? "Designed by" : "Checked by",
                ExpectedSha256 = expected,
            });
            await desk.Sign(call, id, field, expected, signed.Bytes);
        });

    /// <summary>Signs once for one request id: a form sent twice, one after the other or at the same moment, is answered twice with the first answer.</summary>
    private static async Task<IResult> Once(Guid id, Guid request, SignatureField field, HttpContext context, RevisionDesk desk, FormSays says, Func<ActCall, Task> act)
    {
        if (PersonClaims.IdOf(context.User) is not { } person) return Results.Unauthorized();
        var call = new ActCall(request, person, AccountRoutes.From(context)) { PasswordAt = PasswordMark.Of(context.User) };
        try
        {
            if (!await desk.WasSigned(call, id, field)) await act(call);
            return Results.LocalRedirect($"/revisions/{id}");
        }
        catch (Exception refused) when (refused is ActRefused or NotFound or SigningRefusedException)
        {
            // The twin of this request may have signed while this one was still at its own signature, which then no longer fits the sheet.
            return await WasSignedMeanwhile(desk, call, id, field) ? Results.LocalRedirect($"/revisions/{id}") : Results.LocalRedirect(says.Address(id, refused.Message));
        }
    }

    private static async Task<bool> WasSignedMeanwhile(RevisionDesk desk, ActCall call, Guid id, SignatureField field)
    {
        try
        {
            return await desk.WasSigned(call, id, field);
        }
        catch (ActRefused)
        {
            return false;
        }
    }
}
