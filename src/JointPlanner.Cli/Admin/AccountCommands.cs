using System.CommandLine;
using JointPlanner.Archive;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;
using JointPlanner.Archive.Values;

namespace JointPlanner.Cli.Admin;

/// <summary><c>admin create</c> and <c>admin link</c>: an administrator's account, and the link by which a password is set once.</summary>
internal static class AccountCommands
{
    private const string AboutLink = "The link is printed once; only its hash is kept. It is made from PublicAddress.";

    /// <summary>Makes an administrator.</summary>
    public static Command Create()
    {
        var account = new Option<string>("--account") { Description = "What the person types to sign in: a-z, 0-9, dot, hyphen, underscore.", Required = true };
        var name = new Option<string>("--name") { Description = "The name as it is printed.", Required = true };
        var create = new Command("create", $"Makes the account of an administrator and prints a one-time link with which they set their password. {AboutLink}") { account, name };
        create.SetAction((parsed, cancellation) => Print(parsed.InvocationConfiguration, (register, token) =>
            register.AddAtConsole(new AccountRequest(parsed.GetValue(account)!, parsed.GetValue(name)!, Administrator: true, token), cancellation)));
        return create;
    }

    /// <summary>Makes a new link for an account that there is.</summary>
    public static Command Link()
    {
        var account = new Option<string>("--account") { Description = "The account.", Required = true };
        var link = new Command("link", $"Prints a new one-time link for an account whose password or first link is lost; older links end. {AboutLink}") { account };
        link.SetAction((parsed, cancellation) => Print(parsed.InvocationConfiguration, (register, token) =>
            register.MakeLinkAtConsole(parsed.GetValue(account)!, token, cancellation)));
        return link;
    }

    private static async Task<int> Print(InvocationConfiguration console, Func<AccountRegister, string, Task<AccountAnswer>> make)
    {
        try
        {
            var address = Address();
            await using var archive = AdminCommand.Open();
            await archive.AssertCurrent();
            var token = LinkToken.New();
            var made = await make(new AccountRegister(new ActDesk(archive, TimeProvider.System)), token);
            await console.Output.WriteLineAsync(FormattableString.Invariant(
                $"Open this link once, before {made.LinkExpiresAt:yyyy-MM-dd HH:mm} UTC, and set the password there:\n\n  {new Uri(address, $"account/link/{token}")}\n"));
            return ExitCodes.Done;
        }
        catch (Exception refused) when (refused is ArchiveNotReady or ActRefused)
        {
            await console.Error.WriteLineAsync(refused.Message);
            return ExitCodes.FaultyInput;
        }
    }

    private static Uri Address()
    {
        var given = AdminCommand.Setting("PublicAddress");
        if (!Uri.TryCreate(given, UriKind.Absolute, out var address) || (address.Scheme != Uri.UriSchemeHttps && !address.IsLoopback))
            throw new ArchiveNotReady($"PublicAddress is \"{given}\". Give the https address at which people reach this installation (plain http for loopback only): the link is made from it.");
        return address.AbsoluteUri.EndsWith('/') ? address : new Uri(address.AbsoluteUri + "/");
    }
}
