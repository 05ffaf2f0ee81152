using System.Formats.Asn1;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;

namespace JointPlanner.Pdf.Signing;

/// <summary>Makes the signature's value (RFC 5652, in the form of ETSI EN 319 142-1 that the /SubFilter names) over the signed bytes.</summary>
internal static class SignatureMaker
{
    // What the value holds besides certificates: two digests, names, the signature itself; measured at under 1,500 bytes for RSA-4096.
    private const int RoomForTheRest = 3000;
    private const int RoomForATimeStamp = 8192;

    public static int RoomNeeded(SignRequest request) =>
        request.Certificate.RawDataMemory.Length + Carried(request).Sum(certificate => certificate.RawDataMemory.Length) + RoomForTheRest + (request.TimeStamp is null ? 0 : RoomForATimeStamp);

    public static async Task<byte[]> MakeAsync(byte[] signed, SignRequest request, CancellationToken cancellation)
    {
        var signer = new CmsSigner(SubjectIdentifierType.IssuerAndSerialNumber, request.Certificate)
        {
            DigestAlgorithm = new Oid(SigningIdentifiers.Sha256),
            IncludeOption = X509IncludeOption.EndCertOnly,
        };
        signer.Certificates.AddRange(Carried(request));
        // No signing-time attribute: ETSI EN 319 142-1, 6.3 wants the time in the dictionary's /M alone.
        signer.SignedAttributes.Add(new AsnEncodedData(new Oid(SigningIdentifiers.SigningCertificateV2), NameOf(request.Certificate)));
        var cms = new SignedCms(new ContentInfo(signed), detached: true);
        try
        {
            cms.ComputeSignature(signer, silent: true);
        }
        catch (CryptographicException e)
        {
            throw new SigningRefusedException(SigningRefusal.KeyNotUsable, "The private key could not be used to sign.", e);
        }
        if (request.TimeStamp is { } source) cms.SignerInfos[0].AddUnsignedAttribute(new AsnEncodedData(new Oid(SigningIdentifiers.TimeStampToken), await StampAsync(cms.SignerInfos[0], source, cancellation)));
        return cms.Encode();
    }

    private static async Task<byte[]> StampAsync(SignerInfo signer, TimeStampSource source, CancellationToken cancellation)
    {
        var request = Rfc3161TimestampRequest.CreateFromSignerInfo(signer, HashAlgorithmName.SHA256, requestSignerCertificates: true, nonce: RandomNumberGenerator.GetBytes(8));
        Rfc3161TimestampToken token;
        try
        {
            token = await source(request, cancellation);
        }
        catch (Exception e) when (e is not OperationCanceledException || !cancellation.IsCancellationRequested)
        {
            throw new SigningRefusedException(SigningRefusal.NoTimeStamp, $"The time-stamp server gave no time stamp ({e.Message}). Nothing was signed; try again later.", e);
        }
        if (!token.VerifySignatureForSignerInfo(signer, out _))
            throw new SigningRefusedException(SigningRefusal.NoTimeStamp, "The time stamp that came back does not fit the signature. Nothing was signed.");
        return token.AsSignedCms().Encode();
    }

    private static X509Certificate2Collection Carried(SignRequest request) =>
        [.. request.Chain.Where(certificate => certificate.SubjectName.RawData.AsSpan().SequenceEqual(certificate.IssuerName.RawData) is false && !certificate.RawDataMemory.Span.SequenceEqual(request.Certificate.RawDataMemory.Span))];

    /// <summary>SigningCertificateV2 of RFC 5035; SHA-256 is its default digest, which DER therefore leaves out.</summary>
    private static byte[] NameOf(X509Certificate2 certificate)
    {
        var writer = new AsnWriter(AsnEncodingRules.DER);
        using (writer.PushSequence())
        using (writer.PushSequence())
        using (writer.PushSequence())
            writer.WriteOctetString(SHA256.HashData(certificate.RawDataMemory.Span));
        return writer.Encode();
    }
}
