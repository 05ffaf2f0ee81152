using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Documents;

namespace JointPlanner.Exchange.OwnerRules;

/// <summary>What a rule-set file says: the rules, or what is wrong with it.</summary>
/// <param name="Rules">The rules; null where a fault stands in their way.</param>
/// <param name="Faults">Faults and warnings.</param>
/// <param name="Root">The document as it stands, for a package to hold by value; null where the file was none.</param>
public sealed record OwnerRulesReading(OwnerRuleSet? Rules, ImmutableArray<Fault> Faults, MapNode? Root);
