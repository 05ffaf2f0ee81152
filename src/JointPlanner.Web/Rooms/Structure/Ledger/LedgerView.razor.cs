using JointPlanner.Drawings;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pictures.Svg;

namespace JointPlanner.Web.Rooms.Structure.Ledger;

/// <summary>The elevation with the ledger's bands below it; columns stand under what they belong to.</summary>
public sealed partial class LedgerView
{
    private Elevation? drawn;
    private LedgerGrid? grid;
    private string svg = "", phoneSvg = "";
    private (Plan? Plan, Result? Result, DisplayProfile? Profile) drawnFrom;

    /// <inheritdoc/>
    protected override void OnParametersSet() => Draw();

    /// <inheritdoc/>
    protected override bool ShouldRender()
    {
        Draw();
        return true;
    }

    private void Draw()
    {
        if (Bench.Drawn is not { } plan || (ReferenceEquals(plan, drawnFrom.Plan) && ReferenceEquals(Bench.Result, drawnFrom.Result) && Profile == drawnFrom.Profile)) return;
        drawnFrom = (plan, Bench.Result, Profile);
        drawn = Elevation.Of(Request(plan, ElevationPaper.Screen));
        grid = new LedgerGrid(drawn.Columns, ElevationPaper.Screen.ColumnMm);
        svg = SvgWriter.Write(drawn.Picture);
        phoneSvg = SvgWriter.Write(Elevation.Of(Request(plan, ElevationPaper.Phone)).Picture);
    }

    private ElevationRequest Request(Plan plan, ElevationPaper paper) => new()
    {
        Plan = plan,
        Length = m => NumberText.WithUnit(m, Quantity.Length, Profile),
        Paper = paper,
        ZeroMovementPoints = (Bench.Result?.Segments ?? []).Where(s => s.ZeroMovementPoint is not null)
            .ToDictionary(s => s.Segment.Id, s => s.ZeroMovementPoint!.Value.Value),
    };
}
