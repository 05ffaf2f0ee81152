using CsCheck;
using JointPlanner.Exchange.Plans;

namespace JointPlanner.Exchange.Tests.Plans;

/// <summary>Makes plans that are right: one to four segments in a row over abutments and piers, in metric or US units, with joints between them.</summary>
internal static class PlanGenerator
{
    private static readonly string[] DeckKinds = ["concrete", "composite", "steel"], FarBearings = ["free", "elastomeric", "free"];

    private sealed record Span(int Length, int Kind, int Bearing, bool Creeps, int Skew);

    public static readonly Gen<PlanDocument> Plans =
        from us in Gen.Bool
        from spans in Gen.Select(Gen.Int[10, 200], Gen.Int[0, 2], Gen.Int[0, 2], Gen.Bool, Gen.Int[-44, 44]).Select((l, k, b, c, s) => new Span(l, k, b, c, s)).Array[1, 4]
        from temperature in Gen.Int[-10, 30]
        select Make(us, spans, temperature);

    private static PlanDocument Make(bool us, Span[] spans, int temperature)
    {
        var document = PlanDocument.Empty.With("structure/number", "G-1").With("structure/name", "Generated").With("structure/place", "nowhere").With("display", us ? "us" : "metric")
            .With("basis/code", "own").With("climate/effective-max", us ? "100 °F" : "38 °C").With("climate/effective-min", us ? "-10,5 °F" : "-23.5 °C");
        var station = 0;
        (document, var support) = Support(document, station, "abutment", us);
        var near = support;
        for (var i = 0; i < spans.Length; i++)
        {
            var span = spans[i];
            var (start, end) = (station, station + span.Length);
            (document, var segmentPath) = document.WithItem("segments", "s");
            var segment = Id(segmentPath);
            document = document.With($"{segmentPath}/start", Length(start, us)).With($"{segmentPath}/end", Length(end, us))
                .With($"{segmentPath}/kind", DeckKinds[span.Kind]);
            if (span.Creeps)
            {
                document = document.With($"{segmentPath}/shrinkage/strain", "300 µε").With($"{segmentPath}/shrinkage/source", "generated");
                (document, var point) = document.WithItem($"{segmentPath}/shrinkage/development", "");
                document = document.With($"{point}/age", "28 d").With($"{point}/share", "0.3");
            }
            document = Bearing(document, segment, support, "fixed", temperature, us);
            (document, support) = Support(document, end, i == spans.Length - 1 ? "abutment" : "pier", us);
            document = Bearing(document, segment, support, FarBearings[span.Bearing], temperature, us);
            document = Joint(document, near, segment, span, i > 0 && spans[i - 1].Creeps, span.Creeps, temperature, us);
            (near, station) = (segment, end);
        }
        return Joint(document, near, support, spans[^1], spans[^1].Creeps, false, temperature, us);
    }

    private static (PlanDocument, string) Support(PlanDocument document, int station, string kind, bool us)
    {
        (document, var path) = document.WithItem("supports", "p");
        return (document.With($"{path}/station", Length(station, us)).With($"{path}/kind", kind), Id(path));
    }

    private static PlanDocument Bearing(PlanDocument document, string segment, string support, string kind, int temperature, bool us)
    {
        (document, var path) = document.WithItem("bearings", "b");
        document = document.With($"{path}/segment", segment).With($"{path}/on", support).With($"{path}/kind", kind)
            .With($"{path}/setting/temperature", Temperature(temperature, us)).With($"{path}/setting/deck-age", "60 d");
        return kind != "elastomeric" ? document : document.With($"{path}/pads/count", "4").With($"{path}/pads/shear-modulus", us ? "130 psi" : "0.9 MPa")
            .With($"{path}/pads/plan-area", us ? "240 in²" : "0.16 m2").With($"{path}/pads/elastomer-thickness", us ? "2 1/4 in" : "60 mm");
    }

    private static PlanDocument Joint(PlanDocument document, string near, string far, Span span, bool nearShortens, bool farShortens, int temperature, bool us)
    {
        (document, var path) = document.WithItem("joints", "j");
        document = document.With($"{path}/near", near).With($"{path}/far", far).With($"{path}/skew", $"{span.Skew}°").With($"{path}/setting/temperature", Temperature(temperature, us));
        if (nearShortens) document = document.With($"{path}/setting/near-deck-age", "90 d");
        return farShortens ? document.With($"{path}/setting/far-deck-age", "3 a") : document;
    }

    private static string Length(int number, bool us) => us ? $"{number} ft" : $"{number} m";

    private static string Temperature(int celsius, bool us) => us ? FormattableString.Invariant($"{celsius * 1.8 + 32} °F") : $"{celsius} °C";

    private static string Id(string path) => path[(path.LastIndexOf('/') + 1)..];
}
