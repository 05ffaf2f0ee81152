using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using System.Text;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Time stamps (RFC 3161) by OpenSSL as the time-stamp server, without a network.</summary>
public sealed class TimeStampTests : IDisposable
{
    private static readonly byte[] Sheet = HandMadeSheet.WithStream();

    private readonly OutsideTool _tool = new();

    [Fact]
    public async Task A_time_stamp_by_a_trusted_server_answers_when()
    {
        byte[] signed = await Stamped(TestAuthority.Known);
        var signature = new Verifier(TestAuthority.Known.Roots).Verify(signed).Signatures.Single();
        Assert.Equal(UnchangedVerdict.Unchanged, signature.Unchanged.Verdict);
        Assert.Equal(WhenVerdict.TimeStamped, signature.When.Verdict);
        Assert.Contains("by the time stamp of CN=Clock", signature.When.Text, StringComparison.Ordinal);
        Assert.NotEqual(TestAuthority.SigningTime, signature.When.Instant);
        _tool.Write("signed.pdf", signed);
        Assert.Contains("Signature is Valid", _tool.Run("pdfsig", "-nocert", "signed.pdf").Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_time_stamp_by_an_unknown_server_leaves_the_signers_word()
    {
        var signature = new Verifier(TestAuthority.Known.Roots).Verify(await Stamped(TestAuthority.Foreign)).Signatures.Single();
        Assert.Equal(WhenVerdict.ClaimedBySigner, signature.When.Verdict);
        Assert.Equal(TestAuthority.SigningTime, signature.When.Instant);
        Assert.Contains("not proven", signature.When.Text, StringComparison.Ordinal);
        Assert.Contains("a server not trusted here", signature.When.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_server_that_is_down_means_nothing_is_signed()
    {
        var request = Signed.Request(Sheet, "designer", TestAuthority.Designer) with { TimeStamp = (_, _) => throw new HttpRequestException("connection refused") };
        var refused = await Assert.ThrowsAsync<SigningRefusedException>(() => Signer.SignAsync(Sheet, request));
        Assert.Equal(SigningRefusal.NoTimeStamp, refused.Refusal);
        Assert.Contains("connection refused", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_time_stamp_for_something_else_is_refused()
    {
        using var clock = Clock(TestAuthority.Known);
        var other = Rfc3161TimestampRequest.CreateFromData("something else"u8, HashAlgorithmName.SHA256, requestSignerCertificates: true);
        var request = Signed.Request(Sheet, "designer", TestAuthority.Designer) with { TimeStamp = (_, _) => Task.FromResult(Ask(other, clock)) };
        Assert.Equal(SigningRefusal.NoTimeStamp, (await Assert.ThrowsAsync<SigningRefusedException>(() => Signer.SignAsync(Sheet, request))).Refusal);
    }

    public void Dispose() => _tool.Dispose();

    private static X509Certificate2 Clock(TestAuthority authority) => authority.Ecdsa("CN=Clock", usage: X509KeyUsageFlags.DigitalSignature,
        more: new X509EnhancedKeyUsageExtension([new Oid("1.3.6.1.5.5.7.3.8")], critical: true));

    private async Task<byte[]> Stamped(TestAuthority clocks)
    {
        using var clock = Clock(clocks);
        _tool.Write("chain.pem", Encoding.ASCII.GetBytes(clocks.Intermediate.ExportCertificatePem()));
        var request = Signed.Request(Sheet, "designer", TestAuthority.Designer) with { TimeStamp = (asked, _) => Task.FromResult(Ask(asked, clock)) };
        return (await Signer.SignAsync(Sheet, request)).Bytes;
    }

    private Rfc3161TimestampToken Ask(Rfc3161TimestampRequest request, X509Certificate2 clock)
    {
        using var key = clock.GetECDsaPrivateKey()!;
        _tool.Write("clock.pem", Encoding.ASCII.GetBytes(clock.ExportCertificatePem()));
        _tool.Write("clock.key", Encoding.ASCII.GetBytes(key.ExportPkcs8PrivateKeyPem()));
        _tool.Write("serial", "01\n"u8.ToArray());
        _tool.Write("tsa.cnf", """
            [tsa]
            default_tsa = clock
            [clock]
            serial = serial
            signer_digest = sha256
            default_policy = 1.2.3.4.1
            digests = sha256
            ess_cert_id_alg = sha256
            ess_cert_id_chain = no
            """u8.ToArray());
        _tool.Write("request.tsq", request.Encode());
        string[] chain = File.Exists(_tool.PathOf("chain.pem")) ? ["-chain", "chain.pem"] : [];
        var (exit, output) = _tool.Run("openssl", ["ts", "-reply", "-config", "tsa.cnf", "-section", "clock", "-queryfile", "request.tsq", "-signer", "clock.pem", "-inkey", "clock.key", .. chain, "-out", "reply.tsr"]);
        Assert.True(exit == 0, output);
        return request.ProcessResponse(_tool.Read("reply.tsr"), out _);
    }
}
