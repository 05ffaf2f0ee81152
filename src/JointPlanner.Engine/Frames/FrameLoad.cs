namespace JointPlanner.Engine.Frames;

/// <summary>What acts on a frame: forces on its freedoms, free strains of its members as the forces that would hold them, movements of the ground.</summary>
/// <param name="model">The frame.</param>
public sealed class FrameLoad(FrameModel model)
{
    /// <summary>Force on every freedom, N or N·m.</summary>
    public double[] Forces { get; } = new double[model.Freedoms];

    /// <summary>Given movements of the ground, m or rad.</summary>
    public double[] Ground { get; } = new double[model.GivenMovements.Length];

    /// <summary>A free strain and curvature of every member of a body, lengthening positive, curvature positive when the underside lengthens.</summary>
    public FrameLoad Strained(string body, double strain, double curvature = 0)
    {
        foreach (var m in model.Members)
        {
            if (m.Body != body || m.IsUpright) continue;
            var force = m.AxialStiffness * strain;
            Forces[m.From.In(Direction.Along)] -= force;
            Forces[m.To.In(Direction.Along)] += force;
            if (curvature == 0 || m.BendingStiffness == 0) continue;
            Forces[m.From.In(Direction.Turning)] -= m.BendingStiffness * curvature;
            Forces[m.To.In(Direction.Turning)] += m.BendingStiffness * curvature;
        }
        return this;
    }

    /// <summary>A load per length on a body between two stations, N/m, positive downward.</summary>
    public FrameLoad Uniform(string body, double load, double start, double end)
    {
        foreach (var m in model.Members)
        {
            if (m.Body != body || m.IsUpright || m.BendingStiffness == 0 || m.From.Station < start - Touching || m.To.Station > end + Touching) continue;
            var (half, end6) = (load * m.Length / 2, load * m.Length * m.Length / 12);
            Forces[m.From.In(Direction.Vertical)] -= half;
            Forces[m.To.In(Direction.Vertical)] -= half;
            Forces[m.From.In(Direction.Turning)] -= end6;
            Forces[m.To.In(Direction.Turning)] += end6;
        }
        return this;
    }

    /// <summary>A force per length along a body at a height above its neutral axis, N/m, positive up-station.</summary>
    public FrameLoad Along(string body, double load, double height)
    {
        foreach (var m in model.Members)
        {
            if (m.Body != body || m.IsUpright) continue;
            Forces[m.From.In(Direction.Along)] += load * m.Length / 2;
            Forces[m.To.In(Direction.Along)] += load * m.Length / 2;
            if (m.BendingStiffness == 0) continue;
            // A moment −load·height per length, whose work is its sum times the difference of the deflections.
            Forces[m.From.In(Direction.Vertical)] += load * height;
            Forces[m.To.In(Direction.Vertical)] -= load * height;
        }
        return this;
    }

    /// <summary>A movement of the ground by its number, m or rad.</summary>
    public FrameLoad Moved(int given, double movement)
    {
        Ground[given] += movement;
        return this;
    }

    /// <summary>A unit of what a response measures: its solution holds the influence of every force on the response.</summary>
    public FrameLoad Adjoint(Response response)
    {
        foreach (var (freedom, factor) in response.Freedoms) Forces[freedom] += factor;
        return this;
    }

    /// <summary>Stations closer than this are the same, m.</summary>
    private const double Touching = 1e-9;
}
