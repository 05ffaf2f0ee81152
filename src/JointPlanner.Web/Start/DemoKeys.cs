using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.People;

namespace JointPlanner.Web.Start;

/// <summary>
/// Key files for the demonstration's designer and checker, made at the first start of this installation, registered and confirmed through the same acts as
/// everybody's. Their certificates name no authority: on the verify page they read "unknown issuer".
/// </summary>
internal static class DemoKeys
{
    private const int YearsValid = 2;

    /// <summary>Makes what is missing; tells where each key file lies.</summary>
    internal static async Task Cut(IServiceProvider services, string folder, Guid administrator, IEnumerable<(string Account, Guid Id, string Name, string Password)> signers)
    {
        var register = services.GetRequiredService<CertificateRegister>();
        foreach (var (account, id, name, password) in signers)
        {
            var file = Path.Combine(folder, $"demo-{account}.pfx");
            if (!File.Exists(file)) await Make(register, file, administrator, id, name, password);
            Console.WriteLine($"  demo key     {account,-12} file      {file} (same password)");
        }
    }

    private static async Task Make(CertificateRegister register, string file, Guid administrator, Guid person, string name, string password)
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var request = new CertificateRequest(new X500DistinguishedName($"CN=\"{name} {DemoTraces.Mark}\""), key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.DigitalSignature | X509KeyUsageFlags.NonRepudiation, critical: true));
        var now = TimeProvider.System.GetUtcNow();
        using var certificate = request.CreateSelfSigned(now.AddMinutes(-5), now.AddYears(YearsValid));
        var registered = await register.Register(By(person), certificate.RawData);
        await register.Confirm(By(administrator), registered.CertificateId, registered.Fingerprint);
        await File.WriteAllBytesAsync(file, certificate.Export(X509ContentType.Pfx, password));
        if (!OperatingSystem.IsWindows()) File.SetUnixFileMode(file, UnixFileMode.UserRead | UnixFileMode.UserWrite);
    }

    private static ActCall By(Guid person) => ActCall.AtConsole(person, TimeProvider.System.GetUtcNow());
}
