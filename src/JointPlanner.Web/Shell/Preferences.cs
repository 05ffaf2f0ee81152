using JointPlanner.Exchange.Printing;

namespace JointPlanner.Web.Shell;

/// <summary>In which units numbers are shown; what was typed stays as typed.</summary>
public enum UnitProfile
{
    /// <summary>Metres, millimetres, °C.</summary>
    Metric,
    /// <summary>Feet, inches, °F.</summary>
    Us,
}

/// <summary>What a browser remembers of a person's choices, as it goes from the page to the circuit.</summary>
/// <param name="IsDark">Dark paper.</param>
/// <param name="Units">Units shown; null while nobody chose, and then a structure is shown in its own.</param>
public sealed record RememberedPreferences(bool IsDark, UnitProfile? Units)
{
    internal const string PaperCookie = "paper";
    internal const string UnitsCookie = "units";

    internal static RememberedPreferences From(IRequestCookieCollection cookies) =>
        new(cookies[PaperCookie] == "dark", cookies[UnitsCookie] switch { "us" => UnitProfile.Us, "metric" => UnitProfile.Metric, _ => null });
}

/// <summary>The choices that hold in one circuit; whoever shows numbers listens for a change.</summary>
public sealed class Preferences
{
    private bool isChosen;

    /// <summary>Dark paper.</summary>
    public bool IsDark { get; private set; }

    /// <summary>Units shown.</summary>
    public UnitProfile Units { get; private set; }

    /// <summary>The display profile of the units shown.</summary>
    public DisplayProfile Profile => Units == UnitProfile.Us ? DisplayProfile.Us : DisplayProfile.Metric;

    /// <summary>Told after each change.</summary>
    public event Action? Changed;

    /// <summary>Takes what the browser remembered.</summary>
    public void Take(RememberedPreferences remembered) =>
        (IsDark, Units, isChosen) = (remembered.IsDark, remembered.Units ?? UnitProfile.Metric, remembered.Units is not null);

    /// <summary>Shows a structure in its own units, unless the person chose.</summary>
    public void Suggest(UnitProfile units)
    {
        if (isChosen || Units == units) return;
        Units = units;
        Changed?.Invoke();
    }

    /// <summary>Chooses light or dark paper.</summary>
    public void Choose(bool isDark)
    {
        IsDark = isDark;
        Changed?.Invoke();
    }

    /// <summary>Chooses the units shown.</summary>
    public void Choose(UnitProfile units)
    {
        (Units, isChosen) = (units, true);
        Changed?.Invoke();
    }
}
