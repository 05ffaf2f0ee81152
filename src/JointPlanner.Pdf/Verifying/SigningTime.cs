using System.Globalization;
using System.Security.Cryptography;
using System.Security.Cryptography.Pkcs;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Pdf.Signing;

namespace JointPlanner.Pdf.Verifying;

/// <summary>Words the answer to "when?".</summary>
internal static class SigningTime
{
    public static WhenStatement Of(SignatureValue value, string? stated, X509Certificate2Collection roots)
    {
        string note = "";
        foreach (var attribute in value.Signer.UnsignedAttributes)
        {
            if (attribute.Oid.Value != SigningIdentifiers.TimeStampToken) continue;
            if (Stamped(attribute, value.Signer, roots) is { } stamp) return stamp;
            note = " It carries a time stamp, but that is by a server not trusted here or does not fit.";
        }
        return Parse(stated) is { } instant
            ? new(WhenVerdict.ClaimedBySigner, Invariant($"{instant:yyyy-MM-dd HH:mm:ss} UTC: claimed by the signer, not proven.{note}"), instant)
            : new(WhenVerdict.NotStated, $"The signature states no time.{note}", null);
    }

    private static WhenStatement? Stamped(CryptographicAttributeObject attribute, SignerInfo signer, X509Certificate2Collection roots)
    {
        try
        {
            if (attribute.Values.Count != 1 || !Rfc3161TimestampToken.TryDecode(attribute.Values[0].RawData, out var token, out _))
                return null;
            if (!token.VerifySignatureForSignerInfo(signer, out var server) || server is null) return null;
            var instant = token.TokenInfo.Timestamp.ToUniversalTime();
            var chain = IssuerChain.Of(server, token.AsSignedCms().Certificates, roots, instant);
            if (chain.Root is null || !chain.WithinDates) return null;
            return new(WhenVerdict.TimeStamped, Invariant($"{instant:yyyy-MM-dd HH:mm:ss} UTC, by the time stamp of {PlainText.Of(server.Subject)}, vouched for by {PlainText.Of(chain.Root.Subject)}."), instant);
        }
        catch (Exception e) when (StrangersValue.IsAtFault(e))
        {
            return null;
        }
    }

    /// <summary>A date of ISO 32000-2, 7.9.4, given to the second.</summary>
    internal static DateTimeOffset? Parse(string? text)
    {
        if (text is null || text.Length is < 16 or > 23 || !text.StartsWith("D:", StringComparison.Ordinal)) return null;
        if (!DateTime.TryParseExact(text.AsSpan(2, 14), "yyyyMMddHHmmss", CultureInfo.InvariantCulture, DateTimeStyles.None, out var local))
            return null;
        string zone = text[16..].TrimEnd('\'').Replace("'", "", StringComparison.Ordinal);
        if (zone is "" or "Z" or "Z00" or "Z0000") zone = "+0000";
        if (zone.Length == 3) zone += "00";
        if (zone.Length != 5 || zone[0] is not ('+' or '-') || !int.TryParse(zone.AsSpan(1), NumberStyles.None, CultureInfo.InvariantCulture, out int digits))
            return null;
        int minutes = digits / 100 * 60 + digits % 100;
        if (digits % 100 > 59 || minutes > 14 * 60 || local.Year is < 1900 or > 9000) return null;
        return new DateTimeOffset(local, TimeSpan.FromMinutes(zone[0] == '-' ? -minutes : minutes)).ToUniversalTime();
    }

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
