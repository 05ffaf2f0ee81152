using JointPlanner.Drawings;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Pictures.Svg;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>The deck of a beginning, drawn as far as it can be.</summary>
public sealed partial class DeckPreview
{
    private string svg = "", phoneSvg = "";
    private (PlanBeginning? Of, DisplayProfile? Profile) drawn;

    /// <summary>What was typed so far.</summary>
    [Parameter, EditorRequired]
    public PlanBeginning Beginning { get; set; } = null!;

    /// <summary>Words that a plan may use.</summary>
    [Parameter, EditorRequired]
    public KnownWords Known { get; set; } = null!;

    /// <summary>Units shown.</summary>
    [Parameter, EditorRequired]
    public DisplayProfile Profile { get; set; } = null!;

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        var now = Beginning.ForDrawing();
        if (drawn == (now, Profile)) return;
        drawn = (now, Profile);
        var plan = new PlanReader(Known).Read(now.ToDocument()).Plan;
        svg = plan is null ? "" : Draw(plan, ElevationPaper.Screen);
        phoneSvg = plan is null ? "" : Draw(plan, ElevationPaper.Phone);
    }

    private string Draw(Engine.Plans.Plan plan, ElevationPaper paper) =>
        SvgWriter.Write(Elevation.Of(new ElevationRequest { Plan = plan, Length = m => NumberText.WithUnit(m, Quantity.Length, Profile), Paper = paper }).Picture);
}
