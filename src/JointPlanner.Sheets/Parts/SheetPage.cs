using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;

namespace JointPlanner.Sheets.Parts;

/// <summary>What every part of a sheet is written from, and how it writes numbers.</summary>
internal sealed record SheetPage(Result Result, SheetFacts Facts, DisplayProfile Profile, PaperSize Paper)
{
    /// <summary>The plan.</summary>
    public Plan Plan => Result.Plan;

    /// <summary>A number without its unit.</summary>
    public string Number(Quantity quantity, double si) => NumberText.Of(si, quantity, Profile, NumberStyle.Sheet);

    /// <summary>A number with its unit.</summary>
    public string WithUnit(Quantity quantity, double si) => NumberText.WithUnit(si, quantity, Profile, NumberStyle.Sheet);

    /// <summary>An opening as it is measured.</summary>
    public string Opening(double si) => SetValueText.Of(si, Profile, NumberStyle.Sheet);

    /// <summary>The unit of a kind of quantity.</summary>
    public string Unit(Quantity quantity) => Profile[quantity].Unit.Name;

    /// <summary>What the drawing calls a thing, or its id.</summary>
    public static string MarkOf(string mark, string id) => mark.Length > 0 ? mark : id;

    /// <summary>A reference to a step.</summary>
    public static string StepOf(Number number) => number.Step < 0 ? "" : FormattableString.Invariant($"[{number.Step + 1}]");
}
