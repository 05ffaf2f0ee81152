using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Confirming;
using JointPlanner.Archive.Rights;
using JointPlanner.Engine;
using JointPlanner.Engine.Formulas;
using JointPlanner.Web.Shared;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>Values that the calculation takes from memory; an owner confirms each by name.</summary>
public sealed partial class MemoryPanel
{
    private readonly Dictionary<string, Seen> typed = [];
    private IReadOnlyDictionary<string, Confirmation> confirmed = new Dictionary<string, Confirmation>();
    private Guid organisation;
    private bool mayConfirm;
    private string says = "";
    private EventCallback waiting;

    /// <summary>Id of the structure.</summary>
    [Parameter, EditorRequired]
    public Guid StructureId { get; set; }

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private Confirmations Confirmations { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    [Inject]
    private DemoMode Demo { get; set; } = null!;

    [Inject]
    private TimeProvider Clock { get; set; } = null!;

    /// <inheritdoc/>
    protected override async Task OnInitializedAsync()
    {
        if (await Caller.Person() is { } person) await Read(person);
    }

    private async Task Read(Guid person)
    {
        await using var scope = await ArchiveScope.Enter(Archive, person);
        organisation = await scope.Structures().Where(s => s.Id == StructureId).Select(s => s.OrganisationId).FirstOrDefaultAsync();
        mayConfirm = await scope.MayIn(Act.ConfirmValue, organisation);
        confirmed = await Confirmations.InForce(scope, organisation);
    }

    private bool IsConfirmed(Provenance value) => confirmed.ContainsKey(value.ValueId);

    private IReadOnlyList<Provenance> Open(Result result) => [.. result.MemoryValues.Where(v => !IsConfirmed(v))];

    private Seen Of(Provenance value)
    {
        if (!typed.TryGetValue(value.ValueId, out var seen))
            typed[value.ValueId] = seen = new Seen { Document = value.Document, Edition = value.Edition, Place = value.Place };
        return seen;
    }

    private async Task Confirm(Provenance value)
    {
        try
        {
            (says, waiting) = ("", default);
            var call = await Caller.Now();
            var seen = Of(value);
            var today = DateOnly.FromDateTime(Clock.GetUtcNow().UtcDateTime);
            await Confirmations.Confirm(call, new ConfirmRequest(organisation, value.ValueId, seen.Document, seen.Edition, seen.Place, today, Demo.IsOn));
            await Read(call.PersonId);
        }
        catch (ActRefused refused) when (refused.Reason == RefusalReason.PasswordNeeded)
        {
            waiting = EventCallback.Factory.Create(this, () => Confirm(value));
        }
        catch (ActRefused refused)
        {
            says = refused.Message;
        }
    }

    private sealed class Seen
    {
        public string Document { get; set; } = "";
        public string Edition { get; set; } = "";
        public string Place { get; set; } = "";
    }
}
