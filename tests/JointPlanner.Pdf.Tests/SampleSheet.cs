using System.Globalization;
using System.Text;
using JointPlanner.Pictures;

namespace JointPlanner.Pdf.Tests;

/// <summary>An invented sheet with one of everything.</summary>
internal static class SampleSheet
{
    public const string Hostile = "</script><svg onload=\"x\">'&\u202E\\(end)";

    public static byte[] Package => Encoding.UTF8.GetBytes("{\"schema\":\"calculation-package/1\",\"name\":\"Überführung № 7\"}\n");

    public static byte[] Results => Encoding.UTF8.GetBytes("{\"joint/j1/opens-by\":0.0831}\n");

    public static Document Make(PaperSize? paper = null, string structure = "Overbridge at Ängsholm", int settingRows = 24) => new()
    {
        Title = "Movements at joints and bearings · " + structure,
        Author = "M. Ångström",
        Program = "Joint Planner 0.1.0",
        Date = new(2026, 3, 2, 9, 30, 0, TimeSpan.Zero),
        Paper = paper ?? PaperSize.A4,
        Head = new(structure, "Sheet 041 · revision B"),
        Foot = "Joint Planner 0.1.0 · package 3f9c0ad5b2e1",
        Watermark = "DEMONSTRATION, not for construction",
        Attachments =
        [
            new("results.json", "application/json", Results, AttachmentRelation.Data, "Every result of this calculation"),
            new("calculation.json", "application/json", Package, AttachmentRelation.Source, "The package that this calculation was made from"),
        ],
        Blocks = [.. Front(paper ?? PaperSize.A4, structure), .. Steps(), .. Movements(), .. Setting(settingRows), .. End()],
    };

    public static Picture Elevation(double widthMm)
    {
        var view = View.FitExaggerated(new(-4, 96, -9, 3), new(6, 14, widthMm - 12, 34), most: 3);
        var b = new PictureBuilder(widthMm, 58, view);
        b.Polyline(Role.Ground, [new(-4, -3), new(8, -6), new(40, -8.5), new(70, -7.5), new(96, -3)], Stroke.Thin);
        b.Box(Role.Deck, new(0, 92, 0, 1.6), Stroke.Medium, Fill.Tint);
        double[] supports = [0, 28, 64, 92];
        string[] names = ["A1", "P1", "P2", "A2"];
        for (var i = 0; i < 4; i++)
        {
            var x = supports[i];
            b.Thing(Role.Support, "supports/" + names[i].ToLowerInvariant(), names[i], s => s.Box(Role.Support, new(x - 0.7, x + 0.7, -8, -0.7), Stroke.Medium, Fill.Paper));
            b.Circle(Role.Bearing, new(x, -0.35), 0.8, Stroke.Thin, i == 1 ? Fill.Ink : Fill.Paper);
            b.Label(Role.Label, new(x, -9), names[i], downMm: 4, weight: Weight.Semibold);
        }
        for (var i = 0; i < 3; i++) b.Dimension(new(supports[i], 1.6), new(supports[i + 1], 1.6), supports[i + 1] - supports[i] + ".0 m", 5);
        b.Hatch(Role.Hatch, [new(-4, -8), new(-0.7, -8), new(-0.7, -3.8), new(-4, -3)]);
        b.Arrow(Role.Joint, new(-2.6, 0.8), 8, 0, Stroke.Medium).Arrow(Role.Joint, new(94.6, 0.8), -8, 0, Stroke.Medium);
        b.Add(new Label(Role.Label, new(widthMm - 2, 50), "opens to the right") { AngleDegrees = -90, SizeMm = 2.2 });
        b.Add(new Label(Role.Label, new(6, 56), view.ScaleSentence) { SizeMm = 2.2 });
        return b.Build("Elevation", "Deck of three spans, fixed at pier P1, with a joint at each abutment");
    }

    private static IEnumerable<Block> Front(PaperSize paper, string structure) =>
    [
        new TitleBlock("Movements at joints and bearings", structure),
        new KeyValues(
        [
            new("Structure", structure), new("Sheet", "041"),
            new("Owner", "Nordvik county, roads"), new("Revision", "B"),
            new("Basis", "EN 1991-1-5:2003, revision 1"), new("Date", "2026-03-02"),
        ]) { TwoAcross = true },
        new KeyValues(
        [
            new("calculation.json, SHA-256", new Attachment("a", "b", Package, AttachmentRelation.Source, "").Sha256),
            new("results.json, SHA-256", new Attachment("a", "b", Results, AttachmentRelation.Data, "").Sha256),
        ]),
        new PictureBlock(Elevation(paper.TextWidthMm), "Figure 1. Elevation with supports, fixed point and joints"),
        new Heading(1, "Basis") { Number = "1" },
        new Paragraph(Words.Join("Movements are counted from the state at setting. The uniform temperature of the deck runs between ",
            MathNode.Indexed("T", "e,min"), " and ", MathNode.Indexed("T", "e,max"), "; an opening joint is one whose gap grows. Each number below names the step that it comes from, and ",
            Words.Strong("every step names its clause"), ". ", new Words([new TextRun("Values held from memory are marked.", Emphasis.Italic)]))),
        new Note("From memory", "The coefficient of expansion of composite decks is held from memory; check it against the licensed text."),
        new Note("Caution", "This calculation assists a licensed engineer. Local codes and the engineer of record govern. Never loosen the restraints of a loaded bearing from these numbers alone.") { Caution = true },
    ];

    private static IEnumerable<Block> Steps()
    {
        MathNode V(string l, string s) => MathNode.Indexed(l, s);
        MathNode Op(string s) => MathNode.Operator(s);
        MathNode N(string s) => MathNode.Upright(s);
        yield return new Heading(1, "Movements") { Number = "2" };
        yield return new Heading(2, "Joint at abutment A2") { Number = "2.1" };
        yield return new FormulaBlock(
        [
            new(V("u", "T"), "=", MathNode.Row(MathNode.Variable("α"), Op("·"), MathNode.Row(MathNode.Variable("Δ"), V("T", "N,con")), Op("·"), MathNode.Variable("L"))),
            new(null, "=", MathNode.Row(N("12.0"), Op("×"), new Script(N("10"), null, N("−6")), Op("·"), N("41.0"), Op("·"), N("64\u2009000"))),
            new(null, "=", MathNode.Strong("31.5 mm")),
        ])
        { Label = "Contraction of the deck from setting to the lowest uniform temperature", Source = "EN 1991-1-5:2003, 6.1.3.3 (1)" };
        yield return new FormulaBlock(
        [
            new(V("u", "br"), "=", new Fraction(MathNode.Row(V("F", "br"), Op("·"), new Script(MathNode.Variable("h"), null, N("3"))),
                MathNode.Row(N("3"), Op("·"), MathNode.Variable("E"), Op("·"), MathNode.Variable("I")))),
            new(null, "=", new Fraction(MathNode.Row(N("900"), Op("·"), new Script(N("8.2"), null, N("3"))), MathNode.Row(N("3"), Op("·"), N("34"), Op("·"), N("1.84")))),
            new(null, "=", MathNode.Strong("2.64 mm")),
        ])
        { Label = "Displacement of the fixed pier's head under braking", Source = "elastic cantilever, derived" };
        yield return new FormulaBlock(
        [
            new(V("u", "res"), "=", MathNode.Row(new Root(MathNode.Row(new Script(V("u", "x"), null, N("2")), Op("+"),
                new Script(new Parentheses(new Fraction(MathNode.Row(V("u", "y"), Op("+"), V("e", "0")), N("cos θ"))), null, N("2")))), Op("≤"), V("u", "R"))),
            new(null, "=", MathNode.Row(N("34.9 mm"), Op("≤"), N("60 mm"))),
        ])
        { Label = "Movement along the guide of a skew joint", Source = "derived", Remark = "The limit holds: 58 % of it is used." };
        var terms = Enumerable.Range(1, 14).SelectMany(i => new[] { Op("+"), MathNode.Row(N((1.25 * i).ToString("0.00", CultureInfo.InvariantCulture)), Op("·"), V("L", i.ToString(CultureInfo.InvariantCulture))) }).Skip(1).ToList();
        yield return new FormulaBlock([new(V("L", "T"), "=", new MathRow(terms)), new(null, "=", MathNode.Strong("128.4 m"))]) { Label = "A sum too long for one line" };
    }

    private static IEnumerable<Block> Movements()
    {
        yield return new Heading(2, "Counting table") { Number = "2.2" };
        RowGroup Group(string title, params string[][] rows) => new([.. rows.Select((r, i) => new Row([.. r.Select(c => (Words)c)]) { Strong = r[0].StartsWith("Sum", StringComparison.Ordinal) })]) { Title = title };
        yield return new Table(
            [
                new("Cause") { NamesRows = true }, new("Opens (mm)", Align.Decimal), new("Closes (mm)", Align.Decimal),
                new("Opens (mm)", Align.Decimal), new("Closes (mm)", Align.Decimal), new("Source"),
            ],
            [
                Group("Service", ["Uniform temperature", "31.5", "26.9", "31.5", "26.9", "step 1"], ["Shrinkage after setting", "8.04", "0", "0.9", "0", "step 2"],
                    ["Braking", "2.64", "2.64", "2.64", "2.64", "step 3"], ["Sum, service", "42.18", "29.54", "35.04", "29.54", ""]),
                Group("Strength", ["Uniform temperature", "47.3", "40.4", "47.3", "40.4", "step 4"], ["Difference of setting", "–", "–", "−1.25", "+1.25", "plan, not checked against the drawing yet"],
                    ["Sum, strength", "55.34", "43.0", "46.05", "41.65", ""]),
            ])
        { Caption = "Table 1. Movements at the joints", Spans = [new(Words.None, 1), new("Joint at A1", 2), new("Joint at A2", 2), new(Words.None, 1)] };
    }

    private static IEnumerable<Block> Setting(int rows)
    {
        yield return new Heading(1, "Setting table") { Number = "3" };
        yield return new Paragraph("Enter the table with the effective temperature of the deck. Between two rows take the nearer one. Outside the table do not set.");
        yield return Table.Of("Table 2. Opening to set at joint A2", [new("Deck temperature (°C)", Align.Decimal), new("Opening (mm)", Align.Decimal), new("Least (mm)", Align.Decimal), new("Most (mm)", Align.Decimal), new("Set on the day"), new("By")],
            Enumerable.Range(0, rows).Select(i => (IReadOnlyList<Words>)[Signed(i - 20), Fixed(68 - (0.37 * (i - 20))), Fixed(66 - (0.37 * (i - 20))), Fixed(70 - (0.37 * (i - 20))), "", ""]));
    }

    private static IEnumerable<Block> End() =>
    [
        new Heading(1, "Signatures") { Number = "4" },
        new Paragraph("The designer and the checker sign below. What is signed is the whole file with both attachments."),
        new SignatureFields([new("designer", "Designer") { Person = "M. Ångström" }, new("checker", "Checker") { Person = "Z. Şahin" }]),
    ];

    private static string Signed(int value) => value.ToString(CultureInfo.InvariantCulture).Replace('-', '−');

    private static string Fixed(double value) => value.ToString("0.0", CultureInfo.InvariantCulture);
}
