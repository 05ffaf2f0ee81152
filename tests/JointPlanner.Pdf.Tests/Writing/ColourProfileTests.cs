using System.Buffers.Binary;
using JointPlanner.Pdf.Writing;

namespace JointPlanner.Pdf.Tests.Writing;

/// <summary>
/// The profile's numbers are worked out anew: primaries and white of ITU-R BT.709, adapted from D65 to D50 by the linear Bradford
/// transform (ICC.1:2010, annex E). The matrix and the primaries are written here from memory of those documents.
/// </summary>
public class ColourProfileTests
{
    private static readonly double[,] Bradford = { { 0.8951, 0.2664, -0.1614 }, { -0.7502, 1.7135, 0.0367 }, { 0.0389, -0.0685, 1.0296 } };
    private static readonly double[] D50 = [0.9642, 1, 0.8249];

    [Fact]
    public void The_primaries_are_those_of_the_standard_adapted_to_the_profiles_white()
    {
        double[] White(double x, double y) => [x / y, 1, (1 - x - y) / y];
        var d65 = White(0.3127, 0.3290);
        double[,] primaries = { { 0.64 / 0.33, 0.30 / 0.60, 0.15 / 0.06 }, { 1, 1, 1 }, { 0.03 / 0.33, 0.10 / 0.60, 0.79 / 0.06 } };
        var shares = Solve(primaries, d65);
        var (from, to) = (Times(Bradford, d65), Times(Bradford, D50));
        foreach (var (tag, column) in new[] { ("rXYZ", 0), ("gXYZ", 1), ("bXYZ", 2) })
        {
            double[] colour = [primaries[0, column] * shares[column], shares[column], primaries[2, column] * shares[column]];
            var cone = Times(Bradford, colour);
            for (var i = 0; i < 3; i++) cone[i] *= to[i] / from[i];
            var adapted = Solve(Bradford, cone);
            for (var i = 0; i < 3; i++) Assert.Equal(adapted[i], Fixed(tag, i), 3);
        }
    }

    [Fact]
    public void The_three_primaries_add_up_to_white()
    {
        for (var i = 0; i < 3; i++) Assert.Equal(D50[i], Fixed("rXYZ", i) + Fixed("gXYZ", i) + Fixed("bXYZ", i), 3);
    }

    [Fact]
    public void The_profile_says_its_own_length() =>
        Assert.Equal(ColourProfile.Srgb.Length, BinaryPrimitives.ReadInt32BigEndian(ColourProfile.Srgb));

    private static double Fixed(string tag, int index)
    {
        var profile = ColourProfile.Srgb;
        for (var i = 0; i < BinaryPrimitives.ReadInt32BigEndian(profile.AsSpan(128)); i++)
        {
            var entry = profile.AsSpan(132 + (12 * i), 12);
            if (System.Text.Encoding.ASCII.GetString(entry[..4]) != tag) continue;
            return BinaryPrimitives.ReadInt32BigEndian(profile.AsSpan(BinaryPrimitives.ReadInt32BigEndian(entry[4..]) + 8 + (4 * index))) / 65536.0;
        }
        throw new InvalidDataException($"The profile has no tag {tag}.");
    }

    private static double[] Times(double[,] m, double[] v) => [.. Enumerable.Range(0, 3).Select(r => (m[r, 0] * v[0]) + (m[r, 1] * v[1]) + (m[r, 2] * v[2]))];

    // Cramer's rule.
    private static double[] Solve(double[,] m, double[] v)
    {
        static double Det(double[,] a) => (a[0, 0] * ((a[1, 1] * a[2, 2]) - (a[1, 2] * a[2, 1])))
            - (a[0, 1] * ((a[1, 0] * a[2, 2]) - (a[1, 2] * a[2, 0]))) + (a[0, 2] * ((a[1, 0] * a[2, 1]) - (a[1, 1] * a[2, 0])));
        var result = new double[3];
        for (var c = 0; c < 3; c++)
        {
            var swapped = (double[,])m.Clone();
            for (var r = 0; r < 3; r++) swapped[r, c] = v[r];
            result[c] = Det(swapped) / Det(m);
        }
        return result;
    }
}
