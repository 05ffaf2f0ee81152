using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Exchange.Printing;

/// <summary>The trade's word for each thing that the engine keeps as an enumeration; the same on console, screen and sheet.</summary>
public static class Words
{
    /// <summary>A cause of movement.</summary>
    public static string Of(Cause cause) => cause switch
    {
        Cause.UniformTemperature => "uniform temperature",
        Cause.Creep => "creep",
        Cause.Shrinkage => "shrinkage",
        Cause.TemperatureDifference => "temperature difference",
        Cause.Prestress => "prestress still to come",
        Cause.DeadLoad => "dead load still to come",
        Cause.LiveLoad => "live load",
        Cause.Braking => "braking",
        Cause.Wind => "wind",
        Cause.Substructure => "movement of the substructure",
        Cause.Friction => "effect of friction",
        Cause.Clearance => "clearance",
        Cause.Seismic => "earthquake",
        _ => throw new ArgumentOutOfRangeException(nameof(cause)),
    };

    /// <summary>By what a movement is judged.</summary>
    public static string Of(Column column) => column switch
    {
        Column.GapService => "gap in service",
        Column.GapStrength => "gap at strength",
        Column.SealRange => "range of the seal",
        Column.Racking => "racking",
        Column.BearingTravel => "bearing travel",
        Column.BearingRotation => "bearing rotation",
        Column.RestraintForce => "restraint force",
        _ => throw new ArgumentOutOfRangeException(nameof(column)),
    };

    /// <summary>In which direction a gap is measured.</summary>
    public static string Of(Measure measure) => measure switch
    {
        Measure.Normal => "normal to the joint",
        Measure.Along => "along the road",
        _ => throw new ArgumentOutOfRangeException(nameof(measure)),
    };

    /// <summary>What a deck is made of.</summary>
    public static string Of(DeckKind kind) => kind switch
    {
        DeckKind.Concrete => "concrete",
        DeckKind.Composite => "composite",
        DeckKind.Steel => "steel",
        _ => throw new ArgumentOutOfRangeException(nameof(kind)),
    };

    /// <summary>What a bearing line does along the deck.</summary>
    public static string Of(BearingKind kind) => kind switch
    {
        BearingKind.Fixed => "fixed",
        BearingKind.Free => "free",
        BearingKind.Elastomeric => "elastomeric",
        BearingKind.Monolithic => "built in",
        _ => throw new ArgumentOutOfRangeException(nameof(kind)),
    };

    /// <summary>In which way a point of the frame moves.</summary>
    public static string Of(Direction direction) => direction switch
    {
        Direction.Along => "along",
        Direction.Vertical => "vertical",
        Direction.Turning => "turning",
        _ => throw new ArgumentOutOfRangeException(nameof(direction)),
    };

    /// <summary>What a support line is.</summary>
    public static string Of(SupportKind kind) => kind switch
    {
        SupportKind.Abutment => "abutment",
        SupportKind.Pier => "pier",
        SupportKind.Tower => "tower",
        _ => throw new ArgumentOutOfRangeException(nameof(kind)),
    };

    /// <summary>How the doubt about the temperature at setting is treated.</summary>
    public static string Of(SettingDoubt doubt) => doubt switch
    {
        SettingDoubt.None => "no allowance for the doubt about the setting temperature",
        SettingDoubt.Specified => "setting temperature specified",
        SettingDoubt.Unspecified => "setting temperature not specified",
        _ => throw new ArgumentOutOfRangeException(nameof(doubt)),
    };

    /// <summary>How safety is put on thermal movement.</summary>
    public static string Of(SafetyFormat format) => format switch
    {
        SafetyFormat.None => "no safety format beyond the basis's factors",
        SafetyFormat.Degrees => "safety by degrees added at both ends",
        SafetyFormat.Factor => "safety by a factor on the movement",
        _ => throw new ArgumentOutOfRangeException(nameof(format)),
    };
}
