using System.Globalization;
using JointPlanner.Archive.Acts;
using JointPlanner.Exchange.Plans;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Begins a structure from few entries and leads to its ledger.</summary>
public sealed partial class NewStructurePage : IDisposable
{
    // The press of the button carries this id: a second press gives the first answer.
    private Guid request = Guid.CreateVersion7();
    private readonly PlanBeginning beginning = new();
    private BeginningFaults faults = BeginningFaults.None;
    private string says = "";
    private PlanBeginning? judged;
    private bool isWorking, choseCode, choseRules, wasPressed, leadsToFault;

    [Inject]
    private PlanDesk Desk { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private FirstDraft First { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    [Inject]
    private IJSRuntime Script { get; set; } = null!;

    private bool IsUs => Preferences.Units == UnitProfile.Us;

    private IReadOnlyList<(string, string)> Codes => BeginningWords.Codes(Desk);

    private IReadOnlyList<(string, string)> Rules => BeginningWords.Rules(Desk);

    private IReadOnlyList<(string, string)> Zones => BeginningWords.Zones(Desk, beginning.Code);

    private string FixedAt => beginning.FixedAt.ToString(CultureInfo.InvariantCulture);

    private IReadOnlyList<(string, string)> Places =>
        [.. beginning.Marks.Select((mark, i) => ((i + 1).ToString(CultureInfo.InvariantCulture), $"{mark}, {beginning.StationTexts[i]}"))];

    /// <inheritdoc/>
    public void Dispose() => Preferences.Changed -= Offer;

    /// <inheritdoc/>
    protected override void OnInitialized()
    {
        Preferences.Changed += Offer;
        Offer();
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (leadsToFault) await Script.InvokeVoidAsync("jointPlanner.focus", "form.beginning [aria-invalid=true]");
        leadsToFault = false;
        if (!firstRender) return;
        beginning.Zone = await Script.InvokeAsync<string?>("jointPlanner.zone") ?? "";
        // A page that lost its connection before "Begin" left its entries in this window.
        foreach (var (path, text) in await Script.InvokeAsync<TypedEntry[]?>("jointPlanner.typed.left") ?? []) beginning.Put(path, text);
        StateHasChanged();
    }

    // What goes with the units shown, until the person chooses something else.
    private void Offer()
    {
        beginning.Display = IsUs ? "us" : "metric";
        if (!choseCode) beginning.Code = Codes.FirstOrDefault(c => c.Item1.EndsWith($"-{beginning.Display}", StringComparison.Ordinal), Codes[0]).Item1;
        if (!choseRules) beginning.OwnerRules = Rules.FirstOrDefault(r => r.Item1.EndsWith(beginning.Display, StringComparison.Ordinal), Rules[0]).Item1;
        InvokeAsync(StateHasChanged);
    }

    private void TakeCode(string code) => (beginning.Code, choseCode, beginning.ClimateZone) = (code, true, "");

    private void TakeRules(string rules) => (beginning.OwnerRules, choseRules) = (rules, true);

    private void Fix(string word) => beginning.FixedAt = int.Parse(word, CultureInfo.InvariantCulture);

    private async Task Begin()
    {
        wasPressed = true;
        Judge();
        if (faults.Count == 0) await BeginAnyway();
        else (says, leadsToFault) = (string.Join(' ', ["Some entries are missing or cannot be read; each is told beside its field.", .. faults.Elsewhere]), true);
    }

    // From the first press on, what is wrong follows the typing.
    private void Judge()
    {
        if (!wasPressed || judged == beginning) return;
        judged = beginning with { };
        faults = BeginningFaults.Of(beginning, Desk, Zones.Count > 0);
        if (faults.Count == 0) says = "";
    }

    private async Task BeginAnyway()
    {
        if (beginning.Name.Trim().Length == 0) says = "Name: it is empty. Give the structure a name; everything else can wait.";
        else await Create(beginning.Name.Trim(), beginning.Zone, beginning.ToDocument());
    }

    private Task BeginWith(PlanFile file)
    {
        var plan = file.Document!;
        var isZoneWrong = file.Faults.Any(f => f.Path == "structure/time-zone" && !f.IsWarning);
        return Create(plan.TextAt("structure/name") ?? Path.GetFileNameWithoutExtension(file.Name), isZoneWrong ? beginning.Zone : plan.TextAt("structure/time-zone") ?? beginning.Zone, plan);
    }

    private async Task Create(string name, string zone, PlanDocument plan)
    {
        if (isWorking) return;
        (isWorking, says) = (true, "");
        try
        {
            if (await First.Begin(await Caller.Now(request), name, zone, plan) is not { } made)
            {
                says = "You may not begin structures in any organisation. Ask its owner for the role designer.";
                return;
            }

            await Script.InvokeVoidAsync("jointPlanner.typed.settle");
            Navigation.NavigateTo($"structures/{made}");
        }
        catch (ActRefused refused)
        {
            (says, request) = (refused.Message, Guid.CreateVersion7());
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            says = ArchiveSilence.Says;
        }
        finally
        {
            isWorking = false;
        }
    }
}
