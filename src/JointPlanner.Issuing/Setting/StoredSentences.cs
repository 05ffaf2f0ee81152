using JointPlanner.Engine.Formulas;
using JointPlanner.Exchange.Documents;
using JointPlanner.Exchange.Packages;

namespace JointPlanner.Issuing.Setting;

/// <summary>Issued sentences with their numbers, to be printed in the reader's units.</summary>
internal static class StoredSentences
{
    /// <summary>The sentence.</summary>
    /// <exception cref="InvalidDataException">It holds a number of an unknown kind.</exception>
    public static Finding Of(StoredFinding stored) => new(stored.Id, MemberWords.Of<Severity>(stored.Severity), stored.Path, stored.Sentence,
        [.. stored.Numbers.Select(n => (Quantity.All.FirstOrDefault(q => q.Id == n.Quantity) ?? throw new InvalidDataException($"The issued results hold a number of the unknown kind {n.Quantity}."), n.Value))]);
}
