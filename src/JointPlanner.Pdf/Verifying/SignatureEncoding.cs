using System.Formats.Asn1;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Checks the parts of a signature's value that the signature does not protect and that the platform does not look at.</summary>
internal static class SignatureEncoding
{
    private const string SignedData = "1.2.840.113549.1.7.2";
    private const string Data = "1.2.840.113549.1.7.1";

    /// <summary>The value is written in DER, as ISO 32000-2, 12.8.3.3 wants it, and its versions and digests agree (RFC 5652, 5.1 and 5.3).</summary>
    /// <remarks>Throws <see cref="AsnContentException"/> where it is not even that far in order.</remarks>
    public static bool IsPlain(ReadOnlyMemory<byte> value)
    {
        var all = new AsnReader(value, AsnEncodingRules.DER);
        var outer = all.ReadSequence();
        all.ThrowIfNotEmpty();
        if (outer.ReadObjectIdentifier() != SignedData) return false;
        var holder = outer.ReadSequence(new Asn1Tag(TagClass.ContextSpecific, 0));
        outer.ThrowIfNotEmpty();
        var signed = holder.ReadSequence();
        holder.ThrowIfNotEmpty();
        if (!signed.TryReadInt32(out int version)) return false;
        var digests = signed.ReadSetOf();
        string digest = Algorithm(digests.ReadSequence());
        digests.ThrowIfNotEmpty();
        var content = signed.ReadSequence();
        if (content.ReadObjectIdentifier() != Data) return false;
        content.ThrowIfNotEmpty();
        signed.ReadSetOf(new Asn1Tag(TagClass.ContextSpecific, 0)); // the certificates; which one signed is checked elsewhere
        var signers = signed.ReadSetOf();
        signed.ThrowIfNotEmpty();
        var signer = signers.ReadSequence();
        signers.ThrowIfNotEmpty();
        return SignerIsPlain(signer, version, digest);
    }

    private static bool SignerIsPlain(AsnReader signer, int version, string digest)
    {
        if (!signer.TryReadInt32(out int own) || own != version) return false;
        bool byIssuer = signer.PeekTag().HasSameClassAndValue(Asn1Tag.Sequence);
        if (own != (byIssuer ? 1 : 3)) return false;
        signer.ReadEncodedValue();
        if (Algorithm(signer.ReadSequence()) != digest) return false;
        signer.ReadSetOf(skipSortOrderValidation: true, new Asn1Tag(TagClass.ContextSpecific, 0));
        signer.ReadSequence();
        signer.ReadOctetString();
        if (signer.HasData) signer.ReadSetOf(skipSortOrderValidation: true, new Asn1Tag(TagClass.ContextSpecific, 1));
        signer.ThrowIfNotEmpty();
        return true;
    }

    private static string Algorithm(AsnReader algorithm)
    {
        string identifier = algorithm.ReadObjectIdentifier();
        if (algorithm.HasData) algorithm.ReadNull();
        algorithm.ThrowIfNotEmpty();
        return identifier;
    }
}
