namespace JointPlanner.Pdf.Signing;

/// <summary>Why a sheet was not signed.</summary>
public enum SigningRefusal
{
    /// <summary>The PDF cannot be read.</summary>
    NotReadable,

    /// <summary>The bytes are not the ones that the signer was shown.</summary>
    OtherBytes,

    /// <summary>The PDF has no prepared, empty signature field of that name: it is not a sheet of this program, or the name is wrong.</summary>
    NoSuchField,

    /// <summary>The field is signed already.</summary>
    FieldAlreadySigned,

    /// <summary>The certificate comes without its private key.</summary>
    NoPrivateKey,

    /// <summary>The certificate's key or the way it was issued is too weak.</summary>
    WeakCertificate,

    /// <summary>The certificate has expired at the signing time.</summary>
    CertificateExpired,

    /// <summary>The certificate is not valid yet at the signing time.</summary>
    CertificateNotYetValid,

    /// <summary>The certificate is not made for signing.</summary>
    KeyUsage,

    /// <summary>The same key has signed another field of the sheet.</summary>
    KeyUsedInOtherField,

    /// <summary>Certification is possible only with the first signature.</summary>
    CertificationNotFirst,

    /// <summary>The signature is larger than the room reserved for it.</summary>
    HoleTooSmall,

    /// <summary>The time-stamp server gave no usable time stamp.</summary>
    NoTimeStamp,

    /// <summary>A text for the signature cannot be written.</summary>
    TextNotWritable,

    /// <summary>The private key could not be used.</summary>
    KeyNotUsable,
}

/// <summary>A sheet was not signed; nothing was written.</summary>
/// <param name="refusal">The reason, for programs.</param>
/// <param name="message">The reason, for people, with what to do.</param>
/// <param name="inner">What stood behind it, if anything.</param>
public sealed class SigningRefusedException(SigningRefusal refusal, string message, Exception? inner = null) : Exception(message, inner)
{
    /// <summary>The reason, for programs.</summary>
    public SigningRefusal Refusal { get; } = refusal;
}
