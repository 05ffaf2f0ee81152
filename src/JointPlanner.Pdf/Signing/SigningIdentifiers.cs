namespace JointPlanner.Pdf.Signing;

/// <summary>Object identifiers of the signature's parts.</summary>
internal static class SigningIdentifiers
{
    /// <summary>SHA-256 (NIST's registry of algorithms).</summary>
    public const string Sha256 = "2.16.840.1.101.3.4.2.1";

    /// <summary>The signed attribute that names the signer's certificate (RFC 5035).</summary>
    public const string SigningCertificateV2 = "1.2.840.113549.1.9.16.2.47";

    /// <summary>The unsigned attribute that holds a time stamp (RFC 3161, appendix A).</summary>
    public const string TimeStampToken = "1.2.840.113549.1.9.16.2.14";
}
