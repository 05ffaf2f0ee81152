namespace JointPlanner.Architecture.Tests.Planted.Frames;

/// <summary>Stands for the frame's solver: what no hand check may lean on.</summary>
public class Solver
{
    public static int Solve() => 42;
}

/// <summary>Stands for the frame's results.</summary>
public sealed record Result(int Unknowns);
