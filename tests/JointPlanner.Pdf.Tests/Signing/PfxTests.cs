using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Tests.Signing;

public class PfxTests
{
    private const string Password = "Brücke-7";

    [Fact]
    public void The_key_and_its_chain_come_out_of_the_file()
    {
        using var key = Pfx.Load(File(TestAuthority.Checker), Password).Key;
        Assert.NotNull(key);
        Assert.Equal(TestAuthority.Checker.RawData, key.Certificate.RawData);
        Assert.True(key.Certificate.HasPrivateKey);
        Assert.Equal(2, key.Chain.Count);
    }

    [Fact]
    public async Task A_sheet_is_signed_with_a_loaded_key()
    {
        byte[] sheet = Reading.HandMadeSheet.WithStream();
        using var key = Pfx.Load(File(TestAuthority.Designer), Password).Key;
        var request = Signed.Request(sheet, "designer", key!.Certificate) with { Chain = key.Chain };
        Assert.True((await Signer.SignAsync(sheet, request)).Appended.Length > 0);
    }

    [Fact]
    public void A_wrong_password_is_told_from_a_broken_file()
    {
        Assert.Equal(PfxFailure.WrongPassword, Pfx.Load(File(TestAuthority.Checker), "bruecke-7").Failure);
        byte[] broken = File(TestAuthority.Checker);
        Assert.Equal(PfxFailure.NotAKeyFile, Pfx.Load(broken.AsSpan(0, broken.Length / 2), Password).Failure);
        Assert.Equal(PfxFailure.NotAKeyFile, Pfx.Load("no key file"u8, Password).Failure);
    }

    [Fact]
    public void A_file_over_32_KiB_is_not_opened() =>
        Assert.Equal(PfxFailure.TooLarge, Pfx.Load(new byte[(32 * 1024) + 1], Password).Failure);

    [Fact]
    public void A_file_without_a_private_key_is_told()
    {
        X509Certificate2Collection bare = [X509CertificateLoader.LoadCertificate(TestAuthority.Checker.RawData)];
        Assert.Equal(PfxFailure.NoPrivateKey, Pfx.Load(bare.Export(X509ContentType.Pkcs12, Password)!, Password).Failure);
    }

    [Fact]
    public void A_file_with_two_private_keys_is_told()
    {
        X509Certificate2Collection two = [TestAuthority.Checker, TestAuthority.Designer];
        Assert.Equal(PfxFailure.SeveralKeys, Pfx.Load(two.Export(X509ContentType.Pkcs12, Password)!, Password).Failure);
    }

    private static byte[] File(X509Certificate2 certificate)
    {
        X509Certificate2Collection all = [certificate, .. TestAuthority.Known.Chain];
        return all.Export(X509ContentType.Pkcs12, Password) ?? throw new CryptographicException("no key file was made");
    }
}
