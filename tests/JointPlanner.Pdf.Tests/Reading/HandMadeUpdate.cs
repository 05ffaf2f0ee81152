using System.Globalization;
using System.Text;
using JointPlanner.Pdf.Reading;

namespace JointPlanner.Pdf.Tests.Reading;

/// <summary>Appends an update with a classic table to a file that has one, as an attacker or another program would.</summary>
internal static class HandMadeUpdate
{
    public static byte[] Append(byte[] file, params (int Number, string Body)[] objects)
    {
        var view = PdfRevisions.Open(file).Last;
        var output = new MemoryStream();
        output.Write(file);
        var table = new StringBuilder("xref\n");
        foreach (var (number, body) in objects.OrderBy(change => change.Number))
        {
            table.Append(CultureInfo.InvariantCulture, $"{number} 1\n{output.Position:D10} 00000 n \n");
            output.Write(Encoding.Latin1.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{number} 0 obj\n{body}\nendobj\n")));
        }
        int size = Math.Max(view.Whole(view.Trailer["Size"])!.Value, objects.Length == 0 ? 0 : objects.Max(change => change.Number) + 1);
        table.Append(CultureInfo.InvariantCulture,
            $"trailer\n<</Size {size}/Root 1 0 R/Info 7 0 R/ID[<00112233445566778899AABBCCDDEEFF><FF>]/Prev {view.Revision.CrossReferenceStart}>>\nstartxref\n{output.Position}\n%%EOF\n");
        output.Write(Encoding.Latin1.GetBytes(table.ToString()));
        return output.ToArray();
    }

    /// <summary>The source text of an object's value, to be changed and appended.</summary>
    public static string BodyOf(byte[] file, int number)
    {
        var found = PdfRevisions.Open(file).Last.Object(number)!;
        string text = Encoding.Latin1.GetString(file, found.Start, found.End - found.Start);
        int from = text.IndexOf("obj", StringComparison.Ordinal) + 3;
        return text[from..^"endobj".Length].Trim();
    }
}
