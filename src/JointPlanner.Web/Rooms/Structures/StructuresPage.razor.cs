using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
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

    private IReadOnlyList<StructureLine> Found => [.. structures.Where(s => s.Answers(sought))];

    /// <inheritdoc/>
    protected override async Task OnInitializedAsync()
    {
        if (await Caller.Person() is not { } person) return;
        await using var scope = await ArchiveScope.Enter(Archive, person);
        foreach (var organisation in await scope.Organisations().Select(o => o.Id).ToListAsync()) mayCreate |= await scope.MayIn(Act.CreateStructure, organisation);
        structures = await StructureLine.All(scope);
    }
}
