using Bunit;
using JointPlanner.Web.Rooms.Structure.Ledger;

namespace JointPlanner.Web.Tests.Rooms.Structure.Ledger;

/// <summary>A deck's concrete in the ledger, from which a model computes creep and shrinkage.</summary>
public sealed class ConcreteFieldsTests : LedgerTest
{
    private const string Described = "teal-mere-bridge", Deck = "segments/deck/concrete";

    [Fact]
    public void A_described_concrete_shows_what_it_is_and_its_stresses()
    {
        var cut = Part<ConcreteFields>(p => p.Add(c => c.Path, "segments/deck"), Described);
        Assert.Equal("from its concrete: 3 stresses", Words(cut.Find("summary")));
        Assert.Equal("70 %", cut.Find($"input[data-path='{Deck}/humidity']").GetAttribute("value"));
        Assert.Equal("0.9 MPa", cut.Find($"input[data-path='{Deck}/stages/#2/stress']").GetAttribute("value"));
        Assert.Contains(cut.FindAll($"select[data-path='{Deck}/model'] option"), o => Words(o) == "fib Model Code 2010");
    }

    [Fact]
    public void Drier_air_typed_in_opens_the_joint_further()
    {
        var cut = Ledger(Described);
        var before = Shrinkage();
        Type(cut, $"{Deck}/humidity", "50 %");
        cut.WaitForAssertion(() => Assert.True(Shrinkage() > before));

        double Shrinkage() => Bench.Result!.Joints[0].Movements.Single(m => m.Cause == Engine.Bases.Cause.Shrinkage).OpensBy.Value;
    }

    [Fact]
    public void A_stress_is_added_and_the_description_taken_out()
    {
        var cut = Part<ConcreteFields>(p => p.Add(c => c.Path, "segments/deck"), Described);
        Button(cut, "add a stress").Click();
        cut.WaitForAssertion(() => Assert.Equal(4, Bench.Document.Items($"{Deck}/stages").Count));
        Button(cut, "no concrete: give the strains").Click();
        cut.WaitForAssertion(() => Assert.False(Bench.Document.Has(Deck)));
    }

    [Fact]
    public void Only_concrete_decks_are_asked_for_their_concrete()
    {
        Assert.Empty(Ledger(Composite).FindAll($"[data-path='{Deck}/humidity']"));
        Assert.NotEmpty(Ledger(Viaduct).FindAll("[data-path='segments/west/concrete/humidity']"));
    }

    [Fact]
    public void The_age_at_setting_is_asked_where_the_concrete_is_described() =>
        Assert.NotEmpty(Ledger(Described).FindAll("[data-path='joints/j1/setting/far-deck-age']"));
}
