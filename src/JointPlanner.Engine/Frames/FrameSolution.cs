namespace JointPlanner.Engine.Frames;

/// <summary>Displacements of a frame under one load, and how well they balance.</summary>
/// <param name="Model">The frame.</param>
/// <param name="Displacements">By freedom, m or rad.</param>
/// <param name="Ground">Given movements of the ground.</param>
/// <param name="Residual">Largest out-of-balance relative to the largest term of its kind.</param>
/// <param name="RefinementChange">Largest change by one step of iterative refinement, relative to the largest displacement of its kind.</param>
public sealed record FrameSolution(FrameModel Model, double[] Displacements, double[] Ground, double Residual, double RefinementChange)
{
    /// <summary>Displacement of a point along the deck, positive up-station.</summary>
    public double Of(Node node) => Displacements[node.First];

    /// <summary>Displacement of a point in a direction.</summary>
    public double Of(Node node, Direction direction) => Displacements[node.In(direction)];

    /// <summary>Value of a response.</summary>
    public double Of(Response response) =>
        response.Freedoms.Sum(f => f.Factor * Displacements[f.Freedom]) + response.Given.Sum(g => g.Share * Ground[g.Given]);

    /// <summary>Axial force in a member, tension positive, N.</summary>
    public double ForceIn(Member member, double freeStrain) =>
        member.AxialStiffness * (((Of(member.To) - Of(member.From)) / member.Length) - freeStrain);
}
