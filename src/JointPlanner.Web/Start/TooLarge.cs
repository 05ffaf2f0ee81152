using Microsoft.AspNetCore.Http.Metadata;

namespace JointPlanner.Web.Start;

/// <summary>Answers a body that announces more than its page takes before anything reads it; else the form's reader would fail on it with no words for a person.</summary>
internal sealed class TooLarge(RequestDelegate next)
{
    public Task InvokeAsync(HttpContext context)
    {
        if (context.Request.ContentLength is not { } length || context.GetEndpoint()?.Metadata.GetMetadata<IRequestSizeLimitMetadata>()?.MaxRequestBodySize is not { } most || length <= most)
            return next(context);
        context.Response.StatusCode = StatusCodes.Status413PayloadTooLarge;
        return Task.CompletedTask;
    }
}
