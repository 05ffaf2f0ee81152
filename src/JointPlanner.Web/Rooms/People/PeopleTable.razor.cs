using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Values;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.People;

/// <summary>Persons with their roles; for an administrator what is done with accounts.</summary>
public sealed partial class PeopleTable
{
    private string name = "", account = "";
    private bool administrator;
    private Guid? chosen;

    // Counted up where a tick must go back to what holds.
    private int round;
    private MadeLink? link;

    /// <summary>What is shown.</summary>
    [Parameter, EditorRequired]
    public PeopleView View { get; set; } = null!;

    [Inject]
    private AccountRegister Accounts { get; set; } = null!;

    [Inject]
    private OrganisationRegister Organisations { get; set; } = null!;

    [Inject]
    private PublicAddress Address { get; set; } = null!;

    private static string RolesOf(PersonLine person) => person.Roles.Count == 0 ? "no role in any organisation"
        : string.Join("; ", person.Roles.Select(there => $"{there.Organisation}: {string.Join(", ", there.Roles).ToLowerInvariant()}"));

    private Task Add() => Do(async call =>
    {
        var token = LinkToken.New();
        var made = await Accounts.Add(call, new AccountRequest(account.Trim(), name, administrator, token));
        Show(name, token, made);
        (name, account, administrator) = ("", "", false);
    });

    private Task MakeLink(PersonLine person) => Do(async call =>
    {
        var token = LinkToken.New();
        Show(person.Name, token, await Accounts.MakeLink(call, person.Id, token));
    });

    private void Show(string whose, string token, AccountAnswer made) => link = new(whose, Address.To($"account/link/{token}"), made.LinkExpiresAt);

    private Task Switch(PersonLine person) => Do(call => Accounts.SetActive(call, person.Id, !person.Active));

    private async Task SetRoles(PersonLine person, Guid organisation, IReadOnlyList<Role> roles)
    {
        await Do(call => Organisations.SetRoles(call, organisation, person.Id, roles));
        if (Says.Length > 0) round++;
    }

    private void GiveUp()
    {
        Leave();
        round++;
    }

    private sealed record MadeLink(string Name, string Address, DateTimeOffset Until);
}
