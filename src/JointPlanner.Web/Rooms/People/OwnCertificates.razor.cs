using JointPlanner.Archive.People;
using JointPlanner.Issuing;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;

namespace JointPlanner.Web.Rooms.People;

/// <summary>A person's own certificates: what is known, and handing in another.</summary>
public sealed partial class OwnCertificates
{
    private HandedInCertificate? read;

    /// <summary>What is known.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<CertificateLine> Lines { get; set; } = [];

    [Inject]
    private CertificateRegister Register { get; set; } = null!;

    [Inject]
    private TimeProvider Clock { get; set; } = null!;

    private async Task Look(InputFileChangeEventArgs chosen)
    {
        Says = "";
        if (chosen.FileCount != 1) return;
        await using var stream = chosen.File.OpenReadStream(long.MaxValue);
        read = await HandedInCertificate.Read(stream, Clock.GetUtcNow());
    }

    private Task HandIn() => Do(async call =>
    {
        await Register.Register(call, read!.Encoded.ToArray());
        read = null;
    });

    private Task Revoke(CertificateLine line) => Do(call => Register.Revoke(call, line.Row.Id));

    private static string StateOf(CertificateLine line) => line.Row switch
    {
        { RevokedAt: not null } => "out of use",
        { ConfirmedAt: null } => "waits for an administrator: read the fingerprint out to one",
        _ => line.Facts.Refusal is null ? "confirmed" : "confirmed, but no longer to be signed with: " + line.Facts.Refusal,
    };
}
