using CsCheck;
using JointPlanner.Engine.Frames;
using MathNet.Numerics.LinearAlgebra;

namespace JointPlanner.Engine.Tests.Frames;

/// <summary>Against MathNet.Numerics, a general-purpose linear algebra library.</summary>
public sealed class SkylineMatrixTests
{
    private static readonly Gen<(int[] Tops, double[] Entries, double[] Load)> Systems =
        from size in Gen.Int[1, 12]
        from tops in Gen.Int[0, 11].Array[size]
        from entries in Gen.Double[-1, 1].Array[size * size]
        from load in Gen.Double[-10, 10].Array[size]
        select (tops.Select((t, j) => Math.Min(t, j)).ToArray(), entries, load);

    [Fact]
    public void A_solution_equals_that_of_a_general_library() => Systems.Sample(s =>
    {
        var (skyline, dense) = Build(s.Tops, s.Entries);
        var expected = dense.Solve(Vector<double>.Build.DenseOfArray(s.Load));
        var found = skyline.Factor().Solve(s.Load);
        for (var i = 0; i < s.Load.Length; i++) Assert.Equal(expected[i], found[i], 1e-9);
    }, seed: "0000000000001", iter: 2000);

    [Fact]
    public void A_product_equals_that_of_a_general_library() => Systems.Sample(s =>
    {
        var (skyline, dense) = Build(s.Tops, s.Entries);
        var expected = dense * Vector<double>.Build.DenseOfArray(s.Load);
        var found = skyline.Times(s.Load);
        for (var i = 0; i < s.Load.Length; i++) Assert.Equal(expected[i], found[i], 1e-12);
    }, seed: "0000000000001", iter: 500);

    [Fact]
    public void A_chain_without_ground_has_no_pivot_left()
    {
        var matrix = new SkylineMatrix([0, 0, 1]);
        foreach (var (i, j) in new[] { (0, 1), (1, 2) })
        {
            matrix.Add(i, i, 5);
            matrix.Add(j, j, 5);
            matrix.Add(i, j, -5);
        }
        Assert.True(matrix.Factor().PivotRatio < FrameSolver.MechanismRatio);
    }

    /// <summary>A symmetric matrix made positive definite by a dominant diagonal.</summary>
    private static (SkylineMatrix, Matrix<double>) Build(int[] tops, double[] entries)
    {
        var size = tops.Length;
        var skyline = new SkylineMatrix(tops);
        var dense = Matrix<double>.Build.Dense(size, size);
        for (var j = 0; j < size; j++)
            for (var i = tops[j]; i <= j; i++)
            {
                var value = i == j ? size + 1.0 : entries[(i * size) + j];
                skyline.Add(i, j, value);
                dense[i, j] = dense[j, i] = value;
            }
        return (skyline, dense);
    }
}
