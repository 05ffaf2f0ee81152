using System.Globalization;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

/// <summary>One update that signs the designer's field and does something else besides, under one valid signature: a dishonest signer's work.</summary>
internal static class SignedUpdate
{
    public static async Task<byte[]> WithAlso(byte[] archived, params (int Number, string Body)[] also)
    {
        byte[] honest = await Signed.By(archived, "designer", TestAuthority.Designer);
        var file = PdfRevisions.Open(honest);
        int[] numbers = [.. file.All[1].Entries.Keys];
        // The honest update's objects and the dishonest ones, written anew as one update; then the range is set and the hole signed.
        byte[] forged = HandMadeUpdate.Append(archived, [.. numbers.Select(number => (number, HandMadeUpdate.BodyOf(honest, number))), .. also]);
        int hole = forged.AsSpan(archived.Length).IndexOf("/Contents<"u8) + archived.Length + 9;
        int end = hole + forged.AsSpan(hole).IndexOf((byte)'>') + 1;
        int range = forged.AsSpan(archived.Length).IndexOf("/ByteRange[0 "u8) + archived.Length + 13;
        Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{hole} {end} {forged.Length - end}").PadRight(32)).CopyTo(forged, range);
        return CmsForgery.Again(forged, TestAuthority.Designer, "/SubFilter", "/SubFilter");
    }
}
