using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Setting;
using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Setting;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.SetDay;

/// <summary>What was set, point by point across the deck. It is kept also where it fails, and says so before it is sent.</summary>
public sealed partial class RecordForm
{
    private static readonly string[] HoldPoints = ["at setting", "before concreting", "after the brackets are released", "at handover"];

    private readonly List<RecordPoint> points = [new("left kerb"), new("axis"), new("right kerb")];
    private Guid request = Guid.CreateVersion7();
    private string device = "", holdPoint = HoldPoints[0], clock = "", remark = "", says = "", kept = "";
    private bool isWorking;

    /// <summary>The joint as issued.</summary>
    [Parameter, EditorRequired]
    public IssuedJoint Joint { get; set; } = null!;

    /// <summary>Temperatures, method, age and direction as typed above.</summary>
    [Parameter, EditorRequired]
    public Measured Measured { get; set; } = null!;

    /// <summary>The revision by which it was set.</summary>
    [Parameter, EditorRequired]
    public Guid RevisionId { get; set; }

    /// <summary>Clock at the structure.</summary>
    [Parameter, EditorRequired]
    public SiteTime Site { get; set; } = null!;

    /// <summary>Units shown.</summary>
    [Parameter, EditorRequired]
    public DisplayProfile Profile { get; set; } = DisplayProfile.Metric;

    /// <summary>Told after a record was kept.</summary>
    [Parameter]
    public EventCallback OnRecorded { get; set; }

    [Inject]
    private SetDayDesk Desk { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private TimeProvider Time { get; set; } = null!;

    /// <summary>What is still missing, in words.</summary>
    private string Missing =>
        Measured.Missing.Length > 0 ? $"{Measured.Missing} Temperature, method and direction are taken from above."
        : device.Trim().Length == 0 ? "Say what is installed."
        : Site.Instant(clock) is null ? "Say when it was measured."
        : points.FirstOrDefault(p => p.Place.Trim().Length > 0 && p.Opening.Value is null) is { } open ? $"Enter the opening at {open.Place}, or clear its name to leave the point out."
        : Taken.Count == 0 ? "Enter at least one point."
        : points.Any(p => p.OwnTemperature.Read() is { Fault: not null }) ? "A temperature cannot be read."
        : "";

    private IReadOnlyList<SetPoint> Taken =>
    [
        .. points.Where(p => p.Place.Trim().Length > 0 && p.Opening.Value is not null)
            .Select(p => new SetPoint(p.Place.Trim(), p.Opening.Value!.Value, Measured.Direction, p.OwnTemperature.Value ?? Measured.Mean ?? 0, Measured.Method)),
    ];

    private IReadOnlyList<(string Name, EndVerdict Verdict)>? Verdicts
    {
        get
        {
            if (Missing.Length > 0) return null;
            var (atMinimum, atMaximum) = Joint.Judge(Taken, Measured.Age.Value);
            return [("at the lowest temperature", atMinimum), ("at the highest temperature", atMaximum)];
        }
    }

    /// <inheritdoc/>
    protected override void OnInitialized() => (device, clock) = (Joint.Device, Site.Clock(Time.GetUtcNow()));

    private void Add() => points.Add(new RecordPoint(""));

    private async Task Keep()
    {
        if (Site.Instant(clock) is not { } at) return;
        (isWorking, says, kept) = (true, "", "");
        try
        {
            var answer = await Desk.Record(await Caller.Now(request), new WhatWasSet(RevisionId, Joint.Id, device, at, holdPoint, Taken, Measured.Age.Value,
                Measured.ReadInWords(Profile), remark.Trim().Length > 0 ? remark : null));
            kept = answer.Holds ? "Recorded. It waits for a designer's acceptance." : "Recorded as failing. A designer must look at it.";
            request = Guid.CreateVersion7();
            await OnRecorded.InvokeAsync();
        }
        catch (Exception refused) when (refused is ActRefused or NotFound or InvalidDataException)
        {
            says = refused.Message;
        }
        catch (Exception problem) when (ArchiveSilence.Is(problem))
        {
            says = ArchiveSilence.Says;
        }

        isWorking = false;
    }

    private sealed class RecordPoint(string place)
    {
        public string Place { get; set; } = place;
        public SiteEntry Opening { get; } = new(Quantity.Opening);
        public SiteEntry OwnTemperature { get; } = new(Quantity.Temperature);
    }
}
