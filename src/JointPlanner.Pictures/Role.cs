namespace JointPlanner.Pictures;

/// <summary>
/// What a drawn element stands for. The set is closed: a screen styles each role for light and dark, a sheet prints each in greys.
/// </summary>
public enum Role
{
    /// <summary>The superstructure.</summary>
    Deck,

    /// <summary>A pier, abutment, pylon or foundation.</summary>
    Support,

    /// <summary>The ground line.</summary>
    Ground,

    /// <summary>A water level.</summary>
    Water,

    /// <summary>A main cable, hanger or stay.</summary>
    Cable,

    /// <summary>A movement joint.</summary>
    Joint,

    /// <summary>A bearing.</summary>
    Bearing,

    /// <summary>A dimension line with its number.</summary>
    Dimension,

    /// <summary>An axis of a diagram, with its ticks.</summary>
    Axis,

    /// <summary>A thin line that only leads the eye: a grid or a guide.</summary>
    Guide,

    /// <summary>A line of results in a diagram.</summary>
    Curve,

    /// <summary>A limit that must not be passed.</summary>
    Limit,

    /// <summary>A hatched area.</summary>
    Hatch,

    /// <summary>A marked place: a reading, a zero-movement point, the present temperature.</summary>
    Marker,

    /// <summary>Words beside the drawing.</summary>
    Label,
}
