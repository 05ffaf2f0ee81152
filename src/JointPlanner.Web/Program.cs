using JointPlanner.Archive;
using JointPlanner.Web.Rooms.Accounts;
using JointPlanner.Web.Shell;
using JointPlanner.Web.Start;
using MudBlazor.Services;

var builder = WebApplication.CreateBuilder(args);
var refusals = Refusals.Before(builder.Configuration, builder.Environment);
if (refusals.Count > 0)
{
    foreach (var refusal in refusals) Console.Error.WriteLine($"Joint Planner does not start: {refusal}");
    return 3;
}

builder.WebHost.ConfigureKestrel(kestrel => kestrel.Limits.MaxRequestBodySize = 1 << 20);
builder.Services.AddRazorComponents().AddInteractiveServerComponents(Circuits.Configure);
builder.Services.AddMudServices();
builder.Services.AddHealthChecks();
builder.Services.AddHttpContextAccessor();
builder.Services.AddCascadingAuthenticationState();
builder.Services.AddScoped<Preferences>();
builder.Services.AddSingleton(new JointPlanner.Web.Rooms.Structure.PlanDesk(new Dictionary<string, JointPlanner.Engine.Bases.OwnerRuleSet>()));
builder.Services.AddSingleton(DemoMode.From(builder.Configuration));
builder.AddTrustedProxies();
builder.AddArchive();
builder.AddRateLimits();

var app = builder.Build();

app.UseForwardedHeaders();
app.UseMiddleware<SecurityHeaders>();
if (!app.Environment.IsDevelopment())
{
    app.UseExceptionHandler("/error", createScopeForErrors: true);
    app.UseHsts();
}

app.UseStatusCodePagesWithReExecute("/status/{0}");
app.UseAuthentication();
app.UseRateLimiter();
app.UseAuthorization();
app.UseAntiforgery();
app.MapStaticAssets();
app.MapHealthChecks("/health");
app.MapLeaving();
app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null);
try
{
    await app.ReadyArchive();
}
catch (ArchiveNotReady refusal)
{
    Console.Error.WriteLine($"Joint Planner does not start: {refusal.Message}");
    await app.DisposeAsync();
    return 3;
}

await app.RunAsync();
return 0;
