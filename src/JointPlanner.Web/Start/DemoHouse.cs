using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Rights;
using JointPlanner.Archive.Structures;
using JointPlanner.Exchange.Plans;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Start;

/// <summary>The demonstration's organisation and structures, made through the same acts as everybody's.</summary>
internal static class DemoHouse
{
    private const string Name = "Demonstration Roads";

    internal static async Task Furnish(IServiceProvider services, IReadOnlyList<(Guid Id, Role? Role)> people)
    {
        var administrator = people.Single(p => p.Role is null).Id;
        await using var scope = await ArchiveScope.Enter(services.GetRequiredService<IDbContextFactory<ArchiveContext>>(), administrator);
        if (await scope.Organisations().AnyAsync(o => o.Name == Name)) return;
        var organisations = services.GetRequiredService<OrganisationRegister>();
        var made = await organisations.Create(By(administrator), Name);
        foreach (var (id, role) in people)
            if (role is { } held) await organisations.SetRoles(By(administrator), made.OrganisationId, id, [held]);

        var designer = people.Single(p => p.Role == Role.Designer).Id;
        var structures = services.GetRequiredService<StructureRegister>();
        foreach (var file in Directory.EnumerateFiles(Path.Combine(AppContext.BaseDirectory, "seed-data", "structures"), "*.json").Order(StringComparer.Ordinal))
        {
            var text = await File.ReadAllTextAsync(file);
            if (PlanDocument.Parse(text).Document is not { } plan) throw new InvalidDataException($"The demo structure {Path.GetFileName(file)} cannot be read.");
            await structures.Create(By(designer), new CreateRequest(
                made.OrganisationId, plan.TextAt("structure/name") ?? Path.GetFileNameWithoutExtension(file), plan.TextAt("structure/time-zone") ?? "Etc/UTC", text));
        }
    }

    private static ActCall By(Guid person) => ActCall.AtConsole(person, TimeProvider.System.GetUtcNow());
}
