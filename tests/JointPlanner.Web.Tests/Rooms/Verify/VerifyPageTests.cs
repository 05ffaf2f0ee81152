using System.Diagnostics;
using System.Net;
using JointPlanner.Archive.Revisions;
using JointPlanner.Issuing.Tests.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Web.Tests.Rooms.Revisions;

namespace JointPlanner.Web.Tests.Rooms.Verify;

/// <summary>Sheets handed in by somebody without an account.</summary>
public sealed class VerifyPageTests(RevisionHouse house) : IClassFixture<RevisionHouse>
{
    [Fact]
    public async Task An_issued_sheet_an_earlier_state_of_it_one_rewritten_and_what_becomes_of_it_are_each_told()
    {
        const string structure = "Sorrel Creek Crossing";
        var first = await house.Life.Frozen(structure);
        var unsigned = (await house.Life.Document(first)).Bytes;
        var inCheck = await Verified(unsigned);
        Assert.Contains("no signature", inCheck, StringComparison.Ordinal);
        Assert.Contains("Not issued: revision 1 is still being checked. Do not build or set a joint from it.", inCheck, StringComparison.Ordinal);

        await house.Life.Accept(first);
        await house.Life.Sign(first, SignatureField.Designer);
        await house.Life.Sign(first, SignatureField.Checker);
        await house.Life.Issue(first);
        var sheet = (await house.Life.Document(first)).Bytes;
        var issued = await Verified(sheet);
        Assert.Contains("Revision 1 is issued, since ", issued, StringComparison.Ordinal);
        Assert.Contains("byte for byte, the sheet as this archive holds it", issued, StringComparison.Ordinal);
        // Three separate lines for each signature; the demonstration's certificates lead to no root.
        Assert.Equal(2, Count(issued, "Unchanged? Unchanged"));
        Assert.Equal(2, Count(issued, "Who?"));
        Assert.Equal(2, Count(issued, "which leads to no authority trusted here"));
        Assert.Equal(2, Count(issued, "claimed by the signer, not proven"));

        var earlier = await Verified(unsigned);
        Assert.Contains("Revision 1 is issued, since ", earlier, StringComparison.Ordinal);
        Assert.Contains("an earlier state of the archived sheet; the archive holds it with more signatures", earlier, StringComparison.Ordinal);

        var rewritten = await Verified(Rewritten(sheet));
        Assert.Contains("These are not the archived bytes: the file was rewritten, or imitates a sheet.", rewritten, StringComparison.Ordinal);
        Assert.Contains("byte for byte, that of an archived sheet. Revision 1 is issued", rewritten, StringComparison.Ordinal);
        Assert.DoesNotContain("Unchanged? Unchanged", rewritten, StringComparison.Ordinal);

        await house.Life.Changed(structure, "joints/j1/setting/temperature", "21 °C");
        var second = await house.Life.Issued(structure);
        Assert.Contains("a later revision than 1 is issued. Do not build or set a joint from this one.", await Verified(sheet), StringComparison.Ordinal);

        await house.Life.Withdraw(second, "The skew of joint A was read from the wrong drawing.");
        var withdrawn = await Verified((await house.Life.Document(second)).Bytes);
        Assert.Matches(@"Withdrawn on \d{4}-\d\d-\d\d \d\d:\d\d \S+, because: The skew of joint A was read from the wrong drawing\. Do not build", withdrawn);
        // The sheet names its designer; the archive tells nobody who withdrew it.
        Assert.DoesNotContain("Tilde Overgaard", withdrawn, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_update_after_the_signature_and_a_file_that_is_not_ours_are_told()
    {
        var revision = await house.Life.FrozenWith("Plover Flats Bridge", WrongUploads.Archived);
        await house.Life.Sign(revision, SignatureField.Designer);
        var changed = await Verified(WrongUploads.WithPageAfter((await house.Life.Document(revision)).Bytes));
        Assert.Contains("The file is not the archived sheet. The first ", changed, StringComparison.Ordinal);
        Assert.Contains("pages were added (1 before, 2 after)", changed, StringComparison.Ordinal);

        var foreign = await Verified(HandMadeSheet.WithoutAttachments());
        Assert.Contains("The file was not made by this program", foreign, StringComparison.Ordinal);
        Assert.Contains("This file is not in this archive, and no archived sheet begins as it does.", foreign, StringComparison.Ordinal);
    }

    private async Task<string> Verified(byte[] file)
    {
        using var stranger = house.Stranger();
        var form = await stranger.GetStringAsync("/verify");
        var answer = await stranger.PostAsync("/verify", RevisionHouse.Upload(form, "Sheet", "sheet.pdf", file, ("_handler", "verify")));
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        return RevisionHouse.Text(await answer.Content.ReadAsStringAsync());
    }

    private static int Count(string text, string part) => text.Split(part).Length - 1;

    private static byte[] Rewritten(byte[] sheet)
    {
        var folder = Directory.CreateTempSubdirectory("joint-planner-qpdf-").FullName;
        try
        {
            var (before, after) = (Path.Combine(folder, "before.pdf"), Path.Combine(folder, "after.pdf"));
            File.WriteAllBytes(before, sheet);
            using var qpdf = Process.Start(new ProcessStartInfo("qpdf", [before, after]) { RedirectStandardError = true })!;
            qpdf.WaitForExit();
            return File.ReadAllBytes(after);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }
}
