using System.Collections.Immutable;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Makes a segment's section and temperature difference from the values of their fields.</summary>
internal static class SectionMaking
{
    public static CrossSection? Section(PlanDocument document, FieldValues values, string path)
    {
        if (!values.HasGroup(path)) return null;
        var depth = values.Number($"{path}/depth");
        if (values.NumberOrNone($"{path}/bearing-depth") is null && document.TextAt($"{path}/depth") is { } soffit)
            values.Default($"{path}/bearing-depth", soffit, "bearings turn and slide at the soffit");
        return new CrossSection
        {
            Depth = depth,
            BearingDepth = values.NumberOrNone($"{path}/bearing-depth") ?? depth,
            Surfacing = values.Number($"{path}/surfacing"),
            Connection = values.NumberOrNone($"{path}/connection"),
            ReliefSpacing = values.Number($"{path}/relief-spacing"),
            Layers = [.. values.Items($"{path}/layers").Select(p => new Layer
            {
                Id = p[(p.LastIndexOf('/') + 1)..],
                Material = MemberWords.Of<LayerMaterial>(values.Text($"{p}/material")),
                Modulus = values.Number($"{p}/modulus"),
                Area = values.Number($"{p}/area"),
                Depth = values.Number($"{p}/depth"),
                Height = values.NumberOrNone($"{p}/height"),
                Inertia = values.NumberOrNone($"{p}/inertia"),
                Expansion = values.NumberOrNone($"{p}/expansion"),
            })],
        };
    }

    public static Gradient? Gradient(FieldValues values, string path) => !values.HasGroup(path) ? null : new Gradient
    {
        Zone = values.Text($"{path}/zone"),
        Surface = MemberWords.Of<DeckSurface>(values.Text($"{path}/surface")),
        Shape = MemberWords.Of<DeckShape>(values.Text($"{path}/shape")),
        Warm = Points(values, $"{path}/warm"),
        Cool = Points(values, $"{path}/cool"),
        Source = values.Text($"{path}/source"),
    };

    private static ImmutableArray<GradientPoint> Points(FieldValues values, string path) =>
        [.. values.Items(path).Select(p => new GradientPoint(values.Number($"{p}/depth"), values.Number($"{p}/difference")))];
}
