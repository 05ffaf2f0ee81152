using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Plans;
using JointPlanner.Exchange.Printing;
using JointPlanner.Exchange.Quantities;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>One field of the plan: a text field for what is typed, a choice where only certain words may stand. What it is comes from the table of fields.</summary>
public sealed partial class PlanField
{
    private Field? asked;

    /// <summary>Path in the plan.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>Label; the field's own name where empty.</summary>
    [Parameter]
    public string Label { get; set; } = "";

    /// <summary>True where the hint is shown below.</summary>
    [Parameter]
    public bool ShowHint { get; set; }

    /// <summary>Further style classes.</summary>
    [Parameter]
    public string Class { get; set; } = "";

    private string Id => $"f-{Path.Replace('/', '-')}";

    private string Text => Bench.Document.TextAt(Path) ?? "";

    private string LabelText => Label.Length > 0 ? Label : asked?.Name ?? Path;

    private bool IsRequired => asked?.IsRequired ?? false;

    private string Placeholder => asked?.Default is { } standsIn ? $"{standsIn} (default)" : "";

    private string EmptyChoice => asked?.Default is { } standsIn ? $"{standsIn} (default)" : IsRequired ? "choose" : asked?.Entry is FalseEntry ? "by its factor" : "as the code says";

    private string HintText => ShowHint && Text.Length == 0 && asked is { Hint.Length: > 0 } ? $"for instance {asked.Hint}" : "";

    private IReadOnlyList<Fault> Faults => [.. Bench.Outcome.Reading.At(Path)];

    private string Understood
    {
        get
        {
            if (asked?.Entry is not QuantityEntry entry || Text.Length == 0) return "";
            var read = QuantityText.Parse(Text, entry.Kind);
            var shown = Profile[entry.Kind].Unit;
            return read.Fault is null && read.Unit != shown ? Exchange.Printing.NumberText.WithUnit(read.Value, entry.Kind, Profile) : "";
        }
    }

    /// <inheritdoc/>
    protected override void OnParametersSet() => asked = PlanFields.Table.At(Path);

    private Task Write(string text) => Bench.Write(Path, text);

    private Task Choose(ChangeEventArgs choice) => Bench.Write(Path, choice.Value as string);
}
