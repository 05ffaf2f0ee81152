using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting;

/// <summary>Joints of worked examples, as demands.</summary>
internal static class PublishedJoints
{
    /// <summary>From memory, check against the licensed text: WSDOT BDM 9.1.3, concrete box girder of 200 ft, half to each abutment, skew 15°, 0 to 100 °F, α 6.0e-6 per °F, β 0.0002, μ 0.8.</summary>
    public static JointDemand CompressionSeal200Ft(Derivation d) => Demand(d, Joint(F(64), Degrees(15)),
        [Thermal(d, PerF(6.0e-6) * In(1200), F(0), F(100))],
        Other(d, Cause.Shrinkage, 0.0002 * 0.8 * In(1200)));

    /// <summary>The owner's rules of that example: 40 to 85 % of the width, 60 % at 64 °F, racking 22 % of the width as the total range, sizes in ½ in steps.</summary>
    public static OwnerRuleSet CompressionSealRules() => Owner(Family("compression-seal",
        [("least-width-share", 0.40), ("greatest-width-share", 0.85), ("set-width-share", 0.60), ("greatest-racking-share", 0.22)],
        [.. Enumerable.Range(2, 11).Select(i => ($"{i / 2.0:0.0} in", new[] { ("width", In(i / 2.0)) }))])) with
    {
        SettingRule = new FixedReference(F(64), null),
        RackingIsTotalRange = true,
    };

    /// <summary>Inputs published (seen): Colorado DOT Bridge Design Manual, Appendix A Example 5, Jan 2018: expansion length 150 ft, skew 20°, α 6.0e-6 per °F, creep and shrinkage 0.0002, −10 to 110 °F.</summary>
    public static JointDemand StripSeal300Ft(Derivation d, double temperatureUncertainty = 0) => Demand(d,
        Joint(F(60), Degrees(20)) with { TemperatureUncertainty = temperatureUncertainty },
        [Thermal(d, PerF(6.0e-6) * In(1800), F(-10), F(110))],
        Other(d, Cause.Shrinkage, 0.0002 * In(1800)));

    /// <summary>The same source: cold opening at most 4.00 in, hot at least 0.50 in, at installation at least 1.50 in, all normal.</summary>
    public static OwnerRuleSet StripSealRules() => Owner(Family("strip-seal",
        [("least-opening", In(0.50)), ("least-installation-opening", In(1.50))], ("4 in", [("greatest-opening", In(4.00))])));
}
