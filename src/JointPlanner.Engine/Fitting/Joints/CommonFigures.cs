using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>Figures that mean the same in every family.</summary>
internal static class CommonFigures
{
    public static readonly FamilyFigure GreatestSkew =
        new("greatest-skew", Quantity.Angle, false, "greatest skew of the joint line");

    public static readonly FamilyFigure GreatestRacking =
        new("greatest-racking", Quantity.Movement, false, "greatest movement along the joint line") { JudgedBy = Column.Racking };

    public static readonly FamilyFigure LeastInstallationOpening =
        new("least-installation-opening", Quantity.Opening, false, "least opening at which the joint can be put in") { Measure = Measure.Normal };

    public static readonly FamilyFigure GreatestInstallationOpening =
        new("greatest-installation-opening", Quantity.Opening, false, "greatest opening at which the joint can be put in") { Measure = Measure.Normal };

    public static readonly FamilyFigure ReferenceOpening =
        new("reference-opening", Quantity.Opening, false, "opening at the owner's reference temperature, where the set value goes by one")
        {
            Measure = Measure.Normal,
        };
}
