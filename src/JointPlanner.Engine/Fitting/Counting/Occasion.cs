namespace JointPlanner.Engine.Fitting.Counting;

/// <summary>
/// On which occasion movements are counted. The doubt about the temperature at setting is treated once in each: by an allowance of
/// degrees before the day, by the reserve U of the measured temperature on the day.
/// </summary>
public enum Occasion
{
    /// <summary>Choosing a size before the day: the code's coefficient of expansion, both ends of the temperature widened by the doubt allowance.</summary>
    Sizing,
    /// <summary>The window of the day: temperature measured, no doubt allowance, the larger of the code's coefficient and the best estimate.</summary>
    Setting,
}
