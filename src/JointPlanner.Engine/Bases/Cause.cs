namespace JointPlanner.Engine.Bases;

/// <summary>Causes of movement: the rows of the counting table.</summary>
public enum Cause
{
    /// <summary>Uniform temperature change.</summary>
    UniformTemperature,
    /// <summary>Creep still to come.</summary>
    Creep,
    /// <summary>Shrinkage still to come.</summary>
    Shrinkage,
    /// <summary>Vertical temperature difference.</summary>
    TemperatureDifference,
    /// <summary>Prestress still to be applied.</summary>
    Prestress,
    /// <summary>Dead load still to be placed.</summary>
    DeadLoad,
    /// <summary>Traffic: end rotation and sway.</summary>
    LiveLoad,
    /// <summary>Braking and acceleration.</summary>
    Braking,
    /// <summary>Wind.</summary>
    Wind,
    /// <summary>Movement of the substructure: settlement, tilt, pavement and embankment push.</summary>
    Substructure,
    /// <summary>Friction of sliding bearings.</summary>
    Friction,
    /// <summary>Clearance of bearings and guides.</summary>
    Clearance,
    /// <summary>Earthquake.</summary>
    Seismic,
}

/// <summary>By what a movement is judged: the columns of the counting table.</summary>
public enum Column
{
    /// <summary>Gap in service.</summary>
    GapService,
    /// <summary>Gap at strength.</summary>
    GapStrength,
    /// <summary>Range of the seal.</summary>
    SealRange,
    /// <summary>Movement along the joint line.</summary>
    Racking,
    /// <summary>Travel of a bearing.</summary>
    BearingTravel,
    /// <summary>Rotation of a bearing.</summary>
    BearingRotation,
    /// <summary>Force by which a restraint holds the deck.</summary>
    RestraintForce,
}
