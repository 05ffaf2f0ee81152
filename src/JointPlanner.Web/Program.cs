using JointPlanner.Archive;
using JointPlanner.Issuing;
using JointPlanner.Issuing.Setting;
using JointPlanner.Web.Rooms.Accounts;
using JointPlanner.Web.Rooms.Revisions;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Rooms.Structures;
using JointPlanner.Web.Shell;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.SignalR;
using MudBlazor.Services;

var builder = WebApplication.CreateBuilder(args);
var refusals = Refusals.Before(builder.Configuration, builder.Environment);
if (refusals.Count > 0) return Stop(refusals);

builder.WebHost.ConfigureKestrel(kestrel => kestrel.Limits.MaxRequestBodySize = 1 << 20);
builder.Services.AddRazorComponents().AddInteractiveServerComponents(Circuits.Configure)
    .AddHubOptions(hub => hub.AddFilter(new CircuitsPerAddress(builder.Configuration.GetValue("Circuits:PerAddress", CircuitsPerAddress.Usual))));
builder.Services.AddMudServices();
builder.Services.AddHealthChecks();
builder.Services.AddHttpContextAccessor();
builder.Services.AddCascadingAuthenticationState();
builder.Services.AddScoped<Preferences>();
builder.Services.AddScoped<JointPlanner.Web.Shared.Handout>();
// Handed-in files stay in memory: nothing of them is written to a temporary folder.
builder.Services.Configure<Microsoft.AspNetCore.Http.Features.FormOptions>(form => form.MemoryBufferThreshold = 26 << 20);
builder.Services.AddSingleton(TrustedRoots.Open(ArchiveSetup.Folder(builder.Configuration, builder.Environment)));
builder.Services.AddSingleton(new PlanDesk(OwnerRuleShelf.Read(Path.Combine(AppContext.BaseDirectory, "seed-data", "owner-rules"))));
builder.Services.AddSingleton(DemoMode.From(builder.Configuration));
builder.AddTrustedProxies();
builder.Services.AddSingleton<PublicAddress>();
try
{
    builder.AddArchive();
}
catch (ArchiveNotReady refusal)
{
    return Stop([refusal.Message]);
}

builder.AddRateLimits();
builder.Services.AddSingleton<RevisionDesk>();
builder.Services.AddSingleton<SetDayDesk>();
builder.Services.AddSingleton<FormSays>();
builder.Services.AddSingleton<FirstDraft>();

var app = builder.Build();

app.UseForwardedHeaders();
app.UseMiddleware<SecurityHeaders>();
var isDemo = app.Services.GetRequiredService<DemoMode>().IsOn;
if (isDemo || !app.Environment.IsDevelopment()) app.UseExceptionHandler("/error", createScopeForErrors: true);
if (!app.Environment.IsDevelopment()) app.UseHsts();

app.UseStatusCodePagesWithReExecute("/status/{0}");
app.UseAuthentication();
app.UseRateLimiter();
app.UseAuthorization();
app.UseMiddleware<TooLarge>();
app.UseAntiforgery();
app.MapStaticAssets().AllowAnonymous();
app.MapHealthChecks("/health").AllowAnonymous();
app.MapAccounts();
app.MapSheets();
app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null)
    .OpenMachinery();
try
{
    await app.ReadyArchive();
}
catch (ArchiveNotReady refusal)
{
    await app.DisposeAsync();
    return Stop([refusal.Message]);
}

await app.RunAsync();
return 0;

static int Stop(IEnumerable<string> refusals)
{
    foreach (var refusal in refusals) Console.Error.WriteLine($"Joint Planner does not start: {refusal}");
    return 3;
}
