using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive;
using JointPlanner.Web.Start;
using Microsoft.Extensions.DependencyInjection;

namespace JointPlanner.Web.Tests.Start;

/// <summary>Nothing of a demonstration is used in Production.</summary>
public sealed class DemoTracesTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-traces-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public async Task Production_starts_on_an_empty_folder_and_refuses_the_archive_of_a_demonstration()
    {
        Assert.Equal((null, ""), await StartedProgram.Run(folder));

        await using var demo = new Site();
        _ = demo.CreateClient();
        var copied = Directory.CreateDirectory(Path.Combine(folder, "copied")).FullName;
        await demo.Services.GetRequiredService<ArchiveDatabase>().DisposeAsync();
        foreach (var file in Directory.EnumerateFiles(demo.Folder, "archive.db*").Where(f => !f.EndsWith(".lock", StringComparison.Ordinal))) File.Copy(file, Path.Combine(copied, Path.GetFileName(file)));
        var (code, says) = await StartedProgram.Run(copied);
        Assert.Equal(3, code);
        Assert.Contains("the demonstration's account \"administrator\"", says, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("demo-people.json")]
    [InlineData("demo-designer.pfx")]
    public async Task Production_refuses_a_folder_with_a_file_of_a_demonstration(string file)
    {
        await File.WriteAllTextAsync(Path.Combine(folder, file), "{}");
        var (code, says) = await StartedProgram.Run(folder);
        Assert.Equal(3, code);
        Assert.Contains(file, says, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Production_refuses_an_empty_role_and_an_unknown_kind_of_archive_in_a_sentence()
    {
        var (code, says) = await StartedProgram.Run(folder, ("Archive__Kind", "postgresql"), ("Archive__ConnectionString", "Host=127.0.0.1;Port=1;Database=none"), ("Archive__AppRole", " "));
        Assert.Equal(3, code);
        Assert.StartsWith("Joint Planner does not start: Archive:AppRole is empty.", says, StringComparison.Ordinal);
        (code, says) = await StartedProgram.Run(folder, ("Archive__Kind", "paper"));
        Assert.Equal(3, code);
        Assert.StartsWith("Joint Planner does not start: Archive:Kind is \"paper\".", says, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("CN=Ada Dessauer (demonstration)", true)]
    [InlineData("CN=Roads Board Root", false)]
    public void A_trusted_root_of_a_demonstration_is_refused(string subject, bool refused)
    {
        DemoTraces.Refuse(folder);
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        using var root = new CertificateRequest(subject, key, HashAlgorithmName.SHA256).CreateSelfSigned(DateTimeOffset.UnixEpoch, DateTimeOffset.UnixEpoch.AddYears(90));
        Directory.CreateDirectory(Path.Combine(folder, "roots"));
        File.WriteAllText(Path.Combine(folder, "roots", "root.pem"), root.ExportCertificatePem());
        if (refused) Assert.Contains("roots trusts", Assert.Throws<ArchiveNotReady>(() => DemoTraces.Refuse(folder)).Message, StringComparison.Ordinal);
        else DemoTraces.Refuse(folder);
    }
}
