namespace JointPlanner.Engine.Frames;

/// <summary>
/// A symmetric matrix held column by column from its first non-zero row down to the diagonal, and its factorisation K = L·D·Lᵀ.
/// Nodes in station order keep the columns short.
/// </summary>
public sealed class SkylineMatrix
{
    private readonly double[][] columns;
    private readonly int[] tops;

    /// <summary>A zero matrix whose column j begins at row <paramref name="tops"/>[j].</summary>
    public SkylineMatrix(int[] tops)
    {
        this.tops = tops;
        columns = [.. tops.Select((top, j) => new double[j - top + 1])];
    }

    /// <summary>Number of rows.</summary>
    public int Size => tops.Length;

    /// <summary>Adds to the entry at row i, column j (and by symmetry j, i).</summary>
    public void Add(int i, int j, double value)
    {
        if (i > j) (i, j) = (j, i);
        columns[j][i - tops[j]] += value;
    }

    /// <summary>K·x.</summary>
    public double[] Times(double[] x)
    {
        var y = new double[Size];
        for (var j = 0; j < Size; j++)
        {
            for (var i = tops[j]; i < j; i++)
            {
                var k = columns[j][i - tops[j]];
                y[i] += k * x[j];
                y[j] += k * x[i];
            }
            y[j] += columns[j][j - tops[j]] * x[j];
        }
        return y;
    }

    /// <summary>Row by row the sum of the sizes of the terms of K·x: what an out-of-balance is measured against.</summary>
    public double[] SizesOfTerms(double[] x)
    {
        var y = new double[Size];
        for (var j = 0; j < Size; j++)
        {
            for (var i = tops[j]; i < j; i++)
            {
                var k = Math.Abs(columns[j][i - tops[j]]);
                y[i] += k * Math.Abs(x[j]);
                y[j] += k * Math.Abs(x[i]);
            }
            y[j] += Math.Abs(columns[j][j - tops[j]] * x[j]);
        }
        return y;
    }

    /// <summary>The factorisation. The matrix itself is left as it is, so that residuals are measured against it.</summary>
    public SkylineFactor Factor()
    {
        var factor = new double[Size][];
        var pivots = new double[Size];
        for (var j = 0; j < Size; j++)
        {
            var column = (double[])columns[j].Clone();
            factor[j] = column;
            for (var i = tops[j]; i < j; i++)
            {
                var from = Math.Max(tops[i], tops[j]);
                for (var k = from; k < i; k++)
                    column[i - tops[j]] -= factor[i][k - tops[i]] * column[k - tops[j]];
            }
            var pivot = column[j - tops[j]];
            for (var i = tops[j]; i < j; i++)
            {
                var entry = column[i - tops[j]];
                var scaled = pivots[i] == 0 ? 0 : entry / pivots[i];
                pivot -= scaled * entry;
                column[i - tops[j]] = scaled;
            }
            pivots[j] = pivot;
        }
        return new SkylineFactor(factor, tops, pivots, [.. columns.Select((c, j) => c[j - tops[j]])]);
    }
}

/// <summary>A factorised matrix, ready to solve for any number of right-hand sides.</summary>
public sealed class SkylineFactor
{
    private readonly double[][] factor;
    private readonly int[] tops;
    private readonly double[] pivots;

    internal SkylineFactor(double[][] factor, int[] tops, double[] pivots, double[] diagonal)
    {
        (this.factor, this.tops, this.pivots) = (factor, tops, pivots);
        var worst = Enumerable.Range(0, pivots.Length).Select(j => diagonal[j] == 0 ? 0 : pivots[j] / diagonal[j]).ToArray();
        WeakestRow = worst.Length == 0 ? -1 : Array.IndexOf(worst, worst.Min());
        PivotRatio = worst.Length == 0 ? 1 : worst.Min();
    }

    /// <summary>Smallest pivot relative to its own diagonal entry; near zero for a mechanism.</summary>
    public double PivotRatio { get; }

    /// <summary>Row of that pivot; −1 where there is none.</summary>
    public int WeakestRow { get; }

    /// <summary>x of K·x = load.</summary>
    public double[] Solve(double[] load)
    {
        var x = (double[])load.Clone();
        for (var j = 0; j < x.Length; j++)
            for (var i = tops[j]; i < j; i++)
                x[j] -= factor[j][i - tops[j]] * x[i];
        for (var j = 0; j < x.Length; j++) x[j] /= pivots[j];
        for (var j = x.Length - 1; j >= 0; j--)
            for (var i = tops[j]; i < j; i++)
                x[i] -= factor[j][i - tops[j]] * x[j];
        return x;
    }
}
