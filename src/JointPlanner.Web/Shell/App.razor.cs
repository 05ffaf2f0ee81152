using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Routing;
using Microsoft.AspNetCore.Components.Web;

namespace JointPlanner.Web.Shell;

/// <summary>The page around every page. Account pages stay plain HTML: signing in needs an ordinary answer that can set the cookie.</summary>
public sealed partial class App
{
    private RememberedPreferences preferences = new(false, null);

    [CascadingParameter]
    private HttpContext HttpContext { get; set; } = null!;

    private IComponentRenderMode? PageMode => HttpContext.AcceptsInteractiveRouting() ? RenderMode.InteractiveServer : null;

    /// <inheritdoc/>
    protected override void OnInitialized() => preferences = RememberedPreferences.From(HttpContext.Request.Cookies);
}
