using System.CommandLine;
using System.Security.Cryptography.X509Certificates;
using System.Text.Encodings.Web;
using System.Text.Json;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Cli.Verifying;

/// <summary><c>verify FILE</c>: what can be concluded from a PDF, three statements a signature; needs neither database nor network.</summary>
internal static class VerifyCommand
{
    private static readonly JsonSerializerOptions Readable = new()
    {
        WriteIndented = true,
        PropertyNamingPolicy = JsonNamingPolicy.KebabCaseLower,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new System.Text.Json.Serialization.JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
    };

    /// <summary>The command with its options.</summary>
    public static Command Make()
    {
        var file = new Argument<string>("file") { Description = "The PDF." };
        var roots = new Option<string[]>("--root") { Description = "Certificate of an authority that you trust (PEM or DER); may be given more than once.", AllowMultipleArgumentsPerToken = false };
        var json = new Option<bool>("--json") { Description = "Write for machines." };
        var command = new Command("verify", "Says of a PDF: unchanged? who? when? Exit code 0 only when every signature is unchanged and there is at least one. " + ExitCodes.InWords) { file, roots, json };
        command.SetAction(parsed =>
        {
            var (output, error) = (parsed.InvocationConfiguration.Output, parsed.InvocationConfiguration.Error);
            foreach (var path in (string[])[parsed.GetRequiredValue(file), .. parsed.GetValue(roots) ?? []])
                if (!File.Exists(path))
                {
                    error.WriteLine($"{path}: there is no such file. Check the name.");
                    return ExitCodes.FaultyInput;
                }
            var trusted = new X509Certificate2Collection();
            foreach (var path in parsed.GetValue(roots) ?? []) trusted.Add(X509CertificateLoader.LoadCertificateFromFile(path));
            var report = new Verifier(trusted).Verify(File.ReadAllBytes(parsed.GetRequiredValue(file)));
            if (parsed.GetValue(json)) output.WriteLine(JsonSerializer.Serialize(report, Readable));
            else
                foreach (var line in Lines(report)) output.WriteLine(line);
            if (report.Origin != FileOrigin.InTheFormOfASheet) return ExitCodes.FaultyInput;
            return report.Signatures.Count > 0 && report.Signatures.All(s => s.Unchanged.Verdict == UnchangedVerdict.Unchanged) ? ExitCodes.Done : ExitCodes.CannotBeIssued;
        });
        return command;
    }

    private static IEnumerable<string> Lines(VerificationReport report)
    {
        yield return report.OriginText;
        yield return FormattableString.Invariant($"{report.Length} bytes, SHA-256 {report.Sha256.ToLowerInvariant()}, {report.SignatureCountText}");
        foreach (var signature in report.Signatures)
        {
            yield return $"Field {signature.Field}";
            yield return $"  unchanged? {signature.Unchanged.Text}";
            yield return $"  who?       {signature.Who.Text}";
            yield return $"  when?      {signature.When.Text}";
        }
        foreach (var field in report.EmptyFields) yield return $"Field {field}: not signed";
        foreach (var sentence in report.Checked) yield return sentence;
    }
}
