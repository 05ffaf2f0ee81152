namespace JointPlanner.Web.Start;

/// <summary>Whether this installation is a demonstration: invented structures, demo persons, sheets marked "not for construction".</summary>
/// <param name="IsOn">True when asked for; start-up has then made sure of Development and loopback.</param>
public sealed record DemoMode(bool IsOn)
{
    internal static DemoMode From(IConfiguration configuration) => new(configuration.GetValue("Demo:Enabled", false));
}
