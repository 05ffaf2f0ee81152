using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Makes what acts on the deck from the values of its fields.</summary>
internal static class LoadMaking
{
    public static LiveLoad LiveLoad(FieldValues values) => new()
    {
        StandsFor = MemberWords.Of<FrameShare>(values.Text("live-load/stands-for")),
        Lanes = values.NumberOrNone("live-load/lanes") is { } lanes && double.IsFinite(lanes) ? (int)lanes : null,
        Carriageway = values.NumberOrNone("live-load/carriageway"),
        Distribution = values.NumberOrNone("live-load/distribution"),
        DistributionSource = values.Text("live-load/distribution-source"),
        Own = values.HasGroup("live-load/own") ? Own(values, "live-load/own") : null,
    };

    private static OwnLoads Own(FieldValues values, string path)
    {
        if (values.NumberOrNone($"{path}/dynamic") is null) values.Default($"{path}/dynamic", "1", "no dynamic factor is given");
        return new OwnLoads([.. values.Items($"{path}/trains").Select(p => Train(values, p))],
            values.Number($"{path}/uniform"), values.NumberOrNone($"{path}/dynamic") ?? 1, values.Text($"{path}/source"));
    }

    public static SubstructureMovement? Movement(FieldValues values, string path) => !values.HasGroup(path) ? null : new SubstructureMovement(
        values.Number($"{path}/settlement"), values.Number($"{path}/along"), values.Number($"{path}/tilt"), values.Text($"{path}/source"));

    public static DeadLoadToCome? DeadLoad(FieldValues values, string path) =>
        values.HasGroup(path) ? new DeadLoadToCome(values.Number($"{path}/load"), values.Text($"{path}/source")) : null;

    public static BrakingForce? Braking(FieldValues values, string path) =>
        values.HasGroup(path) ? new BrakingForce(values.Number($"{path}/force"), values.Text($"{path}/source")) : null;

    private static OwnTrain Train(FieldValues values, string path) => new(path[(path.LastIndexOf('/') + 1)..],
        [.. values.Items($"{path}/axles").Select(p => new OwnAxle(
            values.Number($"{p}/force"), values.NumberOrNone($"{p}/spacing") ?? 0, values.NumberOrNone($"{p}/spacing-most")))]);
}
