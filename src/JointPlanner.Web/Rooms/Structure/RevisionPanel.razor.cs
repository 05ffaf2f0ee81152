using JointPlanner.Archive;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structure;

/// <summary>The revisions of a structure that the person may see, latest first.</summary>
public sealed partial class RevisionPanel
{
    private IReadOnlyList<Revision> revisions = [];
    private (Guid, int) shown;

    /// <summary>Id of the structure.</summary>
    [Parameter, EditorRequired]
    public Guid StructureId { get; set; }

    /// <summary>Counts what was saved for all from this page; the list is read again.</summary>
    [Parameter]
    public int SharedAgain { get; set; }

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    /// <inheritdoc/>
    protected override async Task OnParametersSetAsync()
    {
        if (shown == (StructureId, SharedAgain) || await Caller.Person() is not { } person) return;
        shown = (StructureId, SharedAgain);
        await using var scope = await ArchiveScope.Enter(Archive, person);
        revisions = await scope.Revisions().Include(r => r.States).Where(r => r.StructureId == StructureId).OrderByDescending(r => r.Number).Take(6).ToListAsync();
    }
}
