using System.Globalization;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Structures;
using JointPlanner.Exchange.Plans;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Shell;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Begins a structure from few entries and leads to its ledger.</summary>
public sealed partial class NewStructurePage
{
    private static readonly IReadOnlyList<(string, string)> Decks = [("composite", "steel with concrete deck"), ("concrete", "concrete"), ("steel", "steel")];
    private static readonly IReadOnlyList<(string, string)> Others = [("elastomeric", "elastomeric pads"), ("free", "sliding")];
    private static readonly IReadOnlyList<(string, string)> Temperatures = [("effective", "of the structure"), ("shade", "of shade air")];

    // The press of the button carries this id: a second press gives the first answer.
    private readonly Guid request = Guid.CreateVersion7();
    private readonly PlanBeginning beginning = new();
    private string says = "";
    private bool isWorking;

    [Inject]
    private PlanDesk Desk { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private StructureRegister Register { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    [Inject]
    private Preferences Preferences { get; set; } = null!;

    private bool IsUs => Preferences.Units == UnitProfile.Us;

    private IReadOnlyList<(string, string)> Codes => [.. (Desk.Known.Bases ?? []).Select(b => (b.Id, b.Title))];

    private IReadOnlyList<(string, string)> Rules => [.. Desk.RuleNames, ("", "none: movements only")];

    private IReadOnlyList<(string, string)> Zones =>
        Desk.Known.Bases?.FirstOrDefault(b => b.Id == beginning.Code)?.ClimateZones is { Count: > 0 } zones ? [("", "choose"), .. zones.Select(z => (z, z))] : [];

    private string FixedAt => beginning.FixedAt.ToString(CultureInfo.InvariantCulture);

    private IReadOnlyList<(string, string)> Places =>
        [.. beginning.StationTexts.Select((s, i) => ((i + 1).ToString(CultureInfo.InvariantCulture), $"support {i + 1}, {s}"))];

    /// <inheritdoc/>
    protected override void OnInitialized()
    {
        beginning.Display = IsUs ? "us" : "metric";
        beginning.Code = Codes.FirstOrDefault(c => c.Item1.EndsWith($"-{beginning.Display}", StringComparison.Ordinal), Codes[0]).Item1;
        beginning.OwnerRules = Rules.FirstOrDefault(r => r.Item1.EndsWith(beginning.Display, StringComparison.Ordinal), Rules[0]).Item1;
    }

    private void Fix(string word) => beginning.FixedAt = int.Parse(word, CultureInfo.InvariantCulture);

    private Task Begin()
    {
        says = beginning.Name.Trim().Length == 0 ? "Name: it is empty. Give the structure a name."
            : beginning.StationTexts.Count < 2
                ? $"Stations of the supports: “{beginning.Stations}” names {beginning.StationTexts.Count}. Give at least two, each with its unit, separated by semicolons."
                : "";
        return says.Length > 0 ? Task.CompletedTask : Create(beginning.Name.Trim(), beginning.Zone, beginning.ToDocument());
    }

    private Task BeginWith(PlanFile file)
    {
        var plan = file.Document!;
        var isZoneWrong = file.Faults.Any(f => f.Path == "structure/time-zone" && !f.IsWarning);
        return Create(plan.TextAt("structure/name") ?? Path.GetFileNameWithoutExtension(file.Name), isZoneWrong ? beginning.Zone : plan.TextAt("structure/time-zone") ?? beginning.Zone, plan);
    }

    private async Task Create(string name, string zone, PlanDocument plan)
    {
        (isWorking, says) = (true, "");
        try
        {
            var call = await Caller.Now(request);
            await using var scope = await ArchiveScope.Enter(Archive, call.PersonId);
            foreach (var organisation in await scope.Organisations().OrderBy(o => o.Name).ToListAsync())
            {
                if (!await scope.MayIn(Act.CreateStructure, organisation.Id)) continue;
                var made = await Register.Create(call, new CreateRequest(organisation.Id, name, zone, plan.ToJson()));
                Navigation.NavigateTo($"structures/{made.StructureId}");
                return;
            }

            says = "You may not begin structures in any organisation. Ask its owner for the role designer.";
        }
        catch (ActRefused refused)
        {
            says = refused.Message;
        }
        finally
        {
            isWorking = false;
        }
    }
}
