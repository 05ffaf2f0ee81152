using MudBlazor;

namespace JointPlanner.Web.Shell;

/// <summary>Colours and type for the component library: paper and ink, one accent. The same colours stand in paper.css for our own parts.</summary>
internal static class Paper
{
    internal static readonly MudTheme Theme = new()
    {
        PaletteLight = new PaletteLight
        {
            Black = "#1b2024",
            Primary = "#0b5d52",
            PrimaryContrastText = "#ffffff",
            Secondary = "#4a535a",
            SecondaryContrastText = "#ffffff",
            Tertiary = "#4a535a",
            Info = "#2c4a63",
            Success = "#2f5a2f",
            Warning = "#6b4a00",
            Error = "#8a1f1f",
            Background = "#f7f5ef",
            BackgroundGray = "#efece3",
            Surface = "#fffefa",
            AppbarBackground = "#f7f5ef",
            AppbarText = "#1b2024",
            DrawerBackground = "#f7f5ef",
            DrawerText = "#1b2024",
            TextPrimary = "#1b2024",
            TextSecondary = "#4a535a",
            ActionDefault = "#4a535a",
            Divider = "#d8d2c4",
            LinesDefault = "#d8d2c4",
            LinesInputs = "#6f6a5d",
            TableLines = "#d8d2c4",
        },
        PaletteDark = new PaletteDark
        {
            Black = "#0d1012",
            Primary = "#7fcdbd",
            PrimaryContrastText = "#0d1a18",
            Secondary = "#b2b8b6",
            SecondaryContrastText = "#14181a",
            Tertiary = "#b2b8b6",
            Info = "#a8c6de",
            Success = "#a9cfa0",
            Warning = "#e2c07a",
            Error = "#f0a5a0",
            Background = "#14181a",
            BackgroundGray = "#1a1f22",
            Surface = "#1c2225",
            AppbarBackground = "#14181a",
            AppbarText = "#ebe7de",
            DrawerBackground = "#14181a",
            DrawerText = "#ebe7de",
            TextPrimary = "#ebe7de",
            TextSecondary = "#b2b8b6",
            ActionDefault = "#b2b8b6",
            Divider = "#343b3f",
            LinesDefault = "#343b3f",
            LinesInputs = "#8b918f",
            TableLines = "#343b3f",
        },
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "3px" },
        Typography = new Typography { Default = new DefaultTypography { FontFamily = ["IBM Plex Sans", "system-ui", "sans-serif"], FontSize = "1rem" } },
    };
}
