using JointPlanner.Exchange.Packages;
using JointPlanner.Issuing.Setting;

namespace JointPlanner.Issuing.Tests.Setting;

/// <summary>Issued numbers planted by hand, so round that every answer can be worked out on paper. Millimetres and days in, SI out.</summary>
internal static class PlantedJoint
{
    public const double Day = 86400;

    public static readonly StoredDay Facts = new("metric", 90 * Day,
        [new("surface", "contact thermometer", 2, "planted"), new("air", "shade air", 4, "planted")],
        [new("slab", "deck slab", 3), new("girder", "girders", 1)]);

    public static double Mm(double mm) => mm / 1000;

    public static StoredRow Row(double t, double set, double minus, double plus, double? age = null) => new(
        t, age * Day, Mm(set - minus - 1), Mm(set), Mm(set + plus + 1), Mm(minus), Mm(plus), Mm(1), "least gap in service", "greatest gap in service");

    public static StoredRow Closed(double t, double? age = null) => new(t, age * Day,
        Refusal: new("setting-no-window", "warning", "joints/j1", "Do not set at {0}: the joint is too small.", [new("temperature", t)]));

    /// <summary>Closes by 0.5 mm per degree; limits 20 and 80 mm, an installation minimum of 30 mm; 4 mm of other closing and 6 mm of other opening still to come.</summary>
    public static IssuedJoint Of(double skew, double? leastAge, params StoredRow[] rows)
    {
        double?[] ages = [.. rows.Select(r => r.DeckAge).Distinct()];
        StoredTable Table(string method) => new(method, 2, 0.0005, 0, 40, [.. rows], leastAge * Day);
        return new(Facts, new("j1", "J1", "strip-seal", "80 mm", skew,
            [
                new("least gap in service", Mm(20), "lower", "normal", "gap-service"), new("greatest gap in service", Mm(80), "upper", "normal", "gap-service"),
                new("least gap at installation", Mm(30), "lower", "normal"),
            ],
            [Table(""), Table("surface"), Table("air")],
            [.. ages.Select((age, i) => new StoredMovement("gap-service", [new(0.0005, 0, 40)], Mm(4), Mm(6 - i), age))]));
    }

    public static IssuedJoint Square(params StoredRow[] rows) => Of(0, null, rows);

    public static MaySet Sets(this SettingAnswer answer) => Assert.IsType<MaySet>(answer);

    public static string Refuses(this SettingAnswer answer) => Assert.IsType<DoNotSet>(answer).Why.Id;
}
