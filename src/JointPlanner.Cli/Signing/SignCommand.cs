using System.CommandLine;
using System.Security.Cryptography;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Cli.Signing;

/// <summary><c>sign SHEET --field designer --key FILE.pfx --out FILE</c>: adds one signature at home; needs neither database nor network.</summary>
internal static class SignCommand
{
    /// <summary>The command with its options.</summary>
    public static Command Make()
    {
        var sheet = new Argument<string>("sheet") { Description = "The frozen sheet as downloaded." };
        var field = new Option<string>("--field") { Description = "designer or checker.", Required = true };
        field.AcceptOnlyFromAmong("designer", "checker");
        var key = new Option<string>("--key") { Description = "Your key file (PKCS #12: .pfx or .p12).", Required = true };
        var password = new Option<string?>("--password-file") { Description = "File with the password in its first line; without it the environment variable JOINT_PLANNER_KEY_PASSWORD is read, else the password is empty." };
        var name = new Option<string>("--name") { Description = "Your name as it shall be shown.", Required = true };
        var reason = new Option<string>("--reason") { Description = "Why you sign.", DefaultValueFactory = _ => "" };
        var place = new Option<string>("--place") { Description = "Where you sign.", DefaultValueFactory = _ => "" };
        var expected = new Option<string?>("--expect") { Description = "SHA-256 of the sheet as the page showed it; other bytes are not signed." };
        var output = new Option<string>("--out") { Description = "Signed PDF to write; one that exists is not replaced.", Required = true };
        var command = new Command("sign", "Signs one prepared field of a sheet. " + ExitCodes.InWords) { sheet, field, key, password, name, reason, place, expected, output };
        command.SetAction(async (parsed, cancellation) =>
        {
            var error = parsed.InvocationConfiguration.Error;
            foreach (var (option, path) in new[] { ("sheet", parsed.GetRequiredValue(sheet)), ("--key", parsed.GetRequiredValue(key)), ("--password-file", parsed.GetValue(password) ?? "") })
                if (path.Length > 0 && !File.Exists(path))
                {
                    error.WriteLine($"{option} {path}: there is no such file. Check the name.");
                    return ExitCodes.FaultyInput;
                }
            var opened = Pfx.Load(await File.ReadAllBytesAsync(parsed.GetRequiredValue(key), cancellation), Password(parsed.GetValue(password)));
            if (opened.Key is not { } mine)
            {
                error.WriteLine($"--key {parsed.GetValue(key)}: {opened.Text}");
                return ExitCodes.FaultyInput;
            }
            using (mine)
            {
                var bytes = await File.ReadAllBytesAsync(parsed.GetRequiredValue(sheet), cancellation);
                try
                {
                    var signed = await Signer.SignAsync(bytes, new SignRequest
                    {
                        Field = parsed.GetRequiredValue(field),
                        Certificate = mine.Certificate,
                        Chain = mine.Chain,
                        Instant = TimeProvider.System.GetUtcNow(),
                        SignerName = parsed.GetRequiredValue(name),
                        Reason = parsed.GetRequiredValue(reason),
                        Place = parsed.GetRequiredValue(place),
                        ExpectedSha256 = parsed.GetValue(expected) ?? Convert.ToHexString(SHA256.HashData(bytes)),
                    }, cancellation);
                    if (NewFile.Write(parsed.GetRequiredValue(output), signed.Bytes, error) is { } refused) return refused;
                    await parsed.InvocationConfiguration.Output.WriteLineAsync($"{parsed.GetValue(output)}: signed, SHA-256 {signed.Sha256.ToLowerInvariant()}");
                    return ExitCodes.Done;
                }
                catch (SigningRefusedException refusal)
                {
                    await error.WriteLineAsync($"Not signed: {refusal.Message}");
                    return ExitCodes.FaultyInput;
                }
            }
        });
        return command;
    }

    private static string Password(string? file) => file is null
        ? Environment.GetEnvironmentVariable("JOINT_PLANNER_KEY_PASSWORD") ?? ""
        : File.ReadLines(file).FirstOrDefault() ?? "";
}
