using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components;

namespace JointPlanner.Web.Rooms.Accounts;

/// <summary>Signing in: a plain form, because only an ordinary answer can set the cookie.</summary>
public sealed partial class EnterPage
{
    private string says = "";

    /// <summary>What was typed.</summary>
    [SupplyParameterFromForm]
    public EnterEntry? Entry { get; set; }

    /// <summary>Where the person came from.</summary>
    [SupplyParameterFromQuery(Name = "back")]
    public string? Back { get; set; }

    /// <summary>Given after a password was set by a link.</summary>
    [SupplyParameterFromQuery(Name = "set")]
    public string? PasswordSet { get; set; }

    [Inject]
    private Door Door { get; set; } = null!;

    [Inject]
    private NavigationManager Navigation { get; set; } = null!;

    [Inject]
    private DemoMode Demo { get; set; } = null!;

    [CascadingParameter]
    private HttpContext Context { get; set; } = null!;

    /// <inheritdoc/>
    protected override void OnInitialized() => Entry ??= new();

    private async Task SignIn()
    {
        var typed = Entry!;
        var answer = await Door.Enter(typed.Account, typed.Password, AccountRoutes.From(Context));
        if (answer.Succeeded)
        {
            Navigation.NavigateTo(IsOurs(Back) ? Back![1..] : "", forceLoad: true);
            return;
        }

        says = answer.IsLockedOut
            ? "Too many wrong tries: this account is closed for ten minutes."
            : "Account and password do not fit together. Check both; after five wrong tries the account is closed for ten minutes.";
    }

    // Only ways within this site: "//host" and "/\host" would lead out of it.
    private static bool IsOurs(string? way) => way is ['/', ..] && !way.StartsWith("//", StringComparison.Ordinal) && !way.Contains('\\', StringComparison.Ordinal);
}

/// <summary>What is typed to sign in.</summary>
public sealed class EnterEntry
{
    /// <summary>Account.</summary>
    public string Account { get; set; } = "";

    /// <summary>Password.</summary>
    public string Password { get; set; } = "";
}
