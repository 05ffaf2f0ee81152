using System.Globalization;
using System.Threading.RateLimiting;

namespace JointPlanner.Web.Start;

/// <summary>How often one address may try what strangers can reach.</summary>
internal static class RateLimits
{
    internal const string Entering = "entering", Verifying = "verifying";

    internal static void AddRateLimits(this WebApplicationBuilder builder) => builder.Services.AddRateLimiter(limits =>
    {
        limits.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
        limits.AddPolicy(Entering, context => PerMinute(context, 20));
        limits.AddPolicy(Verifying, context => PerMinute(context, 10));
    });

    private static RateLimitPartition<string> PerMinute(HttpContext context, int most) =>
        // Looking at the form costs nothing; only what is sent counts.
        HttpMethods.IsPost(context.Request.Method)
            ? RateLimitPartition.GetFixedWindowLimiter(
                string.Create(CultureInfo.InvariantCulture, $"{context.Connection.RemoteIpAddress}"),
                _ => new FixedWindowRateLimiterOptions { PermitLimit = most, Window = TimeSpan.FromMinutes(1) })
            : RateLimitPartition.GetNoLimiter("looking");
}
