using JointPlanner.Engine.Plans;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Shared;

/// <summary>
/// A field for a quantity with its unit, held as text. What was typed stays as typed, right or wrong; what is wrong stands beside it.
/// </summary>
public sealed partial class QuantityField
{
    private string typed = "";
    private string given = "";

    /// <summary>What the field is, in the trade's word.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

    /// <summary>Path in the plan, or any id that is unique on the page.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>Text as it stands.</summary>
    [Parameter]
    public string Text { get; set; } = "";

    /// <summary>Told at each key with the whole text.</summary>
    [Parameter]
    public EventCallback<string> TextChanged { get; set; }

    /// <summary>Told when the person leaves the field.</summary>
    [Parameter]
    public EventCallback OnLeave { get; set; }

    /// <summary>A few words of help.</summary>
    [Parameter]
    public string Hint { get; set; } = "";

    /// <summary>What stands in while nothing is typed.</summary>
    [Parameter]
    public string Placeholder { get; set; } = "";

    /// <summary>The value as read, in the units shown, where that is not how it was typed.</summary>
    [Parameter]
    public string Understood { get; set; } = "";

    /// <summary>What is wrong with the text.</summary>
    [Parameter]
    public IReadOnlyList<Fault> Faults { get; set; } = [];

    /// <summary>True where the person may look and not write.</summary>
    [Parameter]
    public bool IsReadOnly { get; set; }

    /// <summary>Further style classes.</summary>
    [Parameter]
    public string Class { get; set; } = "";

    private string Id => $"f-{Path.Replace('/', '-').Replace('.', '-')}";

    private bool HasFault => Faults.Any(f => !f.IsWarning);

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        // Only a change from outside (undo, another person's edit) replaces what is being typed.
        if (Text == given) return;
        (given, typed) = (Text, Text);
    }

    private Task Write(string? text)
    {
        typed = text ?? "";
        given = typed;
        return TextChanged.InvokeAsync(typed);
    }

    private Task Leave() => OnLeave.InvokeAsync();
}
