using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Shared;

/// <summary>
/// Asks for the password once more and then goes on with what was asked for. The password goes by a plain request of the page's script, not through the
/// circuit; what is entered on the page stays.
/// </summary>
public sealed partial class PasswordPanel
{
    private ElementReference field;
    private bool isShown;
    private string says = "";

    /// <summary>What waits for the password; nothing is shown where nothing does.</summary>
    [Parameter, EditorRequired]
    public EventCallback Then { get; set; }

    /// <summary>Gives up what waits.</summary>
    [Parameter]
    public EventCallback OnCancel { get; set; }

    /// <summary>Why it is asked.</summary>
    [Parameter]
    public string Because { get; set; } = "This is done under your name, so type your password once more. It then holds for five minutes.";

    /// <summary>Id of the field.</summary>
    [Parameter]
    public string Id { get; set; } = "password-again";

    /// <summary>Whether the field takes the focus when it appears.</summary>
    [Parameter]
    public bool TakesFocus { get; set; } = true;

    [Inject]
    private Caller Caller { get; set; } = null!;

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        var appears = Then.HasDelegate && !isShown;
        isShown = Then.HasDelegate;
        if (!isShown) says = "";
        if (appears && TakesFocus && RendererInfo.IsInteractive) await field.FocusAsync();
    }

    // The script writes "+" and the sealed mark, or "-" and a sentence.
    private async Task Answered(ChangeEventArgs change)
    {
        var answer = change.Value as string ?? "";
        if (answer is ['+', ..] && await Caller.Take(answer[1..]))
        {
            says = "";
            await Then.InvokeAsync();
            return;
        }

        says = answer is ['-', _, ..] ? answer[1..] : "The answer could not be read. Type the password again.";
        if (RendererInfo.IsInteractive) await field.FocusAsync();
    }
}
