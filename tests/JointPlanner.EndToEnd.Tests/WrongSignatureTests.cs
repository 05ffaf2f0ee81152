using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>Wrong keys and wrong files at a frozen sheet, through the forms: each is refused by name, the sheet stays as it is, and the right key signs it afterwards.</summary>
public sealed class WrongSignatureTests(RunningSite site) : IClassFixture<RunningSite>, IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("joint-planner-e2e-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public async Task A_wrong_password_an_expired_certificate_a_strange_file_and_a_changed_sheet_are_refused_and_nothing_is_lost()
    {
        var designer = await site.Visit("designer");
        await designer.Open("Kestrel Lane Overbridge");
        await designer.Page.ClickAsync("a.revision");
        await designer.Page.ClickAsync("text=Freeze for checking");
        await Assertions.Expect(designer.Page.Locator("h1 .state")).ToHaveTextAsync("in check", new() { Timeout = 30_000 });
        var revision = new Uri(designer.Page.Url).AbsolutePath;
        var sheet = await Sheet(designer, revision);

        await Sign(designer, revision, site.KeyFile("designer"), "not the password");
        await Refused(designer, "The password does not open the key file. Type it again; upper and lower case differ.");

        await Sign(designer, revision, Expired(), "own");
        await Refused(designer, "expired on", "Sign with a renewed certificate.");

        await HandIn(designer, revision, Written("foreign.pdf", ForeignPdf()));
        await Refused(designer, "The signed document does not begin with the archived sheet, byte for byte.", "a program that only appends a signature");

        var changed = sheet.ToArray();
        changed[1000] ^= 1;
        await HandIn(designer, revision, Written("changed.pdf", changed));
        await Refused(designer, "The signed document does not begin with the archived sheet, byte for byte.", "a program that only appends a signature");

        Assert.Equal(sheet, await Sheet(designer, revision));
        await Sign(designer, revision, site.KeyFile("designer"), site.Password("designer"));
        await Assertions.Expect(designer.Page.Locator("text=signed by the designer")).ToBeVisibleAsync();

        Assert.True((await Sheet(designer, revision)).AsSpan().StartsWith(sheet));
    }

    private static async Task Refused(Visitor visitor, params string[] words)
    {
        var alert = visitor.Page.Locator("[role=alert]").First;
        foreach (var word in words) await Assertions.Expect(alert).ToContainTextAsync(word);
        await Assertions.Expect(visitor.Page.Locator("h1 .state")).ToHaveTextAsync("in check");
        await Assertions.Expect(visitor.Page.Locator("text=signed by the")).ToHaveCountAsync(0);
    }

    private static async Task Sign(Visitor visitor, string revision, string key, string password)
    {
        await visitor.Go(revision);
        await visitor.Gravely(null, visitor.Page.Locator("details.more summary:has-text('key file')"));
        await visitor.Page.ClickAsync("details.more summary:has-text('key file')");
        await visitor.Page.SetInputFilesAsync("#key", key);
        await visitor.Page.FillAsync("#word", password);
        await visitor.Page.ClickAsync("form[action$='/sign'] button[type=submit]");
        await visitor.Page.WaitForSelectorAsync("[data-interactive=true]");
    }

    private static async Task HandIn(Visitor visitor, string revision, string file)
    {
        await visitor.Go(revision);
        await visitor.Gravely(null, visitor.Page.Locator("#signed"));
        await visitor.Page.SetInputFilesAsync("#signed", file);
        await visitor.Page.ClickAsync("form[action$='/signed'] button[type=submit]");
        await visitor.Page.WaitForSelectorAsync("[data-interactive=true]");
    }

    /// <summary>A whole PDF of one empty page, made by nobody's program.</summary>
    private static byte[] ForeignPdf()
    {
        string[] objects = ["<</Type/Catalog/Pages 2 0 R>>", "<</Type/Pages/Kids[3 0 R]/Count 1>>", "<</Type/Page/Parent 2 0 R/MediaBox[0 0 99 99]/Resources<<>>>>"];
        var (text, offsets) = (new System.Text.StringBuilder("%PDF-1.4\n"), new List<int>());
        for (var i = 0; i < objects.Length; i++)
        {
            offsets.Add(text.Length);
            text.Append(System.Globalization.CultureInfo.InvariantCulture, $"{i + 1} 0 obj\n{objects[i]}\nendobj\n");
        }
        var table = text.Length;
        text.Append("xref\n0 4\n0000000000 65535 f \n");
        foreach (var offset in offsets) text.Append(System.Globalization.CultureInfo.InvariantCulture, $"{offset:D10} 00000 n \n");
        text.Append(System.Globalization.CultureInfo.InvariantCulture, $"trailer\n<</Size 4/Root 1 0 R>>\nstartxref\n{table}\n%%EOF\n");
        return System.Text.Encoding.ASCII.GetBytes(text.ToString());
    }

    private async Task<byte[]> Sheet(Visitor visitor, string revision) =>
        await (await visitor.Page.Context.APIRequest.GetAsync($"{site.Address}{revision}/sheet.pdf")).BodyAsync();

    private string Expired()
    {
        using var key = ECDsa.Create(ECCurve.NamedCurves.nistP256);
        var request = new CertificateRequest("CN=Somebody", key, HashAlgorithmName.SHA256);
        request.CertificateExtensions.Add(new X509KeyUsageExtension(X509KeyUsageFlags.DigitalSignature, critical: true));
        using var certificate = request.CreateSelfSigned(new DateTimeOffset(2020, 1, 1, 0, 0, 0, TimeSpan.Zero), new DateTimeOffset(2021, 1, 1, 0, 0, 0, TimeSpan.Zero));
        return Written("expired.pfx", certificate.Export(X509ContentType.Pfx, "own"));
    }

    private string Written(string name, byte[] bytes)
    {
        var path = Path.Combine(folder, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }
}
