namespace JointPlanner.Engine.Formulas;

/// <summary>
/// What kind of thing a number is. The kind fixes the dimension, and it is by kind that a display profile picks unit and digits:
/// a deck's length and a gap are both lengths, but nobody reads them in the same unit.
/// </summary>
public sealed class Quantity
{
    private static readonly List<Quantity> Kinds = [];

    private Quantity(string id, Dimension dimension, bool isReading = false)
    {
        (Id, Dimension, IsReading) = (id, dimension, isReading);
        Kinds.Add(this);
    }

    /// <summary>Permanent word for the kind, as used in files and profiles.</summary>
    public string Id { get; }

    /// <summary>The physical dimension; values are held in the coherent SI unit of it.</summary>
    public Dimension Dimension { get; }

    /// <summary>True for a temperature reading (°C on a scale with an offset), false for differences and everything else.</summary>
    public bool IsReading { get; }

    /// <summary>Every kind there is.</summary>
    public static IReadOnlyList<Quantity> All => Kinds;

    private static readonly Dimension Metre = new(1);
    private static readonly Dimension Newton = new(1, 1, -2);

    /// <summary>A length along or across the deck, m.</summary>
    public static readonly Quantity Length = new("length", Metre);
    /// <summary>A movement of a joint face or bearing, m.</summary>
    public static readonly Quantity Movement = new("movement", Metre);
    /// <summary>The clear gap of a joint or a limit on it, m.</summary>
    public static readonly Quantity Opening = new("opening", Metre);
    /// <summary>A dimension of a part: seal width, pad thickness, m.</summary>
    public static readonly Quantity Size = new("size", Metre);
    /// <summary>An area of a cross-section, m².</summary>
    public static readonly Quantity Area = new("area", Metre.Power(2));
    /// <summary>A plan area of a bearing or pad, m².</summary>
    public static readonly Quantity PlanArea = new("plan-area", Metre.Power(2));
    /// <summary>A second moment of area, m⁴.</summary>
    public static readonly Quantity Inertia = new("inertia", Metre.Power(4));
    /// <summary>A temperature on a thermometer, °C.</summary>
    public static readonly Quantity Temperature = new("temperature", new(0, 0, 0, 1), isReading: true);
    /// <summary>A difference of two temperatures, K.</summary>
    public static readonly Quantity TemperatureDifference = new("temperature-difference", new(0, 0, 0, 1));
    /// <summary>A coefficient of thermal expansion, 1/K.</summary>
    public static readonly Quantity Expansion = new("expansion", new(0, 0, 0, -1));
    /// <summary>A strain; shortening is positive where it is a shrinkage or creep strain.</summary>
    public static readonly Quantity Strain = new("strain", Dimension.None);
    /// <summary>An angle in plan, rad.</summary>
    public static readonly Quantity Angle = new("angle", Dimension.None);
    /// <summary>A force, N.</summary>
    public static readonly Quantity Force = new("force", Newton);
    /// <summary>A force per length of movement, N/m.</summary>
    public static readonly Quantity Stiffness = new("stiffness", Newton / Metre);
    /// <summary>A moment per angle, N·m/rad.</summary>
    public static readonly Quantity RotationalStiffness = new("rotational-stiffness", Newton * Metre);
    /// <summary>An axial stiffness EA, N.</summary>
    public static readonly Quantity AxialStiffness = new("axial-stiffness", Newton);
    /// <summary>A stress or modulus, Pa.</summary>
    public static readonly Quantity Stress = new("stress", Newton / Metre.Power(2));
    /// <summary>A movement per degree, m/K.</summary>
    public static readonly Quantity Rate = new("rate", new(1, 0, 0, -1));
    /// <summary>An age or duration, s (shown in days).</summary>
    public static readonly Quantity Age = new("age", new(0, 0, 1));
    /// <summary>A plain number: a factor, a share.</summary>
    public static readonly Quantity Ratio = new("ratio", Dimension.None);
    /// <summary>A whole number of things.</summary>
    public static readonly Quantity Count = new("count", Dimension.None);
    /// <summary>A flexibility, m/N.</summary>
    public static readonly Quantity Flexibility = new("flexibility", Metre / Newton);

    /// <summary>A load per length of deck, or a longitudinal shear per length, N/m.</summary>
    public static readonly Quantity LineLoad = new("line-load", Newton / Metre);
    /// <summary>A moment, N·m.</summary>
    public static readonly Quantity Moment = new("moment", Newton * Metre);
    /// <summary>A bending stiffness EI, N·m².</summary>
    public static readonly Quantity BendingStiffness = new("bending-stiffness", Newton * Metre.Power(2));
    /// <summary>A curvature, 1/m: change of rotation per length, positive when the underside lengthens.</summary>
    public static readonly Quantity Curvature = new("curvature", Metre.Power(-1));
    /// <summary>A rotation of deck, pier or bearing, rad, positive when the deck rises up-station.</summary>
    public static readonly Quantity Rotation = new("rotation", Dimension.None);
    /// <summary>A change of temperature per depth, K/m.</summary>
    public static readonly Quantity TemperatureGradient = new("temperature-gradient", new(-1, 0, 0, 1));
    /// <summary>An axial stiffness times a coefficient of expansion, N/K: force per degree of a fully held section.</summary>
    public static readonly Quantity StiffnessPerDegree = new("stiffness-per-degree", new(1, 1, -2, -1));
    /// <summary>A force per length of deck for a unit of slip, N/m².</summary>
    public static readonly Quantity ConnectionStiffness = new("connection-stiffness", Newton / Metre.Power(2));
    /// <summary>A movement for a unit of load per length, m²/N.</summary>
    public static readonly Quantity InfluenceArea = new("influence-area", Metre.Power(2) / Newton);

    /// <inheritdoc/>
    public override string ToString() => Id;
}
