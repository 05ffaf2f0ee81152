using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Signing;
using JointPlanner.Pdf.Tests.Reading;

namespace JointPlanner.Pdf.Tests.Signing;

public class SignerTests
{
    private static readonly byte[] Sheet = HandMadeSheet.WithStream();

    [Fact]
    public async Task The_signed_file_begins_with_the_unsigned_one_byte_for_byte()
    {
        var signed = await Signer.SignAsync(Sheet, Signed.Request(Sheet, "designer", TestAuthority.Designer));
        Assert.Equal(Sheet, signed.Bytes[..Sheet.Length]);
        Assert.Equal(Sheet.Length, signed.PrefixLength);
        Assert.Equal(signed.Bytes[Sheet.Length..], signed.Appended.ToArray());
        Assert.Equal(Convert.ToHexString(SHA256.HashData(signed.Bytes)), signed.Sha256);
        Assert.Equal(2, PdfRevisions.Open(signed.Bytes).All.Count);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    [InlineData("fa-IR")]
    public async Task The_update_does_not_depend_on_the_users_culture(string culture)
    {
        // RSA with PKCS #1 padding gives the same signature each time, so whole files can be compared.
        var plain = await Signer.SignAsync(Sheet, Signed.Request(Sheet, "designer", TestAuthority.Designer));
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            var there = await Signer.SignAsync(Sheet, Signed.Request(Sheet, "designer", TestAuthority.Designer));
            Assert.Equal(plain.Sha256, there.Sha256);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public async Task Other_bytes_than_those_shown_are_not_signed() =>
        Assert.Contains("SHA-256 differs", await Refusal(SigningRefusal.OtherBytes, Signed.Request(Sheet, "designer", TestAuthority.Designer) with { ExpectedSha256 = new string('0', 64) }), StringComparison.Ordinal);

    [Fact]
    public async Task A_field_is_signed_once()
    {
        byte[] signed = await Signed.By(Sheet, "designer", TestAuthority.Designer);
        await Refusal(SigningRefusal.FieldAlreadySigned, Signed.Request(signed, "designer", TestAuthority.Checker), signed);
    }

    [Fact]
    public async Task A_field_that_was_not_prepared_is_named_beside_those_that_were() =>
        Assert.Contains("designer; checker", await Refusal(SigningRefusal.NoSuchField, Signed.Request(Sheet, "owner", TestAuthority.Designer)), StringComparison.Ordinal);

    [Fact]
    public async Task A_pdf_without_prepared_fields_is_not_ours()
    {
        byte[] other = HandMadeSheet.WithoutFields();
        Assert.Contains("not a sheet made by this program", await Refusal(SigningRefusal.NoSuchField, Signed.Request(other, "designer", TestAuthority.Designer), other), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_file_that_is_no_pdf_is_refused()
    {
        byte[] text = "a letter"u8.ToArray();
        await Refusal(SigningRefusal.NotReadable, Signed.Request(text, "designer", TestAuthority.Designer), text);
    }

    [Fact]
    public async Task A_certificate_without_its_private_key_is_refused() =>
        await Refusal(SigningRefusal.NoPrivateKey, Signed.Request(Sheet, "designer", X509CertificateLoader.LoadCertificate(TestAuthority.Designer.RawData)));

    [Fact]
    public async Task An_expired_certificate_is_refused_with_its_date()
    {
        var expired = TestAuthority.Known.Ecdsa("CN=Late", to: new(2024, 3, 31, 12, 0, 0, TimeSpan.Zero));
        Assert.Contains("expired on 2024-03-31 12:00:00 UTC", await Refusal(SigningRefusal.CertificateExpired, Signed.Request(Sheet, "designer", expired)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_certificate_that_is_not_valid_yet_is_refused_with_its_date()
    {
        var early = TestAuthority.Known.Ecdsa("CN=Early", from: new(2026, 1, 1, 0, 0, 0, TimeSpan.Zero));
        Assert.Contains("only from 2026-01-01 00:00:00 UTC", await Refusal(SigningRefusal.CertificateNotYetValid, Signed.Request(Sheet, "designer", early)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_certificate_for_another_use_is_refused() =>
        await Refusal(SigningRefusal.KeyUsage, Signed.Request(Sheet, "designer", TestAuthority.Known.Ecdsa("CN=Box", usage: X509KeyUsageFlags.CrlSign)));

    [Theory]
    [InlineData(X509KeyUsageFlags.DigitalSignature)]
    [InlineData(X509KeyUsageFlags.NonRepudiation)]
    public async Task Either_signing_use_is_enough(X509KeyUsageFlags usage) =>
        Assert.NotEmpty(await Signed.By(Sheet, "designer", TestAuthority.Known.Ecdsa("CN=One Use", usage: usage)));

    [Fact]
    public async Task An_rsa_key_under_2048_bits_is_refused() =>
        Assert.Contains("1024 bits", await Refusal(SigningRefusal.WeakCertificate, Signed.Request(Sheet, "designer", TestAuthority.Known.Rsa("CN=Weak", 1024))), StringComparison.Ordinal);

    [Fact]
    public async Task A_certificate_issued_with_sha1_is_refused()
    {
        using var key = RSA.Create(2048);
        using var old = OldFashionedIssuer.Issue("CN=Old", key).CopyWithPrivateKey(key);
        Assert.Contains("SHA-1", await Refusal(SigningRefusal.WeakCertificate, Signed.Request(Sheet, "designer", old)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task One_key_cannot_sign_both_fields_even_under_two_certificates()
    {
        byte[] signed = await Signed.By(Sheet, "checker", TestAuthority.Checker);
        var twin = TestAuthority.Known.Again(TestAuthority.Checker, "CN=Somebody Else");
        Assert.Contains("checker is signed with the same key", await Refusal(SigningRefusal.KeyUsedInOtherField, Signed.Request(signed, "designer", twin), signed), StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_hole_that_is_too_small_is_refused_with_both_sizes() =>
        Assert.Contains("but 100 are reserved", await Refusal(SigningRefusal.HoleTooSmall, Signed.Request(Sheet, "designer", TestAuthority.Designer) with { ReservedBytes = 100 }), StringComparison.Ordinal);

    [Fact]
    public async Task Only_the_first_signature_can_certify()
    {
        byte[] signed = await Signed.By(Sheet, "designer", TestAuthority.Designer);
        await Refusal(SigningRefusal.CertificationNotFirst, Signed.Request(signed, "checker", TestAuthority.Checker) with { Certify = true }, signed);
    }

    [Fact]
    public async Task A_sheet_whose_first_signature_is_broken_is_not_signed_further()
    {
        byte[] signed = await Signed.By(Sheet, "designer", TestAuthority.Designer);
        signed[12] ^= 1; // in the comment line behind the head
        await Refusal(SigningRefusal.NotReadable, Signed.Request(signed, "checker", TestAuthority.Checker), signed);
    }

    [Theory]
    [InlineData("Dana\u202Eresigned")]
    [InlineData("Dana\nDesigner")]
    [InlineData("")]
    public async Task A_name_that_could_mislead_is_refused(string name) =>
        await Refusal(SigningRefusal.TextNotWritable, Signed.Request(Sheet, "designer", TestAuthority.Designer) with { SignerName = name });

    private static async Task<string> Refusal(SigningRefusal expected, SignRequest request, byte[]? pdf = null)
    {
        var refused = await Assert.ThrowsAsync<SigningRefusedException>(() => Signer.SignAsync(pdf ?? Sheet, request));
        Assert.Equal(expected, refused.Refusal);
        return refused.Message;
    }
}
