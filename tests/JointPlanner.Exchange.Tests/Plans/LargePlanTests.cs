using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

public sealed class LargePlanTests
{
    [Fact]
    public void A_plan_at_its_limits_reads_and_takes_an_edit()
    {
        var spans = 199;
        var json = $$"""
            { "schema": "joint-plan/1", "structure": { "number": "L-1", "name": "Long", "place": "nowhere" }, "basis": { "code": "own" },
              "climate": { "effective-max": "36 °C", "effective-min": "-11 °C" },
              "supports": [ {{Join(spans + 1, i => $$"""{ "id": "p{{i}}", "station": "{{i * 30}} m", "kind": "{{(i is 0 or 199 ? "abutment" : "pier")}}" }""")}} ],
              "segments": [ {{Join(spans, i => $$"""{ "id": "s{{i}}", "start": "{{i * 30}} m", "end": "{{(i + 1) * 30}} m", "kind": "steel" }""")}} ],
              "bearings": [ {{Join(spans * 2, i => $$"""{ "id": "b{{i}}", "segment": "s{{i / 2}}", "on": "p{{(i + 1) / 2}}", "kind": "{{(i % 2 == 0 ? "fixed" : "free")}}" }""")}} ],
              "joints": [ {{Join(spans, i => $$"""{ "id": "j{{i}}", "near": "s{{i}}", "far": "{{(i == spans - 1 ? "p199" : $"s{i + 1}")}}", "setting": { "temperature": "12 °C" } }""")}} ] }
            """;
        var document = TestPlans.Document(json);
        var reader = new PlanReader();
        Assert.Equal(spans, reader.Read(document).Plan!.Joints.Length);

        var edited = document.With("joints/j100/setting/temperature", "14 °C");
        var reading = reader.Read(edited);

        Assert.Equal(14, reading.Plan!.Joints[100].SettingTemperature);
    }

    private static string Join(int count, Func<int, string> item) => string.Join(", ", Enumerable.Range(0, count).Select(item));
}
