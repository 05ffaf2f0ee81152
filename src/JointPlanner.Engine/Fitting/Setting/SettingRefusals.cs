using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>Why a row gives no value, or another than the owner's rule.</summary>
internal static class SettingRefusals
{
    // A row at the very end of the range, reached through another scale, is off by the last bit.
    private const double LastBit = 1e-9;

    /// <summary>Reasons that need no window.</summary>
    public static Finding? BeforeComputing(Number temperature, JointDemand demand, Derivation derivation)
    {
        var joint = demand.Joint;
        if (RuleOpening.Temperatures(demand, derivation) is { } ends
            && (temperature.Value < ends.Min.Value - LastBit || temperature.Value > ends.Max.Value + LastBit))
            return new Finding("setting-outside-temperatures", Severity.Note, $"joints/{joint.Id}",
                "Do not set at {0}: values are given from {1} to {2} only.",
                [(Quantity.Temperature, temperature.Value), (Quantity.Temperature, ends.Min.Value), (Quantity.Temperature, ends.Max.Value)]);
        if (demand.DeckAge is { } age && joint.LeastAge is { } least && age < least)
            return new Finding("setting-too-young", Severity.Note, $"joints/{joint.Id}",
                "Do not set at a deck age of {0}: the joint may be set from {1} on.", [(Quantity.Age, age), (Quantity.Age, least)]);
        return null;
    }

    /// <summary>The joint is too small.</summary>
    public static Finding NoWindow(JointDemand demand, SettingRow row) => Of(demand, "setting-no-window",
        "Do not set at {0}: the opening would have to be at least {1} and at most {2}. The joint is too small for this temperature and deck age.",
        row, row.Window!.Least.Value, row.Window.Greatest.Value);

    /// <summary>The window has no room for the reserve.</summary>
    public static Finding TooNarrow(JointDemand demand, SettingRow row) => Of(demand, "setting-window-too-narrow",
        "Do not set at {0}: from {1} to {2} there is no tolerance left after the reserve of {3} on each side. Measure temperature and gap better, or choose a larger size.",
        row, row.Window!.Least.Value, row.Window.Greatest.Value, row.Reserve!.Value.Value);

    /// <summary>The owner's rule misses the window.</summary>
    public static Finding RuleOutside(JointDemand demand, SettingRow row, Number middle) => Of(demand, "setting-rule-outside-window",
        "Do not set at {0} by the owner's rule: it gives {1}, and no value within the window from {2} to {3} is left after the reserve of {4}. The middle of the window would be {5}.",
        row, row.ByRule!.Value.Value, row.Window!.Least.Value, row.Window.Greatest.Value, row.Reserve!.Value.Value, middle.Value);

    /// <summary>The owner's rule goes by a reference opening that nobody gives.</summary>
    public static Finding NoReference(string joint, string family) => new("setting-no-reference", Severity.Warning, $"joints/{joint}",
        $"The owner sets joints by a reference opening, but the rules for {family} give none. The middle of the window is recommended instead.");

    private static Finding Of(JointDemand demand, string id, string template, SettingRow row, params double[] openings) =>
        new(id, Severity.Warning, $"joints/{demand.Joint.Id}", template,
            [(Quantity.Temperature, row.Temperature), .. openings.Select(v => (Quantity.Opening, v))]);
}
