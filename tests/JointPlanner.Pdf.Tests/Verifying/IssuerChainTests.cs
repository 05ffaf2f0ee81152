using System.Globalization;
using System.Net;
using System.Net.Sockets;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;
using JointPlanner.Pdf.Tests.Signing;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Tests.Verifying;

public class IssuerChainTests
{
    [Fact]
    public void The_policy_trusts_the_given_roots_alone_and_fetches_nothing()
    {
        var policy = IssuerChain.Policy(TestAuthority.Known.Roots, [], TestAuthority.SigningTime.UtcDateTime);
        Assert.Equal(X509ChainTrustMode.CustomRootTrust, policy.TrustMode);
        Assert.Equal(X509RevocationMode.NoCheck, policy.RevocationMode);
        Assert.True(policy.DisableCertificateDownloads);
        Assert.Equal(TestAuthority.Known.Root.RawData, Assert.Single(policy.CustomTrustStore).RawData);
    }

    [Fact]
    public async Task Addresses_written_in_a_hostile_certificate_are_not_called()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        string address = string.Create(CultureInfo.InvariantCulture, $"http://127.0.0.1:{((IPEndPoint)listener.LocalEndpoint).Port}/issuer.cer");
        var hostile = TestAuthority.Foreign.Ecdsa("CN=Hostile", more:
        [
            new X509AuthorityInformationAccessExtension([address], [address]),
            CertificateRevocationListBuilder.BuildCrlDistributionPointExtension([address]),
        ]);
        byte[] sheet = HandMadeSheet.WithTable();
        // Without the intermediate certificate, so that whoever fetches issuers would have to fetch one here.
        byte[] signed = (await Signer.SignAsync(sheet, Signed.Request(sheet, "designer", hostile) with { Chain = [] })).Bytes;
        var signature = new Verifier(TestAuthority.Known.Roots).Verify(signed).Signatures.Single();
        Assert.Equal(WhoVerdict.UnknownIssuer, signature.Who.Verdict);
        Assert.Equal("CN=Hostile", signature.Who.Subject);
        Assert.False(listener.Pending());

        // The trap works: with the platform's defaults the same certificate does call.
        using var chain = new X509Chain { ChainPolicy = { RevocationMode = X509RevocationMode.NoCheck, UrlRetrievalTimeout = TimeSpan.FromMilliseconds(500) } };
        chain.Build(X509CertificateLoader.LoadCertificate(hostile.RawData));
        Assert.True(listener.Pending());
    }

    [Fact]
    public void A_chain_without_its_intermediate_leads_to_no_root()
    {
        var bare = IssuerChain.Of(TestAuthority.Checker, [], TestAuthority.Known.Roots, TestAuthority.SigningTime);
        Assert.Null(bare.Root);
        var whole = IssuerChain.Of(TestAuthority.Checker, TestAuthority.Known.Chain, TestAuthority.Known.Roots, TestAuthority.SigningTime);
        Assert.Equal(TestAuthority.Known.Root.RawData, whole.Root!.RawData);
        Assert.True(whole.WithinDates);
    }

    [Fact]
    public void Outside_its_dates_a_chain_still_names_its_root()
    {
        var late = IssuerChain.Of(TestAuthority.Checker, TestAuthority.Known.Chain, TestAuthority.Known.Roots, new(2046, 1, 1, 0, 0, 0, TimeSpan.Zero));
        Assert.NotNull(late.Root);
        Assert.False(late.WithinDates);
    }
}
