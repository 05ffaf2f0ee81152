using System.Security.Cryptography;
using System.Text.Json;
using JointPlanner.Archive;
using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Web.Start;

/// <summary>
/// People of the demonstration, one per role, with passwords made at the first start of this installation. They are told on the console at each start.
/// </summary>
internal static class DemoSeed
{
    private static readonly (string Account, string Name, Role? Role)[] People =
    [
        ("designer", "Ada Dessauer", Role.Designer), ("checker", "Milan Prochazka", Role.Checker),
        ("contractor", "Rosa Quint", Role.Contractor), ("owner", "Tilde Overgaard", Role.Owner),
        ("administrator", "Jon Varga", null),
    ];

    internal static async Task Sow(WebApplication app)
    {
        await using var scope = app.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<UserManager<Person>>();
        var file = Path.Combine(ArchiveSetup.Folder(app.Configuration, app.Environment), DemoTraces.PeopleFile);
        var passwords = await Passwords(file);
        foreach (var (account, name, role) in People)
        {
            if (await people.FindByNameAsync(account) is { } known)
            {
                // An archive of an earlier program did not mark them yet.
                if (!known.Demonstration) await people.UpdateAsync(Marked(known));
                continue;
            }

            var person = new Person { UserName = account, Name = name, Administrator = role is null, Demonstration = true };
            var made = await people.CreateAsync(person, passwords[account]);
            if (!made.Succeeded) throw new ArchiveNotReady($"The demo person {account} could not be made: {string.Join(' ', made.Errors.Select(e => e.Description))}");
        }

        var ids = await Ids(people);
        await DemoHouse.Furnish(scope.ServiceProvider, ids);
        foreach (var (account, _, _) in People) Console.WriteLine($"  demo person  {account,-12} password  {passwords[account]}");
        await DemoKeys.Cut(scope.ServiceProvider, Path.GetDirectoryName(file)!, ids.Single(p => p.Role is null).Id,
            People.Zip(ids).Where(p => p.First.Role is Role.Designer or Role.Checker)
                .Select(p => (p.First.Account, p.Second.Id, p.First.Name, passwords[p.First.Account])));
    }

    private static Person Marked(Person person)
    {
        person.Demonstration = true;
        return person;
    }

    private static async Task<IReadOnlyList<(Guid Id, Role? Role)>> Ids(UserManager<Person> people)
    {
        var ids = new List<(Guid, Role?)>();
        foreach (var (account, _, role) in People) ids.Add(((await people.FindByNameAsync(account))!.Id, role));
        return ids;
    }

    private static async Task<Dictionary<string, string>> Passwords(string file)
    {
        if (File.Exists(file) && JsonSerializer.Deserialize<Dictionary<string, string>>(await File.ReadAllTextAsync(file)) is { } known
            && People.All(p => known.ContainsKey(p.Account))) return known;
        var made = People.ToDictionary(p => p.Account, _ => RandomNumberGenerator.GetString("abcdefghijkmnpqrstuvwxyz23456789", 16));
        await File.WriteAllTextAsync(file, JsonSerializer.Serialize(made));
        if (!OperatingSystem.IsWindows()) File.SetUnixFileMode(file, UnixFileMode.UserRead | UnixFileMode.UserWrite);
        return made;
    }
}
