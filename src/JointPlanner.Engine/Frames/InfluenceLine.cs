using System.Collections.Immutable;

namespace JointPlanner.Engine.Frames;

/// <summary>A piece of an influence line between two points of the frame: a cubic in the distance from its start, exact on a piece of one section.</summary>
/// <param name="From">Station of its start, m.</param>
/// <param name="To">Station of its end, m.</param>
/// <param name="C0">Value at the start.</param>
/// <param name="C1">Factor of the distance.</param>
/// <param name="C2">Factor of its square.</param>
/// <param name="C3">Factor of its cube.</param>
public readonly record struct CubicPiece(double From, double To, double C0, double C1, double C2, double C3)
{
    /// <summary>Value at a station within the piece.</summary>
    public double At(double station)
    {
        var t = station - From;
        return C0 + (t * (C1 + (t * (C2 + (t * C3)))));
    }

    /// <summary>A bound on its ordinates.</summary>
    public double Size
    {
        get
        {
            var l = To - From;
            return Math.Abs(C0) + (l * (Math.Abs(C1) + (l * (Math.Abs(C2) + (l * Math.Abs(C3))))));
        }
    }

    /// <summary>Integral from its start to a station within it.</summary>
    public double AreaTo(double station)
    {
        var t = station - From;
        return t * (C0 + (t * ((C1 / 2) + (t * ((C2 / 3) + (t * C3 / 4))))));
    }
}

/// <summary>Where a train of axles stands worst, and what it does there.</summary>
/// <param name="Position">Station of its first axle, m.</param>
/// <param name="Value">Sum of force times ordinate.</param>
public readonly record struct WorstPosition(double Position, double Value);

/// <summary>What a unit of load, wherever it stands on the deck, does to one response. One solution of the frame gives the whole line.</summary>
/// <param name="Pieces">Pieces in station order; between segments there is nothing to stand on.</param>
/// <param name="Residual">Out-of-balance of the solution that it comes from.</param>
public sealed record InfluenceLine(ImmutableArray<CubicPiece> Pieces, double Residual)
{
    /// <summary>Pieces whose ordinates are below this share of the largest are left out: far spans of long decks, which would only cost time.</summary>
    private const double Negligible = 1e-10;

    /// <summary>The line of a response under vertical load, downward positive.</summary>
    public static InfluenceLine Of(Response response, FrameSolver solver, DeckModel deck)
    {
        var adjoint = solver.Solve(new FrameLoad(deck.Model).Adjoint(response));
        ImmutableArray<CubicPiece> pieces = [.. deck.Carriageway.Select(m => Piece(m, adjoint))];
        var least = Negligible * pieces.Select(p => p.Size).DefaultIfEmpty(0).Max();
        return new InfluenceLine([.. pieces.Where(p => p.Size > least)], adjoint.Residual);
    }

    /// <summary>Value at a station; 0 off the deck.</summary>
    public double At(double station) => PieceAt(station)?.At(station) ?? 0;

    /// <summary>Areas above and below zero: what a load per length does on its adverse and on its relieving lengths. Exact between the roots.</summary>
    public (double Positive, double Negative) Areas()
    {
        var (positive, negative) = (0.0, 0.0);
        foreach (var piece in Pieces)
        {
            var from = piece.From;
            foreach (var to in CubicRoots.Within(piece.C0, piece.C1, piece.C2, piece.C3, piece.To - piece.From).Select(t => piece.From + t).Append(piece.To))
            {
                var area = piece.AreaTo(to) - piece.AreaTo(from);
                if (area > 0) positive += area;
                else negative += area;
                from = to;
            }
        }
        return (positive, negative);
    }

    /// <summary>Where a train stands worst. Axles that are off the deck do nothing.</summary>
    /// <param name="axles">Force of every axle and its distance behind the first, which stands at the position.</param>
    /// <param name="positive">True for the largest value, false for the smallest.</param>
    public WorstPosition Worst(IReadOnlyList<(double Force, double Behind)> axles, bool positive)
    {
        var worst = new WorstPosition(Pieces.IsEmpty ? 0 : Pieces[0].From, 0);
        double[] stops = [.. axles.SelectMany(a => Pieces.SelectMany(p => new[] { p.From + a.Behind, p.To + a.Behind })).Distinct().Order()];
        for (var i = 0; i < stops.Length; i++)
        {
            Try(stops[i]);
            if (i + 1 < stops.Length)
                foreach (var at in Flat(axles, stops[i], stops[i + 1])) Try(at);
        }
        return worst;

        void Try(double position)
        {
            var value = axles.Sum(a => a.Force * At(position - a.Behind));
            if (positive ? value > worst.Value : value < worst.Value) worst = new WorstPosition(position, value);
        }
    }

    /// <summary>Positions between two stops at which the sum over the axles is flat: between stops it is one cubic.</summary>
    private IEnumerable<double> Flat(IReadOnlyList<(double Force, double Behind)> axles, double start, double end)
    {
        var (b, c, d) = (0.0, 0.0, 0.0);
        var middle = (start + end) / 2;
        foreach (var (force, behind) in axles)
        {
            if (PieceAt(middle - behind) is not { } piece) continue;
            var t = start - behind - piece.From;
            b += force * (piece.C1 + (t * ((2 * piece.C2) + (t * 3 * piece.C3))));
            c += force * (piece.C2 + (t * 3 * piece.C3));
            d += force * piece.C3;
        }
        return CubicRoots.Within(b, 2 * c, 3 * d, 0, end - start).Select(t => start + t);
    }

    private CubicPiece? PieceAt(double station)
    {
        var (low, high) = (0, Pieces.Length - 1);
        while (low <= high)
        {
            var middle = (low + high) / 2;
            if (station < Pieces[middle].From) high = middle - 1;
            else if (station > Pieces[middle].To) low = middle + 1;
            else return Pieces[middle];
        }
        return null;
    }

    private static CubicPiece Piece(Member m, FrameSolution adjoint)
    {
        // Betti: the deflection under a unit of the response is the response under a unit of load; downward load counts positive.
        var (w1, w2) = (-adjoint.Of(m.From, Direction.Vertical), -adjoint.Of(m.To, Direction.Vertical));
        var (s1, s2, l) = (-adjoint.Of(m.From, Direction.Turning), -adjoint.Of(m.To, Direction.Turning), m.Length);
        return new CubicPiece(m.From.Station, m.To.Station, w1, s1,
            ((3 * (w2 - w1) / l) - (2 * s1) - s2) / l, ((2 * (w1 - w2) / l) + s1 + s2) / (l * l));
    }
}
