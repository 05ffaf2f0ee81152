using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Identity;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>Setting one's password by a one-time link.</summary>
public sealed partial class LinkPage
{
    private PasswordLinkView? whose;
    private IReadOnlyList<string> says = [];

    /// <summary>The secret part of the link.</summary>
    [Parameter]
    public string Token { get; set; } = "";

    /// <summary>What was typed.</summary>
    [SupplyParameterFromForm]
    public NewPasswordEntry? Entry { get; set; }

    [CascadingParameter]
    private HttpContext Context { get; set; } = null!;

    [Inject]
    private PasswordLinks Links { get; set; } = null!;

    [Inject]
    private UserManager<Person> People { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    /// <inheritdoc/>
    protected override async Task OnInitializedAsync()
    {
        Entry ??= new();
        Context.Response.Headers.CacheControl = "no-store";
        // The address is the secret: it goes to nobody with a link from this page.
        Context.Response.Headers["Referrer-Policy"] = "no-referrer";
        try
        {
            whose = await Links.Look(Token);
        }
        catch (NotFound)
        {
            // This page says it itself. A status set now would make the renderer leave the page out, for the general page to stand in.
            Context.Response.OnStarting(() =>
            {
                Context.Response.StatusCode = StatusCodes.Status404NotFound;
                return Task.CompletedTask;
            });
        }
    }

    private async Task Set()
    {
        if (whose is not { } view || await People.FindByIdAsync(view.PersonId.ToString()) is not { } person) return;
        says = await Faults(person, Entry!);
        if (says.Count > 0) return;
        try
        {
            await Links.Use(Guid.CreateVersion7(), Token, People.PasswordHasher.HashPassword(person, Entry!.First), AccountRoutes.From(Context));
            Navigation.NavigateTo("account/enter?set=yes", forceLoad: true);
        }
        catch (NotFound)
        {
            // Used by another press meanwhile.
            whose = null;
        }
    }

    private async Task<IReadOnlyList<string>> Faults(Person person, NewPasswordEntry entry)
    {
        if (entry.First != entry.Second) return ["The two entries differ. Type the same password twice."];
        if (entry.First.Contains(person.UserName!, StringComparison.OrdinalIgnoreCase)) return [$"The password holds the account's name \"{person.UserName}\". Choose one that does not."];
        var sentences = new List<string>();
        foreach (var rule in People.PasswordValidators)
            sentences.AddRange((await rule.ValidateAsync(People, person, entry.First)).Errors.Select(error => error.Description));
        return sentences;
    }
}

/// <summary>What is typed to set a password.</summary>
public sealed class NewPasswordEntry
{
    /// <summary>The password.</summary>
    public string First { get; set; } = "";

    /// <summary>The same again.</summary>
    public string Second { get; set; } = "";
}
