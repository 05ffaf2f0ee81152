using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>An invented plan that has every field once, and a small one that has only what must be given.</summary>
internal static class TestPlans
{
    public const string Whole = """
        {
          "schema": "joint-plan/1",
          "structure": { "number": "T-1", "name": "Test bridge", "place": "nowhere", "time-zone": "Europe/Paris", "altitude": "85 m" },
          "display": "metric",
          "basis": {
            "code": "some-code", "profile": "some-profile", "owner-rules": "some-rules", "setting-doubt": "unspecified", "safety": "factor",
            "answers": [
              { "cause": "live-load", "column": "gap-service", "factor": 1.35, "source": "designer" },
              { "cause": "wind", "column": "racking", "counted": false, "source": "sheltered" }
            ]
          },
          "climate": { "source": "invented", "zone": "moderate", "shade-max": "38 °C", "shade-min": "-16 °C", "effective-max": "42 °C", "effective-min": "-11 °C", "warming": "1.5 K" },
          "supports": [
            { "id": "a1", "mark": "Abutment 1", "station": "0 m", "kind": "abutment", "stiffness": "rigid", "height": "5 m" },
            { "id": "p2", "mark": "Pier 2", "station": "40 m", "kind": "pier",
              "column": { "height": "9 m", "modulus": "31 GPa", "inertia": "0.55 m4", "foundation-along": "900 kN/mm", "foundation-turning": "9000 MN·m/rad" }, "height": "9 m" },
            { "id": "p3", "mark": "Pier 3", "station": "90 m", "kind": "pier", "stiffness": "40 MN/m", "height": "12 m" },
            { "id": "a4", "mark": "Abutment 4", "station": "130 m", "kind": "abutment", "height": "4 m" }
          ],
          "segments": [
            { "id": "west", "mark": "West deck", "start": "-0.5 m", "end": "60 m", "kind": "concrete", "depth": "2 m", "axial-stiffness": "210 GN", "expansion": "10e-6 /K",
              "creep": { "strain": "220 µε", "source": "sheet 21", "development": [ { "age": "28 d", "share": 0.2 }, { "age": "1000 d", "share": 0.8 } ] },
              "shrinkage": { "strain": 0.0003, "source": "sheet 22", "development": [ { "age": "28 d", "share": 0.1 }, { "age": "1000 d", "share": 0.9 } ] } },
            { "id": "east", "mark": "East deck", "start": "60 m", "end": "130.5 m", "kind": "steel", "depth": "1.8 m", "axial-stiffness": "90 GN" }
          ],
          "bearings": [
            { "id": "b1", "mark": "B1", "segment": "west", "on": "a1", "kind": "elastomeric",
              "pads": { "count": 4, "shear-modulus": "0.9 MPa", "plan-area": "0.16 m2", "elastomer-thickness": "60 mm" }, "setting": { "temperature": "12 °C", "deck-age": "60 d" } },
            { "id": "b2", "mark": "B2", "segment": "west", "on": "p2", "kind": "fixed" },
            { "id": "b3", "mark": "B3", "segment": "east", "on": "west", "station": "60 m", "kind": "free", "setting": { "temperature": "14 °C" } },
            { "id": "b4", "mark": "B4", "segment": "east", "on": "p3", "kind": "free" },
            { "id": "b5", "mark": "B5", "segment": "east", "on": "a4", "kind": "fixed", "station": "130 m" }
          ],
          "joints": [
            { "id": "j1", "mark": "J1", "near": "a1", "far": "west", "skew": "15°",
              "setting": { "temperature": "12 °C", "temperature-uncertainty": "1.5 K", "measure-uncertainty": "2 mm", "remaining-uncertainty": "3 mm", "far-deck-age": "90 d", "least-deck-age": "28 d" },
              "choice": { "family": "strip-seal", "size": "80 mm", "reason": "the owner's wish" } },
            { "id": "j2", "mark": "J2", "near": "west", "far": "east", "setting": { "temperature": "12 °C", "near-deck-age": "90 d" } }
          ],
          "movements": [
            { "id": "m1", "joint": "j1", "cause": "live-load", "opens-by": "1.5 mm", "closes-by": "2.5 mm", "source": "sheet 12" },
            { "id": "m2", "joint": "j2", "cause": "creep-of-nothing", "opens-by": "0 mm", "closes-by": "0 mm", "source": "none acts" }
          ],
          "setting-table": { "from": "-10 °C", "to": "40 °C", "step": "2.5 K", "ages": [ "90 d", "1 a" ] }
        }
        """;

    /// <summary>As <see cref="Whole"/>, without its one planted word.</summary>
    public static string Good => Whole.Replace("creep-of-nothing", "braking", StringComparison.Ordinal);

    public const string Least = """
        {
          "schema": "joint-plan/1",
          "structure": { "number": "T-2", "name": "Small bridge", "place": "nowhere" },
          "basis": { "code": "own" },
          "climate": { "effective-max": "36 °C", "effective-min": "-11 °C" },
          "supports": [ { "id": "a1", "station": "0 m", "kind": "abutment" }, { "id": "a2", "station": "20 m", "kind": "abutment" } ],
          "segments": [ { "id": "s1", "start": "0 m", "end": "20 m", "kind": "steel" } ],
          "bearings": [ { "id": "b1", "segment": "s1", "on": "a1", "kind": "fixed" }, { "id": "b2", "segment": "s1", "on": "a2", "kind": "free" } ],
          "joints": [ { "id": "j1", "near": "s1", "far": "a2", "setting": { "temperature": "12.5 °C" } } ]
        }
        """;

    public static PlanDocument Document(string json)
    {
        var (document, faults) = PlanDocument.Parse(json);
        Assert.Empty(faults);
        return document!;
    }

    public static PlanReading Read(string json) => new PlanReader().Read(System.Text.Encoding.UTF8.GetBytes(json));
}
