using System.Buffers;
using System.Globalization;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Verifying;

/// <summary>A signature dictionary that leaves out of the signed bytes exactly its own value, and nothing else.</summary>
/// <param name="Start">Byte of the "&lt;" before the value.</param>
/// <param name="End">Byte behind the "&gt;" after it.</param>
/// <param name="Covered">Byte at which the signed part ends, which is the end of a revision.</param>
/// <param name="Revision">Index of that revision.</param>
/// <param name="Value">The value, zero padding included.</param>
/// <param name="Dictionary">The signature dictionary.</param>
internal sealed record SignatureHole(int Start, int End, int Covered, int Revision, byte[] Value, PdfDictionary Dictionary)
{
    private const int LargestValue = 256 * 1024;

    private static readonly SearchValues<byte> UpperCaseDigits = SearchValues.Create("0123456789ABCDEF"u8);
    private static readonly SearchValues<byte> LowerCaseDigits = SearchValues.Create("0123456789abcdef"u8);

    /// <summary>Finds the hole, or says why what is signed stays open.</summary>
    public static (SignatureHole? Hole, string Fault) Find(PdfRevisions file, RevisionView view, PdfValue? value)
    {
        if (value is not PdfReference reference || view.Object(reference.Number) is not { IsPacked: false, Value: PdfDictionary dictionary } found)
            return (null, "the signature is not an object of its own");
        if (view.Array(dictionary["ByteRange"]) is not { Items.Count: 4 } array || array.Items.Select(view.Whole).ToArray() is not [{ } zero, { } start, { } end, { } rest])
            return (null, "the signed range is not four numbers");
        if (dictionary["Contents"] is not PdfText { IsHex: true } text) return (null, "the signature holds no value");
        if (zero != 0) return (null, "the signed range does not begin at the file's first byte");
        if (start != text.Start || end != text.End || text.Start < found.Start)
            return (null, "the signed range leaves out more or less than the signature's own value");
        long covered = (long)end + rest;
        int revision = -1;
        for (int i = 0; i < file.All.Count; i++) if (file.All[i].End == covered || file.All[i].MarkEnd == covered) revision = i;
        if (revision < 0)
            return (null, string.Create(CultureInfo.InvariantCulture, $"the signed range ends at byte {covered}, where no state of the file ends"));
        if (!file.All[revision].Entries.ContainsKey(reference.Number))
            return (null, "the signature stands outside the update that it signs");
        if (text.Bytes.Length > LargestValue) return (null, "the signature's value is larger than any signature");
        var digits = file.File.AsSpan(start + 1, end - start - 2);
        if (digits.ContainsAnyExcept(UpperCaseDigits) && digits.ContainsAnyExcept(LowerCaseDigits))
            return (null, "the signature's value is not written in plain hexadecimal");
        return (new SignatureHole(start, end, (int)covered, revision, text.Bytes, dictionary), "");
    }

    /// <summary>The bytes that were signed.</summary>
    public byte[] Signed(byte[] file) => [.. file.AsSpan(0, Start), .. file.AsSpan(End, Covered - End)];
}
