using JointPlanner.Archive.Revisions;
using JointPlanner.Issuing.Verifying;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Verify;

/// <summary>Three separate lines about each signature of a sheet that anyone may hand in; never one tick.</summary>
public sealed partial class VerifyPage
{
    private const int MostBytes = 25 * 1024 * 1024;
    private static readonly TimeSpan Longest = TimeSpan.FromSeconds(5);

    private SheetVerification? seen;
    private string says = "";

    /// <summary>The file handed in.</summary>
    [SupplyParameterFromForm(FormName = "verify")]
    public IFormFile? Sheet { get; set; }

    [Inject]
    private TrustedRoots Roots { get; set; } = null!;

    [Inject]
    private SheetLookup Lookup { get; set; } = null!;

    private async Task Look()
    {
        if (Sheet is not { Length: > 0 } file)
        {
            says = "No file came. Choose the PDF, then press Verify.";
            return;
        }

        if (file.Length > MostBytes)
        {
            says = $"{file.FileName}: the file is larger than 25 MiB. A sheet of this program is smaller.";
            return;
        }

        using var bytes = new MemoryStream();
        await file.CopyToAsync(bytes);
        using var stop = new CancellationTokenSource(Longest);
        try
        {
            seen = await SheetVerification.Of(bytes.ToArray(), Roots.Certificates, Lookup, stop.Token);
        }
        catch (OperationCanceledException)
        {
            says = $"{file.FileName}: the file takes longer than five seconds to read. It was not read further.";
        }
    }
}
