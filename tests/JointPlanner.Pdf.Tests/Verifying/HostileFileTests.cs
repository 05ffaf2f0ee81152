using System.Diagnostics;
using System.Globalization;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

public class HostileFileTests
{
    private const int Files = 2000;

    private static readonly string[] Words =
    [
        "<<", ">>", "[", "]", "(", ")", "<", ">", "/", "obj", "endobj", "stream", "endstream", "xref", "trailer", "startxref", "%%EOF", " 0 R", "null",
        "/Prev 0", "/Prev 99999999999", "/Length 2147483647", "/Length -1", "/Size 2147483647", "/W[8 8 8]", "/W[0 1 0]", "/Index[0 2147483647]", "/N 2147483647",
        "/Kids[2 0 R]", "/Type/ObjStm", "/Type/XRef", "/Filter/LZWDecode", "/Predictor 12", "/ByteRange[0 1 2 3]", "/ByteRange[0 2147483647 2147483647 2147483647]", "\\", "#", "\0", "-", "9999999999",
    ];

    [Fact]
    public async Task Two_thousand_mutated_files_end_in_an_answer()
    {
        byte[][] seeds =
        [
            HandMadeSheet.WithTable(), HandMadeSheet.WithStream(), await Signed.ByBoth(HandMadeSheet.WithTable()), await Signed.ByBoth(HandMadeSheet.WithStream()),
            await Signed.By(PdfWriter.Write(JointPlanner.Pdf.Tests.SampleSheet.Make()).Bytes, "designer", TestAuthority.Designer),
        ];
        var verifier = new Verifier(TestAuthority.Known.Roots);
        var random = new Random(20250602);
        var answers = new Dictionary<FileOrigin, int>();
        long slowest = 0, largest = 0;
        for (int i = 0; i < Files; i++)
        {
            byte[] file = Mutated(seeds[i % seeds.Length], random);
            long began = Stopwatch.GetTimestamp(), memory = GC.GetAllocatedBytesForCurrentThread();
            try
            {
                var origin = verifier.Verify(file).Origin;
                answers[origin] = answers.GetValueOrDefault(origin) + 1;
                UpdateRule.AcceptSignedUpload(seeds[i % seeds.Length], [.. seeds[i % seeds.Length], .. file], "designer", "00", TestAuthority.SigningTime);
            }
            catch (Exception e)
            {
                Assert.Fail(string.Create(CultureInfo.InvariantCulture, $"File {i} ended in {e}"));
            }
            try
            {
                Attachments.Read(file);
            }
            catch (PdfReadException)
            {
                // An answer too.
            }
            slowest = Math.Max(slowest, Stopwatch.GetTimestamp() - began);
            largest = Math.Max(largest, GC.GetAllocatedBytesForCurrentThread() - memory);
        }
        // The mutations must reach past the first refusal, or they prove nothing.
        Assert.True(answers.GetValueOrDefault(FileOrigin.InTheFormOfASheet) > Files / 20, "too few files were read to their end");
        Assert.True(answers.GetValueOrDefault(FileOrigin.NotReadable) > Files / 20, "too few files were broken");
        Assert.True(largest < 200 * 1024 * 1024, string.Create(CultureInfo.InvariantCulture, $"{largest} bytes for one file"));
        Assert.True(TimeSpan.FromSeconds((double)slowest / Stopwatch.Frequency) < TimeSpan.FromSeconds(20), "one file took too long");
    }

    [Fact]
    public async Task Mutated_signature_values_end_in_an_answer()
    {
        byte[] signed = await Signed.By(HandMadeSheet.WithTable(), "designer", TestAuthority.Checker);
        int hole = signed.AsSpan().IndexOf("/Contents<"u8) + 10;
        var verifier = new Verifier(TestAuthority.Known.Roots);
        var random = new Random(7);
        for (int i = 0; i < 500; i++)
        {
            byte[] file = [.. signed];
            for (int k = random.Next(1, 6); k > 0; k--) file[hole + random.Next(2400)] = (byte)"0123456789ABCDEF"[random.Next(16)];
            var signature = verifier.Verify(file).Signatures.Single();
            Assert.True(file.AsSpan().SequenceEqual(signed) || signature.Unchanged.Verdict == UnchangedVerdict.Broken || signature.Who.Verdict != WhoVerdict.KnownIssuer,
                string.Create(CultureInfo.InvariantCulture, $"mutation {i} passed"));
        }
    }

    private static byte[] Mutated(byte[] seed, Random random)
    {
        var file = new List<byte>(seed);
        for (int k = random.Next(1, 4); k > 0; k--)
        {
            int at = random.Next(4) == 0 ? Math.Max(0, file.Count - 1 - random.Next(600)) : random.Next(file.Count);
            int length = Math.Min(random.Next(1, 60), file.Count - at);
            switch (random.Next(6))
            {
                case 0: file[at] ^= (byte)(1 << random.Next(8)); break;
                case 1: file[at] = (byte)random.Next(256); break;
                case 2: file.RemoveRange(at, length); break;
                case 3: file.InsertRange(at, file.GetRange(random.Next(file.Count - length + 1), length)); break;
                case 4:
                    var word = Encoding.Latin1.GetBytes(Words[random.Next(Words.Length)]);
                    for (int i = 0; i < word.Length && at + i < file.Count; i++) file[at + i] = word[i];
                    break;
                default: Digits(file, at, random); break;
            }
        }
        return [.. file];
    }

    // Numbers are where offsets, lengths and counts live: the next digit found becomes another.
    private static void Digits(List<byte> file, int at, Random random)
    {
        for (int i = at; i < Math.Min(file.Count, at + 200); i++)
        {
            if (file[i] is < (byte)'0' or > (byte)'9') continue;
            file[i] = (byte)('0' + random.Next(10));
            return;
        }
    }
}
