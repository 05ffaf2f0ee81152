using Microsoft.JSInterop;

namespace JointPlanner.Web.Shared;

/// <summary>Hands a text to the person: as a file, or for pasting elsewhere. It goes through the open page, so that it holds what is on the screen though the archive be down.</summary>
/// <param name="script">The page.</param>
public sealed class Handout(IJSRuntime script)
{
    /// <summary>Gives the text as a file, in UTF-8.</summary>
    public async Task Save(string name, string kind, string text) => await script.InvokeVoidAsync("jointPlanner.save", name, kind, text);

    /// <summary>Lays the text ready for pasting; false where the browser does not allow it.</summary>
    public async Task<bool> Copy(string text) => await script.InvokeAsync<bool>("jointPlanner.copy", text);

    /// <summary>A title as a file's name: small letters, digits and hyphens.</summary>
    public static string FileName(string? title, string otherwise)
    {
        var letters = (title ?? "").Normalize(System.Text.NormalizationForm.FormD).ToLowerInvariant()
            .Where(c => !char.IsControl(c) && char.GetUnicodeCategory(c) != System.Globalization.UnicodeCategory.NonSpacingMark)
            .Select(c => char.IsAsciiLetterOrDigit(c) ? c : '-');
        var name = string.Join('-', string.Concat(letters).Split('-', StringSplitOptions.RemoveEmptyEntries));
        return name.Length == 0 ? otherwise : name.Length > 60 ? name[..60] : name;
    }
}
