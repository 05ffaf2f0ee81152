using JointPlanner.Issuing.Comparing;

namespace JointPlanner.Issuing.Tests.Comparing;

public sealed class TolerancesTests
{
    private static readonly Tolerances Demo = Tolerances.Of(Calculation.Of(SeedData.Structure("sorrel-creek-crossing"), SeedData.Shelf).Result);

    [Fact]
    public void The_same_bits_are_the_same() => Assert.Equal(Sameness.Same, Demo.Compare("joint/j1/opens-by/uniform-temperature", 0.1, 0.1));

    [Fact]
    public void A_closed_form_is_held_closer_than_what_a_solved_model_gave()
    {
        // Temperatures come from tables and sums alone; a movement rests on the solved lengths.
        const double apart = 1 + 5e-9;
        Assert.Equal(Sameness.Changed, Demo.Compare("segment/deck/temperature/max", 40, 40 * apart));
        Assert.Equal(Sameness.WithinRounding, Demo.Compare("joint/j1/opens-by/uniform-temperature", 0.02, 0.02 * apart));
    }

    [Fact]
    public void A_key_without_a_step_is_held_to_its_own_size()
    {
        Assert.Equal(Sameness.WithinRounding, Demo.Compare("nowhere", 1, 1 + 5e-8));
        Assert.Equal(Sameness.Changed, Demo.Compare("nowhere", 1e-9, 1e-9 + 5e-15));
    }

    [Fact]
    public void Beside_larger_terms_a_small_one_has_their_room()
    {
        Assert.Equal(Sameness.WithinRounding, Tolerances.Compare(1e-9, 2e-9, largest: 1));
        Assert.Equal(Sameness.Changed, Tolerances.Compare(1e-9, 2e-9, largest: 1e-9));
        Assert.Equal(Sameness.Changed, Tolerances.Compare(null, 1, largest: 1));
        Assert.Equal(Sameness.Same, Tolerances.Compare(null, null, largest: 1));
    }
}
