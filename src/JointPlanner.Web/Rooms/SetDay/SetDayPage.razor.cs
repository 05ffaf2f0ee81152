using JointPlanner.Archive.Acts;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Setting;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.SetDay;

/// <summary>One joint on the day it is set: from the issued results to one number, and what was set to the archive.</summary>
public sealed partial class SetDayPage : IDisposable
{
    private Issuing.Setting.SetDay? day;
    private Measured? measured;
    private bool isMissing;

    /// <summary>Id of the structure.</summary>
    [Parameter]
    public Guid StructureId { get; set; }

    /// <summary>Id of the joint.</summary>
    [Parameter]
    public string Joint { get; set; } = "";

    /// <summary>Number of the revision; null for the one that holds.</summary>
    [SupplyParameterFromQuery(Name = "revision")]
    public int? Revision { get; set; }

    [Inject]
    private SetDayDesk Desk { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    private DisplayProfile Profile => Preferences.Profile;

    private SiteTime Site => new(day!.Zone);

    // A revision that may no longer be used shows no number, whatever was typed before.
    private SettingAnswer? Answer => day is { WhyNot: null } ? measured?.Answer : null;

    /// <inheritdoc/>
    public void Dispose() => Preferences.Changed -= Redraw;

    /// <inheritdoc/>
    protected override void OnInitialized() => Preferences.Changed += Redraw;

    /// <inheritdoc/>
    protected override Task OnParametersSetAsync() => Read();

    private async Task Read()
    {
        if (await Caller.Person() is not { } person) return;
        try
        {
            var before = day?.Revision?.Id;
            day = await Desk.Open(person, StructureId, Joint, Revision);
            isMissing = false;
            // What was typed stays while the same revision holds; another one may ask for other points.
            if (day.Joint is { } joint && (measured is null || before != day.Revision?.Id)) measured = new Measured(joint);
            if (day.Joint is { } units) Preferences.Suggest(units.Profile == DisplayProfile.Us ? UnitProfile.Us : UnitProfile.Metric);
        }
        catch (NotFound)
        {
            (day, isMissing) = (null, true);
        }
    }

    private void Redraw() => InvokeAsync(StateHasChanged);
}
