using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive;
using JointPlanner.Archive.People;
using JointPlanner.Archive.PostgreSql;
using JointPlanner.Archive.Sqlite;
using JointPlanner.Web.Rooms.Accounts;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.DataProtection;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Web.Start;

/// <summary>The database, the people in it and the keys that protect their sign-in.</summary>
internal static class ArchiveSetup
{
    internal static void AddArchive(this WebApplicationBuilder builder)
    {
        var (services, configuration) = (builder.Services, builder.Configuration);
        services.AddArchive(Open(configuration, builder.Environment));
        services.AddScoped<Shared.Caller>();
        services.AddSingleton<PasswordMark>();
        services.AddScoped<Door>();

        var keys = services.AddDataProtection().SetApplicationName("joint-planner").PersistKeysToDbContext<ArchiveContext>();
        if (configuration["Keys:Certificate"] is { Length: > 0 } certificate)
            keys.ProtectKeysWithCertificate(X509CertificateLoader.LoadPkcs12FromFile(certificate, configuration["Keys:Password"]));

        services.AddIdentityCore<Person>(Accounts).AddEntityFrameworkStores<ArchiveContext>().AddSignInManager().AddDefaultTokenProviders();
        services.AddScoped<IUserClaimsPrincipalFactory<Person>, PersonClaims>();
        services.AddAuthentication(IdentityConstants.ApplicationScheme).AddIdentityCookies();
        services.AddDoors();
        services.AddScoped<AuthenticationStateProvider, StillWelcome>();
        services.Configure<SecurityStampValidatorOptions>(options =>
        {
            options.ValidationInterval = TimeSpan.FromMinutes(2);
            options.OnRefreshingPrincipal = PasswordMark.Keep;
        });
        services.ConfigureApplicationCookie(cookie =>
        {
            cookie.LoginPath = "/account/enter";
            cookie.AccessDeniedPath = "/status/403";
            cookie.ReturnUrlParameter = "back";
            cookie.Cookie.Name = "joint-planner";
            cookie.Cookie.HttpOnly = true;
            cookie.Cookie.SameSite = SameSiteMode.Lax;
            // Plain HTTP exists in Development on loopback only; start-up sees to that.
            cookie.Cookie.SecurePolicy = builder.Environment.IsDevelopment() ? CookieSecurePolicy.SameAsRequest : CookieSecurePolicy.Always;
            cookie.ExpireTimeSpan = TimeSpan.FromHours(10);
        });
    }

    /// <summary>Brings the database up where this program may, and makes sure that it may work on it.</summary>
    /// <exception cref="ArchiveNotReady">It may not.</exception>
    internal static async Task ReadyArchive(this WebApplication app)
    {
        var archive = app.Services.GetRequiredService<ArchiveDatabase>();
        app.Lifetime.ApplicationStopped.Register(() => archive.DisposeAsync().AsTask().GetAwaiter().GetResult());
        var migratesHere = archive is SqliteArchive || app.Environment.IsDevelopment();
        if (migratesHere) await archive.Migrate();
        await archive.AssertReady(app.Environment.IsProduction());
        if (!app.Environment.IsDevelopment())
        {
            await archive.AssertNoDemonstration();
            DemoTraces.Refuse(Folder(app.Configuration, app.Environment));
        }

        if (app.Services.GetRequiredService<DemoMode>().IsOn) await DemoSeed.Sow(app);
    }

    private static ArchiveDatabase Open(ConfigurationManager configuration, IHostEnvironment environment) => configuration["Archive:Kind"] switch
    {
        null or "" or "sqlite" => new SqliteArchive(Path.Combine(Folder(configuration, environment), "archive.db")),
        "postgresql" => new PostgreSqlArchive(
            configuration["Archive:ConnectionString"] ?? throw new ArchiveNotReady("Archive:Kind is postgresql, but Archive:ConnectionString is missing."),
            configuration["Archive:AppRole"]),
        var other => throw new ArchiveNotReady($"Archive:Kind is \"{other}\". Allowed are sqlite and postgresql."),
    };

    /// <summary>The folder of this installation's own files.</summary>
    internal static string Folder(IConfiguration configuration, IHostEnvironment environment) =>
        configuration["Archive:Folder"] is { Length: > 0 } folder ? folder : Path.Combine(environment.ContentRootPath, "data");

    private static void Accounts(IdentityOptions options)
    {
        options.Password.RequiredLength = 12;
        options.Password.RequireDigit = options.Password.RequireLowercase = options.Password.RequireUppercase = options.Password.RequireNonAlphanumeric = false;
        options.Password.RequiredUniqueChars = 6;
        options.Lockout.MaxFailedAccessAttempts = 5;
        options.Lockout.DefaultLockoutTimeSpan = TimeSpan.FromMinutes(10);
        options.User.RequireUniqueEmail = false;
    }
}
