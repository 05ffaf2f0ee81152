using System.Collections.Immutable;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.Plans;

/// <summary>Methods of measuring as they stand in a plan or an owner's rule set.</summary>
internal static class MeasuringMethods
{
    public static ImmutableArray<MeasuringMethod> Methods(this FieldValues values, string list) =>
    [
        .. values.Items(list).Select(path => new MeasuringMethod(path[(path.LastIndexOf('/') + 1)..], values.Text($"{path}/name"),
            values.Number($"{path}/temperature-uncertainty"), values.Text($"{path}/source"))),
    ];
}
