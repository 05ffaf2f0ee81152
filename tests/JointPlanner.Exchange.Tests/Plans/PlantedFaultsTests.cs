using CsCheck;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>Plans with one to five planted faults: each is named by its path, nothing else is, and nothing ever throws.</summary>
public sealed class PlantedFaultsTests
{
    private delegate PlanDocument Planting(PlanDocument document);

    /// <summary>Faults that can be planted side by side: none touches what another one breaks.</summary>
    private static readonly (string Path, string Id, Planting Plant)[] Faults =
    [
        Text("structure/name", "field.missing", null),
        Text("structure/time-zone", "structure.time-zone", "Mars/Olympus"),
        Text("display", "field.unknown-word", "imperial"),
        Text("structure/altitude", "quantity.other-kind", "85 kN"),
        Text("climate/zone", "text.characters", "mode\u202Erate"),
        Text("climate/shade-max", "climate.out-of-order", "-30 °C"),
        Text("climate/warming", "field.range", "-1 K"),
        Text("basis/answers/#1/cause", "field.unknown-word", "livelood"),
        Text("basis/answers/#2/source", "field.missing", null),
        Text("supports/a1/station", "quantity.bare-number", "0"),
        Text("supports/p2/column/modulus", "quantity.unknown-unit", "31 GPaa"),
        Text("supports/p3/station", "supports.out-of-order", "10 m"),
        Text("supports/p3/height", "quantity.grouping", "1,200 m"),
        Text("supports/a4/kind", "field.unknown-word", "abbutment"),
        Text("segments/west/expansion", "field.range", "10 /K"),
        Text("segments/west/creep/development/#1/share", "field.range", "1.2"),
        Text("segments/west/shrinkage/development/#2/age", "development.ages", "7 d"),
        Text("segments/east/axial-stiffness", "quantity.not-a-number", "stiff"),
        Text("bearings/b1/pads/count", "field.not-whole", "2.5"),
        Text("bearings/b1/pads/shear-modulus", "field.missing", null),
        Text("bearings/b1/setting/deck-age", "bearings.no-deck-age", null),
        Text("bearings/b3/setting/temperature", "quantity.kelvin-reading", "285 K"),
        Text("bearings/b4/on", "reference.unknown", "p99"),
        Text("joints/j1/skew", "field.range", "90°"),
        Text("joints/j1/choice/family", "field.unknown-word", "zipper"),
        Text("joints/j1/setting/measure-uncertainty", "quantity.not-finite", "1e999 mm"),
        Text("joints/j2/setting/temperature", "field.absolute-zero", "-280 °C"),
        Text("joints/j2/setting/near-deck-age", "joints.no-deck-age", null),
        Text("joints/j2/far", "joints.no-such", "a4") with { Id = "joints.apart" },
        Text("movements/m1/opens-by", "field.range", "-1 mm"),
        Text("movements/m2/cause", "movements.computed", "uniform-temperature"),
        Text("setting-table/to", "setting-table.no-rows", "-20 °C"),
        Text("setting-table/ages/#1", "quantity.unknown-unit", "90 dd"),
        ("segments/east", "deck.not-held", d => d.With("bearings/b5/kind", "free")),
        ("bearings/b2/kidn", "form.unknown-name", d => Replaced(d, "\"kind\": \"fixed\"", "\"kidn\": \"fixed\"")),
        ("segments/east/mark", "form.repeated", d => Replaced(d, "\"mark\": \"East deck\"", "\"mark\": \"East deck\", \"mark\": \"Ost\"")),
        ("movements/#2/id", "id.shape", d => d.With("movements/m2/id", "M 2")),
    ];

    private static (string Path, string Id, Planting Plant) Text(string path, string id, string? text) => (path, id, d => d.With(path, text));

    private static PlanDocument Replaced(PlanDocument document, string from, string to)
    {
        var json = document.ToJson();
        var at = json.IndexOf(from, StringComparison.Ordinal);
        Assert.True(at >= 0);
        return TestPlans.Document(json[..at] + to + json[(at + from.Length)..]);
    }

    [Fact]
    public void Each_fault_by_itself_is_the_only_one_found()
    {
        foreach (var (path, id, plant) in Faults) AssertFound([(path, id, plant)]);
    }

    [Fact]
    public void One_to_five_planted_faults_are_all_named_and_no_other() =>
        Gen.Shuffle(Faults, 1, 5).Sample(faults => AssertFound(faults), iter: 600, seed: "0N0XIzNsQ0O5", threads: 1);

    private static void AssertFound((string Path, string Id, Planting Plant)[] planted)
    {
        // What changes the addresses of items, or is written as text, comes last.
        var document = planted.OrderBy(p => p.Id is "form.repeated" ? 3 : p.Id is "id.shape" ? 2 : p.Id.StartsWith("form.", StringComparison.Ordinal) ? 1 : 0)
            .Aggregate(TestPlans.Document(TestPlans.Good), (d, fault) => fault.Plant(d));
        var expected = planted.Select(p => (planted.Any(o => o.Id == "id.shape") ? p.Path.Replace("movements/m2", "movements/#2", StringComparison.Ordinal) : p.Path, p.Id)).Order();

        var reading = new PlanReader().Read(document);

        Assert.Null(reading.Plan);
        Assert.Equal(expected, reading.Faults.Where(f => !f.IsWarning).Select(f => (f.Path, f.Id)).Order());
        Assert.All(reading.Faults, f => Assert.True(f.Wrong.Length > 0 && f.Allowed.Length > 0 && f.Remedy.Length > 0 && !(f.Wrong + f.Allowed + f.Remedy).Contains('{', StringComparison.Ordinal)));
    }

    [Fact]
    public void Any_damage_to_the_bytes_is_a_fault_or_a_plan_and_never_throws()
    {
        var good = System.Text.Encoding.UTF8.GetBytes(TestPlans.Good);
        Gen.Select(Gen.Int[0, good.Length - 1], Gen.Byte, Gen.Int[0, 2]).Array[1, 6].Sample(changes =>
        {
            var bytes = good.ToList();
            foreach (var (at, value, way) in changes)
            {
                var place = Math.Min(at, bytes.Count - 1);
                if (way == 0) bytes[place] = value;
                else if (way == 1) bytes.RemoveAt(place);
                else bytes.Insert(place, value);
            }
            var reading = new PlanReader().Read(bytes.ToArray());
            Assert.True(reading.Plan is not null ^ reading.Faults.Any(f => !f.IsWarning));
        }, iter: 1500, seed: "0N0XIzNsQ0O6", threads: 1);
    }
}
