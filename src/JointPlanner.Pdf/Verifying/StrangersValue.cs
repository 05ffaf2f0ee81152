using System.Formats.Asn1;
using System.Security.Cryptography;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Signatures and certificates of strangers are decoded by the platform, which answers broken ones by exceptions of many kinds.</summary>
internal static class StrangersValue
{
    /// <summary>The exception says that the value is broken, rather than that the program or the machine is.</summary>
    public static bool IsAtFault(Exception e) => e is CryptographicException or AsnContentException or ArgumentException
        or InvalidOperationException or FormatException or OverflowException or NotSupportedException;
}
