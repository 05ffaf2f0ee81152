using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Exchange.Quantities;

namespace JointPlanner.Web.Rooms.SetDay;

/// <summary>
/// What a person on site types for one quantity. A bare number is read in the unit that stands beside the field; that unit stays while
/// anything stands in the field, so that a change of the units shown never changes what was meant.
/// </summary>
/// <param name="kind">Kind of quantity.</param>
public sealed class SiteEntry(Quantity kind)
{
    /// <summary>As typed.</summary>
    public string Text { get; private set; } = "";

    /// <summary>The unit of a bare number; null while nothing is typed.</summary>
    public Unit? Unit { get; private set; }

    /// <summary>Takes what was typed.</summary>
    public void Take(string? text, DisplayProfile shown)
    {
        Text = text ?? "";
        if (Text.Trim().Length == 0) Unit = null;
        else Unit ??= shown[kind].Unit;
    }

    /// <summary>Turns the sign: keyboards for numbers often have no minus.</summary>
    public void TurnSign(DisplayProfile shown)
    {
        var text = Text.TrimStart();
        Take(text.StartsWith('-') || text.StartsWith('−') ? text[1..] : "-" + text, shown);
    }

    /// <summary>What it says; null while nothing is typed.</summary>
    public QuantityReading? Read()
    {
        if (Text.Trim() is not { Length: > 0 } typed || typed is "-" or "−") return null;
        var reading = QuantityText.Parse(typed, kind, Unit);
        return reading.Fault?.Id == "quantity.bare-number" ? QuantityText.Parse($"{typed} {Unit!.Name}", kind) : reading;
    }

    /// <summary>The value, SI; null where nothing is typed or it cannot be read.</summary>
    public double? Value => Read() is { Fault: null } read ? read.Value : null;
}
