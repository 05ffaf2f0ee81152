using System.Buffers.Binary;
using System.Text;

namespace JointPlanner.Pdf.Writing;

/// <summary>
/// The sRGB colour space as an ICC profile of version 2, built from published numbers: the curve of IEC 61966-2-1 and its primaries
/// adapted to the D50 white of the profile connection space.
/// </summary>
internal static class ColourProfile
{
    private const int CurvePoints = 1024;

    public static byte[] Srgb { get; } = Build();

    private static byte[] Build()
    {
        // The five D50 triples and the curve are from memory of the published sRGB profile; a test recomputes them from the primaries.
        (string Tag, byte[] Data)[] tags =
        [
            ("desc", Description("sRGB")),
            ("cprt", [.. "text"u8, 0, 0, 0, 0, .. "No copyright, use freely"u8, 0]),
            ("wtpt", Xyz(0.9642, 1, 0.8249)),
            ("rXYZ", Xyz(0.43607, 0.22249, 0.01392)),
            ("gXYZ", Xyz(0.38515, 0.71687, 0.09708)),
            ("bXYZ", Xyz(0.14307, 0.06061, 0.71410)),
            ("rTRC", Curve()),
        ];
        List<byte> directory = [.. U32(tags.Length + 2)];
        List<byte> body = [];
        var start = 128 + 4 + ((tags.Length + 2) * 12);
        byte[] curvePlace = [];
        foreach (var (tag, data) in tags)
        {
            curvePlace = [.. U32(start + body.Count), .. U32(data.Length)];
            directory.AddRange([.. Encoding.ASCII.GetBytes(tag), .. curvePlace]);
            body.AddRange(data);
            while (body.Count % 4 != 0) body.Add(0);
        }
        // Green and blue share red's curve, which came last.
        foreach (var tag in new[] { "gTRC", "bTRC" }) directory.AddRange([.. Encoding.ASCII.GetBytes(tag), .. curvePlace]);
        var head = new byte[128];
        U32(start + body.Count).CopyTo(head, 0);
        U32(0x02100000).CopyTo(head, 8);
        "mntrRGB XYZ "u8.CopyTo(head.AsSpan(12));
        new byte[] { 0x07, 0xEA, 0, 1, 0, 1 }.CopyTo(head, 24);
        "acsp"u8.CopyTo(head.AsSpan(36));
        Xyz(0.9642, 1, 0.8249).AsSpan(8).CopyTo(head.AsSpan(68));
        return [.. head, .. directory, .. body];
    }

    private static byte[] Curve()
    {
        List<byte> curve = [.. "curv"u8, 0, 0, 0, 0, .. U32(CurvePoints)];
        for (var i = 0; i < CurvePoints; i++)
        {
            var value = i / (CurvePoints - 1.0);
            var linear = value <= 0.04045 ? value / 12.92 : Math.Pow((value + 0.055) / 1.055, 2.4);
            var level = (int)Math.Round(linear * 65535);
            curve.Add((byte)(level >> 8));
            curve.Add((byte)(level & 0xFF));
        }
        return [.. curve];
    }

    private static byte[] Description(string text) =>
        [.. "desc"u8, 0, 0, 0, 0, .. U32(text.Length + 1), .. Encoding.ASCII.GetBytes(text), 0, .. new byte[78]];

    private static byte[] Xyz(double x, double y, double z) =>
        [.. "XYZ "u8, 0, 0, 0, 0, .. Fixed(x), .. Fixed(y), .. Fixed(z)];

    private static byte[] Fixed(double value) => U32((int)Math.Round(value * 65536));

    private static byte[] U32(int value)
    {
        var bytes = new byte[4];
        BinaryPrimitives.WriteInt32BigEndian(bytes, value);
        return bytes;
    }
}
