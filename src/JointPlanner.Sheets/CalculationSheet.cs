using JointPlanner.Engine;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pdf;
using JointPlanner.Sheets.Parts;

namespace JointPlanner.Sheets;

/// <summary>The calculation sheet: one document for one revision of one structure, from the title block to the last step.</summary>
public static class CalculationSheet
{
    /// <summary>The document, ready for the writer.</summary>
    /// <param name="result">What was computed.</param>
    /// <param name="facts">Whose it is and on what it rests.</param>
    /// <param name="profile">Units and digits.</param>
    /// <param name="paper">Paper.</param>
    public static Document Of(Result result, SheetFacts facts, DisplayProfile profile, PaperSize paper)
    {
        var page = new SheetPage(result, facts, profile, paper);
        var structure = result.Plan.Structure;
        return new Document
        {
            Title = $"{structure.Number} {structure.Name}: movements of joints and bearings",
            Author = facts.Designer.Length > 0 ? facts.Designer : facts.Organisation,
            Program = facts.Program,
            Date = facts.Date,
            Paper = paper,
            Head = new RunningLine($"{structure.Number} {structure.Name}", $"Revision {facts.Revision}"),
            Foot = $"{facts.Program} · package {SheetFacts.Digest(facts.Package)[..16]}…",
            Watermark = facts.Watermark,
            Blocks =
            [
                .. TitlePart.Of(page), .. SchedulePart.Of(page), .. SettingPart.Of(page), .. MovementPart.Of(page), .. FitPart.Of(page),
                .. BearingPart.Of(page), .. AssumptionPart.Of(page), .. ModelPart.Of(page), .. StepPart.Of(page),
            ],
            Attachments =
            [
                new("calculation.json", "application/json", facts.Package, AttachmentRelation.Source, "everything that can change a number of this calculation"),
                new("results.json", "application/json", facts.Results, AttachmentRelation.Data, "every result by its key, in SI units"),
            ],
        };
    }
}
