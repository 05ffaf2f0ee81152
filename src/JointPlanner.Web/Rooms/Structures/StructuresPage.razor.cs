using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Revisions;
using JointPlanner.Archive.Rights;
using JointPlanner.Web.Shared;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Rooms.Structures;

/// <summary>Every structure that the person may read.</summary>
public sealed partial class StructuresPage
{
    private IReadOnlyList<StructureLine> structures = [];
    private bool mayCreate;
    private string sought = "";

    [Inject]
    private IDbContextFactory<ArchiveContext> Archive { get; set; } = null!;

    [Inject]
    private Caller Caller { get; set; } = null!;

    private IEnumerable<StructureLine> Found => structures.Where(s => s.Name.Contains(sought.Trim(), StringComparison.OrdinalIgnoreCase));

    /// <inheritdoc/>
    protected override async Task OnInitializedAsync()
    {
        if (await Caller.Person() is not { } person) return;
        await using var scope = await ArchiveScope.Enter(Archive, person);
        var owners = await scope.Organisations().ToDictionaryAsync(o => o.Id, o => o.Name);
        foreach (var organisation in owners.Keys) mayCreate |= await scope.MayIn(Act.CreateStructure, organisation);
        var revisions = (await scope.Revisions().Include(r => r.States).ToListAsync()).ToLookup(r => r.StructureId);
        var rows = await scope.Structures().OrderBy(s => s.Name).ToListAsync();
        structures = [.. rows.Select(s =>
        {
            var latest = revisions[s.Id].MaxBy(r => r.Number);
            return new StructureLine(s.Id, s.Name, owners.GetValueOrDefault(s.OrganisationId, "another organisation"), latest?.Number, latest?.State,
                revisions[s.Id].FirstOrDefault(r => r.State == RevisionState.Issued)?.Id);
        })];
    }

    private sealed record StructureLine(Guid Id, string Name, string Owner, int? Number, RevisionState? Latest, Guid? IssuedId);
}
