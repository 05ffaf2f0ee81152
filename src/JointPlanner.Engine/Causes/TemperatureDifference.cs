using System.Collections.Immutable;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Climates;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Frames;
using JointPlanner.Engine.Plans;
using JointPlanner.Engine.Sections;

namespace JointPlanner.Engine.Causes;

/// <summary>Vertical temperature difference: decks warmer above and decks cooler above, all of them at once.</summary>
public static class TemperatureDifference
{
    /// <summary>What the two profiles do to the sections that are described with one.</summary>
    /// <exception cref="SilentBasisException">The basis gives no profile and the plan none.</exception>
    public static ImmutableArray<(Segment Segment, SectionState Warm, SectionState Cool)> Sections(
        Plan plan, CodeBasis basis, DeckModel deck, Func<string, SegmentTemperature> temperatureOf, Derivation derivation) =>
    [
        .. from segment in plan.Segments
           where segment.Gradient is not null
           let section = deck.SectionOf(segment.Id)
           where section is not null
           let profiles = ProfilesOf(segment, section, basis, derivation)
           let strains = new FreeStrains(section, temperatureOf(segment.Id).Expansion, derivation)
           select (segment, strains.Of(profiles.Warm), strains.Of(profiles.Cool)),
    ];

    /// <summary>The frame in both states; none where no segment has a difference.</summary>
    public static ImmutableArray<FrameState> States(
        IReadOnlyCollection<(Segment Segment, SectionState Warm, SectionState Cool)> sections, DeckModel deck, FrameSolver solver)
    {
        return sections.Count == 0 ? [] : [State("decks warmer above", s => s.Warm), State("decks cooler above", s => s.Cool)];

        FrameState State(string name, Func<(Segment Segment, SectionState Warm, SectionState Cool), SectionState> stateOf)
        {
            var load = new FrameLoad(deck.Model);
            foreach (var s in sections) load.Strained(s.Segment.Id, stateOf(s).AxialStrain.Value, stateOf(s).Curvature.Value);
            return new FrameState(name, solver.Solve(load), [.. sections.SelectMany(s => new[] { stateOf(s).AxialStrain, stateOf(s).Curvature })]);
        }
    }

    private static TemperatureDifferences ProfilesOf(Segment segment, SectionProperties section, CodeBasis basis, Derivation derivation)
    {
        var gradient = segment.Gradient!;
        if (gradient.IsGiven) return new(Given("warm", "decks warmer above", gradient.Warm), Given("cool", "decks cooler above", gradient.Cool));
        return basis.TemperatureDifference(section, derivation) switch
        {
            Said<TemperatureDifferences> said => said.Value,
            Silent<TemperatureDifferences> silent => throw new SilentBasisException(new Finding("basis-silent", Severity.Error, $"segments/{segment.Id}/gradient",
                $"{basis.Title} does not give the temperature difference of segment {segment.Id}: {silent.Why}. Give a warm and a cool profile of the segment, with their source.")),
            _ => throw new InvalidOperationException("An answer is said or silent."),
        };

        TemperatureProfile Given(string word, string name, ImmutableArray<GradientPoint> points) => new(name,
        [
            .. points.Select((p, i) =>
            {
                var path = FormattableString.Invariant($"segments/{segment.Id}/gradient/{word}/#{i + 1}");
                return new ProfilePoint(
                    derivation.Given($"{path}/depth", "y", "depth of a point of the profile", Quantity.Size, p.Depth, gradient.Source),
                    derivation.Given($"{path}/difference", "T", "temperature difference there", Quantity.TemperatureDifference, p.Difference, gradient.Source));
            }),
        ]);
    }
}
