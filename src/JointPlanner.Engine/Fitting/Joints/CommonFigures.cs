using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Figures that mean the same in every family.</summary>
internal static class CommonFigures
{
    public static readonly FamilyFigure GreatestSkew =
        new("greatest-skew", Quantity.Angle, false, "greatest skew of the joint line") { Symbol = "β_max" };

    public static readonly FamilyFigure GreatestRacking =
        new("greatest-racking", Quantity.Movement, false, "greatest movement along the joint line")
        { Symbol = "R_max", JudgedBy = Column.Racking };

    public static readonly FamilyFigure LeastInstallationOpening =
        new("least-installation-opening", Quantity.Opening, false, "least opening at which the joint can be put in")
        { Symbol = "G_i,min", Measure = Measure.Normal };

    public static readonly FamilyFigure GreatestInstallationOpening =
        new("greatest-installation-opening", Quantity.Opening, false, "greatest opening at which the joint can be put in")
        { Symbol = "G_i,max", Measure = Measure.Normal };

    public static readonly FamilyFigure ReferenceOpening =
        new("reference-opening", Quantity.Opening, false, "opening at the owner's reference temperature, where the set value goes by one")
        { Symbol = "G_ref", Measure = Measure.Normal };
}
