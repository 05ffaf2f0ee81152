using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Setting;

/// <summary>How far the temperature may still change between setting a joint and fixing its second edge.</summary>
public static class AllowedDrift
{
    /// <summary>The change of temperature in the direction forecast, K; negative where the opening is already too near that end; null where temperature does not move the joint.</summary>
    /// <param name="asSet">Normal opening as it was set, m.</param>
    /// <param name="least">G_lo at the temperature of setting, m.</param>
    /// <param name="greatest">G_hi at the temperature of setting, m.</param>
    /// <param name="reserve">U, m.</param>
    /// <param name="rate">k, m/K, positive when warming closes.</param>
    /// <param name="isWarming">True when warming is forecast.</param>
    /// <remarks>When it warms, a window that closes with warming moves down, and a held opening comes nearer to its upper end.</remarks>
    public static double? Of(double asSet, double least, double greatest, double reserve, double rate, bool isWarming) => rate == 0
        ? null
        : SettingFormulas.Drift.Compute(isWarming == rate > 0 ? greatest - asSet : asSet - least, reserve, rate);
}
