using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Printing;
using JointPlanner.Issuing.Setting;

namespace JointPlanner.Web.Rooms.SetDay;

/// <summary>What stands on the page of one joint: what was typed, and what the issued table answers to it.</summary>
public sealed class Measured
{
    private readonly IssuedJoint joint;

    /// <summary>Nothing typed yet; the best method of measuring is not guessed at: the first of the issued ones stands there to be changed.</summary>
    public Measured(IssuedJoint joint)
    {
        this.joint = joint;
        Temperatures = [.. joint.Points.Select(_ => new SiteEntry(Quantity.Temperature))];
        Method = joint.Methods[0].Id;
    }

    /// <summary>One for each point.</summary>
    public IReadOnlyList<SiteEntry> Temperatures { get; }

    /// <summary>Id of the method of measuring.</summary>
    public string Method { get; set; }

    /// <summary>Age of the deck.</summary>
    public SiteEntry Age { get; } = new(Quantity.Age);

    /// <summary>Direction in which openings are measured.</summary>
    public Direction Direction { get; set; }

    /// <summary>The opening that is there now.</summary>
    public SiteEntry Now { get; } = new(Quantity.Opening);

    /// <summary>Mean temperature of the structure, °C; null while one is missing or cannot be read.</summary>
    public double? Mean => Temperatures.All(t => t.Value is not null) ? joint.Mean([.. Temperatures.Select(t => t.Value!.Value)]) : null;

    /// <summary>What the table says; null while something is missing.</summary>
    public SettingAnswer? Answer => Mean is { } mean && (!joint.AsksForAge || Age.Value is not null) ? joint.At(Method, mean, Age.Value, Direction) : null;

    /// <summary>What is still missing, in words; empty where nothing is.</summary>
    public string Missing =>
        Temperatures.Any(t => t.Text.Length == 0) ? Temperatures.Count == 1 ? "Enter the temperature of the structure." : "Enter the temperature of each point."
        : Temperatures.Any(t => t.Value is null) ? "A temperature cannot be read: look below."
        : joint.AsksForAge && Age.Text.Length == 0 ? "Enter the age of the deck."
        : joint.AsksForAge && Age.Value is null ? "The age of the deck cannot be read: look below."
        : "";

    /// <summary>What was read, in words, as the record keeps it.</summary>
    public string ReadInWords(DisplayProfile profile) => string.Join("; ", joint.Points.Zip(Temperatures, (point, entry) => (point, entry.Value))
        .Where(p => p.Value is not null)
        .Select(p => $"{p.point.Name} {NumberText.WithUnit(p.Value!.Value, Quantity.Temperature, profile)} × {NumberText.Of(p.point.Weight, Quantity.Ratio, profile)}"));
}
