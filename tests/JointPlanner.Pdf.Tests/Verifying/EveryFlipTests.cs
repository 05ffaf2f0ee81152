using System.Globalization;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

public class EveryFlipTests
{
    private static readonly Verifier Verifier = new(TestAuthority.Known.Roots);

    private const int Step = 11, WideStep = 211, Told = 1500;

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task A_flipped_bit_outside_the_last_signatures_value_is_reported(bool packed)
    {
        byte[] signed = await Signed.ByBoth(packed ? HandMadeSheet.WithStream() : HandMadeSheet.WithTable());
        var hole = LastHole(signed);
        var missed = new List<string>();
        int[] ends = [.. PdfRevisions.Open(signed).All.Select(revision => revision.End)];
        // Close together where the file is told how to be read, wide apart in the fonts. Which bit is flipped moves on with the byte.
        // Run once with steps of 1 and 5 as well, which takes minutes: none was missed.
        for (int at = 0; at < signed.Length; at += Array.Exists(ends, end => at < end && at > end - Told) ? Step : WideStep)
        {
            if (at > hole.Start && at < hole.End - 1) continue;
            if (!Reported(signed, at, at % 8)) missed.Add(string.Create(CultureInfo.InvariantCulture, $"byte {at}, bit {at % 8}"));
        }
        Assert.Empty(missed);
    }

    [Fact]
    public async Task A_flipped_bit_inside_the_signatures_value_is_reported_or_its_part_is_listed_as_not_signed()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "checker", TestAuthority.Checker);
        var hole = LastHole(signed);
        int length = hole.Value.AsSpan().LastIndexOfAnyExcept((byte)0) + 1;
        var before = Verifier.Verify(signed).Signatures.Single();
        var missed = new List<int>();
        for (int at = hole.Start + 1; at < hole.End - 1; at += Step)
        {
            bool padding = at > hole.Start + (2 * length) + 2;
            if (padding && at % 50 != 0) continue;
            if (!Reported(signed, at, at % 8)) missed.Add((at - hole.Start - 1) / 2);
        }
        Assert.Contains("the further certificates carried along", before.NotSigned);
        Assert.Equal("", string.Join(",", missed));
    }

    private static bool Reported(byte[] signed, int at, int bit)
    {
        byte[] flipped = [.. signed];
        flipped[at] ^= (byte)(1 << bit);
        var report = Verifier.Verify(flipped);
        return report.Origin != FileOrigin.InTheFormOfASheet || report.Signatures.Count == 0
            || report.Signatures.Any(signature => signature.Unchanged.Verdict != UnchangedVerdict.Unchanged || signature.Who.Verdict != WhoVerdict.KnownIssuer);
    }

    private static SignatureHole LastHole(byte[] signed)
    {
        var file = PdfRevisions.Open(signed);
        return FormFields.In(file.Last).Where(field => field.IsFilled(file.Last)).Select(field => SignatureHole.Find(file, file.Last, field.Dictionary["V"]).Hole!).MaxBy(hole => hole.Covered)!;
    }
}
