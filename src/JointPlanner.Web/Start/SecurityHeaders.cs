using System.Security.Cryptography;

namespace JointPlanner.Web.Start;

/// <summary>
/// Headers of every answer. No page may ask another host for anything; the one inline script, the import map, carries a nonce.
/// Styles stay open because the component library writes style elements and attributes without one.
/// </summary>
internal sealed class SecurityHeaders(RequestDelegate next)
{
    private static readonly object NonceKey = new();

    internal static string Nonce(HttpContext? context) => context?.Items[NonceKey] as string ?? "";

    public Task InvokeAsync(HttpContext context)
    {
        var nonce = Convert.ToBase64String(RandomNumberGenerator.GetBytes(16));
        context.Items[NonceKey] = nonce;
        var headers = context.Response.Headers;
        headers.ContentSecurityPolicy =
            $"default-src 'none'; script-src 'self' 'nonce-{nonce}'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; font-src 'self'; " +
            "connect-src 'self'; form-action 'self'; base-uri 'self'; frame-ancestors 'none'; manifest-src 'self'";
        headers.XContentTypeOptions = "nosniff";
        headers["Referrer-Policy"] = "same-origin";
        headers["Permissions-Policy"] = "camera=(), geolocation=(), microphone=(), payment=(), usb=()";
        headers["Cross-Origin-Opener-Policy"] = "same-origin";
        return next(context);
    }
}
