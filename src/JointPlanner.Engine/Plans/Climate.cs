namespace JointPlanner.Engine.Plans;

/// <summary>Temperatures of the site; which of them are needed depends on the basis. Readings in °C, differences in K.</summary>
public sealed record Climate
{
    /// <summary>Where the values come from.</summary>
    public string Source { get; init; } = "";
    /// <summary>Climate zone word of the basis (for instance moderate or cold); empty where not used.</summary>
    public string Zone { get; init; } = "";
    /// <summary>Highest shade air temperature of the return period, °C.</summary>
    public double? ShadeMax { get; init; }
    /// <summary>Lowest shade air temperature of the return period, °C.</summary>
    public double? ShadeMin { get; init; }
    /// <summary>Highest effective bridge temperature given directly, °C.</summary>
    public double? EffectiveMax { get; init; }
    /// <summary>Lowest effective bridge temperature given directly, °C.</summary>
    public double? EffectiveMin { get; init; }
    /// <summary>Warming allowance on the maximum only, K; never raises the minimum.</summary>
    public double Warming { get; init; }
}
