using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>What was typed in this window and never reached the draft, to be put in or left out by the person.</summary>
public sealed partial class Unsent
{
    private IReadOnlyList<TypedEntry> entries = [];

    [Inject]
    private IJSRuntime Script { get; set; } = null!;

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (!firstRender || Bench.IsReadOnly) return;
        var left = await Script.InvokeAsync<TypedEntry[]?>("jointPlanner.typed.left");
        entries = [.. (left ?? []).Where(e => Bench.CanHold(e.Path) && (Bench.Document.TextAt(e.Path) ?? "") != e.Text)];
        if (entries.Count > 0) StateHasChanged();
        else await Script.InvokeVoidAsync("jointPlanner.typed.settle");
    }

    private async Task PutIn()
    {
        var document = Bench.Document;
        foreach (var entry in entries) document = document.With(entry.Path, entry.Text);
        await Bench.Take(document, "what did not arrive");
        await Leave();
    }

    private async Task Leave()
    {
        entries = [];
        await Script.InvokeVoidAsync("jointPlanner.typed.settle");
    }
}
