using Microsoft.Playwright;

namespace JointPlanner.EndToEnd.Tests;

/// <summary>
/// Pictures that a journey takes on its way. JOINTPLANNER_WRITE_PICTURES=1 writes those of the README to deploy/pictures; a folder's path there
/// writes all of them to that folder, whole pages where they are not for the README.
/// </summary>
internal static class Pictures
{
    /// <summary>Takes a picture where one is asked for.</summary>
    public static async Task Picture(this RunningSite site, IPage page, string name, bool isForReadme = false)
    {
        if (Environment.GetEnvironmentVariable("JOINTPLANNER_WRITE_PICTURES") is not { Length: > 0 } wanted || (wanted == "1" && !isForReadme)) return;
        await page.EvaluateAsync("() => { scrollTo(0, 0); document.activeElement?.blur(); }");
        await page.ScreenshotAsync(new() { Path = Path.Combine(wanted == "1" ? OfReadme() : wanted, $"{name}.png"), FullPage = !isForReadme });
    }

    private static string OfReadme()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (File.Exists(Path.Combine(folder.FullName, "JointPlanner.sln"))) return Directory.CreateDirectory(Path.Combine(folder.FullName, "deploy", "pictures")).FullName;
        throw new DirectoryNotFoundException("No folder above the tests holds JointPlanner.sln.");
    }
}
