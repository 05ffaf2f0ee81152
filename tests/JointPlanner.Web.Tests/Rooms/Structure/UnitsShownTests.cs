using Bunit;
using Bunit.TestDoubles;
using JointPlanner.Issuing;
using JointPlanner.Web.Rooms.Structure;
using JointPlanner.Web.Shell;

namespace JointPlanner.Web.Tests.Rooms.Structure;

/// <summary>Units are a way of looking: what was typed never changes with them.</summary>
public sealed class UnitsShownTests : LedgerTest
{
    public UnitsShownTests() => AddAuthorization();

    [Theory]
    [InlineData(Composite)]
    [InlineData(Us)]
    [InlineData(Viaduct)]
    public void Switching_twice_leaves_the_plan_file_byte_for_byte(string structure)
    {
        Open(structure);
        Preferences.Suggest(Bench.Document.TextAt("display") == "us" ? UnitProfile.Us : UnitProfile.Metric);
        var first = Preferences.Units;
        var cut = Shown<BenchView>(_ => { });
        var bar = Render<TopBar>();
        var (bytes, shown) = (Bench.Document.ToUtf8(), Texts(cut));
        var edits = 0;
        Bench.Edited += _ => edits++;
        bar.FindAll(".pair button").Single(b => b.GetAttribute("aria-pressed") == "false").Click();
        Assert.NotEqual(first, Preferences.Units);
        var other = Texts(cut);
        bar.FindAll(".pair button").Single(b => b.GetAttribute("aria-pressed") == "false").Click();
        Assert.Equal(bytes, Bench.Document.ToUtf8());
        Assert.Equal(0, edits);
        Assert.NotEqual(shown, other);
        Assert.Equal(shown, Texts(cut));
    }

    [Fact]
    public void Feet_and_inches_stay_as_typed_on_screen_in_the_file_and_in_the_export()
    {
        const string typed = "138 ft 6 1/2 in", path = "supports/p2/station";
        var cut = Ledger();
        Type(cut, path, typed);
        cut.WaitForAssertion(() => Assert.Equal(138 * 0.3048 + 6.5 * 0.0254, Bench.Outcome.Reading.Plan!.Supports[1].Station, 1e-12));
        cut.InvokeAsync(() => Preferences.Choose(UnitProfile.Us));
        cut.InvokeAsync(() => Preferences.Choose(UnitProfile.Metric));
        Assert.Equal(typed, cut.Find($"input[data-path='{path}']").GetAttribute("value"));

        var file = Shown<PlanFileLink>(_ => { });
        file.Find("button").Click();
        var handed = JSInterop.Invocations["jointPlanner.save"].Single();
        Assert.Equal("sorrel-creek-crossing.json", handed.Arguments[0]);
        var text = Assert.IsType<string>(handed.Arguments[2]);
        Assert.Contains($"\"station\": \"{typed}\"", text, StringComparison.Ordinal);
        Assert.Equal(Bench.Document.ToJson(), text);

        var package = Bench.Outcome.Package([]).ToUtf8();
        Assert.Contains($"\"{typed}\"", System.Text.Encoding.UTF8.GetString(package), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(UnitProfile.Metric, "structure temperature (°C),deck age (d),\"set to, normal to the joint (mm)\"")]
    [InlineData(UnitProfile.Us, "structure temperature (°F),deck age (d),\"set to, normal to the joint (in)\"")]
    public void A_table_is_handed_out_in_the_units_shown_with_numbers_as_numbers(UnitProfile units, string head)
    {
        var cut = Ledger();
        cut.InvokeAsync(() => Preferences.Choose(units));
        Button(cut, "Save as CSV", "section[aria-label='Setting table of j1']").Click();
        var csv = Assert.IsType<string>(JSInterop.Invocations["jointPlanner.save"].Single().Arguments[2]);
        Assert.StartsWith("\uFEFF" + head, csv, StringComparison.Ordinal);
        var lines = csv.Split("\r\n");
        Assert.Equal(Bench.Result!.Joints[0].Table!.Rows.Length + 2, lines.Length);
        Assert.All(lines[1..^1], line => Assert.Matches(@"^-?\d+(\.\d+)?,\d+,\d+(\.\d+)?,\d", line));
    }

    [Fact]
    public void Copying_says_whether_the_browser_allowed_it()
    {
        JSInterop.Setup<bool>("jointPlanner.copy", _ => true).SetResult(false);
        var cut = Ledger();
        Button(cut, "Copy this table", "section[aria-label='Setting table of j1']").Click();
        cut.WaitForAssertion(() => Assert.Contains("Save as CSV instead", Words(cut.Find("section[aria-label='Setting table of j1'] .table-acts")), StringComparison.Ordinal));
    }

    private static string Texts(IRenderedComponent<BenchView> cut) => Words(cut.Find(".ledger"));
}
