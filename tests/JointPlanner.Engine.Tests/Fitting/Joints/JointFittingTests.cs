using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Combining;
using JointPlanner.Engine.Fitting.Joints;
using JointPlanner.Engine.Formulas;
using static JointPlanner.Engine.Tests.Fitting.Described;

namespace JointPlanner.Engine.Tests.Fitting.Joints;

public sealed class JointFittingTests
{
    private static readonly FamilyRules Compression = Family("compression-seal", [("least-width-share", 0.45), ("greatest-width-share", 0.80)],
        ("60", [("width", 0.060)]), ("100", [("width", 0.100)]));
    private static readonly FamilyRules Strip = Family("strip-seal", [("least-opening", 0.010)],
        ("60", [("greatest-opening", 0.060)]), ("80", [("greatest-opening", 0.080)]));
    private static readonly FamilyRules Finger = Family("finger", [("least-overlap", 0.040), ("least-clearance", 0.025)],
        ("150", [("finger-length", 0.150)]), ("300", [("finger-length", 0.300)]));
    private static readonly FamilyRules Modular = Family("modular",
        [("centre-beam-width", 0.080), ("least-cell-gap", 0.005), ("greatest-cell-gap", 0.080)], ("2", [("cells", 2)]), ("6", [("cells", 6)]));

    private readonly Derivation d = new();

    [Fact]
    public void The_owners_first_family_that_fits_is_taken_and_those_that_do_not_fit_come_last()
    {
        var fit = Fit(Moving(2e-3), Owner(Compression, Modular, Strip), d);

        Assert.Equal(["modular", "compression-seal", "strip-seal"], fit.Families.Select(f => f.Family));
        Assert.Equal(("modular", "2"), (fit.Chosen!.Family, fit.Chosen.Size));
        Assert.Equal(["fit-no-size", "fit-no-size"], fit.Families.Skip(1).Select(f => f.Rejection!.Id));
        Assert.DoesNotContain(d.Findings, f => f.Severity >= Severity.BlocksIssue);
    }

    [Fact]
    public void A_family_that_does_not_fit_tells_rule_and_numbers_of_its_largest_size()
    {
        var rejection = Fit(Moving(2e-3), Owner(Strip), d).Families[0].Rejection!;

        Assert.Contains("80", rejection.Template, StringComparison.Ordinal);
        Assert.Contains("movement between least opening and greatest opening", rejection.Template, StringComparison.Ordinal);
        Assert.Equal([0.080, 0.070, 0.010], rejection.Values.Select(v => Math.Round(v.Value, 12)));
    }

    [Fact]
    public void Where_no_size_fits_nothing_is_chosen_and_issue_is_stopped()
    {
        var fit = Fit(Moving(0.1), Owner(Compression, Strip, Modular), d);

        Assert.Null(fit.Chosen);
        Assert.All(fit.Families, f => Assert.Null(f.Best));
        var finding = Assert.Single(d.Findings, f => f.Severity == Severity.BlocksIssue);
        Assert.Equal(("fit-nothing", "joints/j1"), (finding.Id, finding.Path));
    }

    [Theory]
    [InlineData("compression-seal")]
    [InlineData("strip-seal")]
    [InlineData("finger")]
    [InlineData("modular")]
    public void No_size_of_any_family_fits_a_joint_that_moves_too_far(string family)
    {
        var rules = new[] { Compression, Strip, Finger, Modular }.Single(f => f.Family == family);
        var fit = Fit(Moving(0.1), Owner(rules), d).Families.Single();

        Assert.Null(fit.Best);
        Assert.Equal("fit-no-size", fit.Rejection!.Id);
        Assert.All(fit.Sizes, s => Assert.True(s.RejectedBy!.Room < 0));
        Assert.NotNull(Fit(Moving(0.3e-3), Owner(rules), d).Families.Single().Best);
    }

    [Fact]
    public void Limits_of_the_code_that_the_owner_replaces_are_named()
    {
        var code = new CodeGapLimits([Limit("code's greatest gap", Bound.Upper, 0.040, Column.GapStrength, Measure.Along)], []);
        Fit(Moving(0.5e-3), Owner(Strip with { ReplacesCodeLimits = true }), d, code: code);
        var finding = Assert.Single(d.Findings);

        Assert.Equal(("fit-code-limits-replaced", Severity.Note), (finding.Id, finding.Severity));
        Assert.Contains("code's greatest gap", finding.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void The_designers_choice_is_kept_although_another_family_stands_first()
    {
        var fit = Fit(Moving(0.5e-3, "modular", "6"), Owner(Compression, Modular), d);

        Assert.Equal(("modular", "6", true), (fit.Chosen!.Family, fit.Chosen.Size, fit.ChosenByDesigner));
        Assert.Empty(d.Findings);
    }

    [Fact]
    public void A_choice_of_family_alone_takes_its_smallest_size_that_fits() =>
        Assert.Equal("80", Fit(Moving(1.5e-3, "strip-seal"), Owner(Modular, Strip), d).Chosen!.Size);

    [Fact]
    public void A_choice_that_does_not_fit_is_kept_and_stops_issue_with_numbers()
    {
        var fit = Fit(Moving(1.5e-3, "strip-seal", "60"), Owner(Strip), d);
        var finding = Assert.Single(d.Findings);

        Assert.Equal("60", fit.Chosen!.Size);
        Assert.Equal(("fit-choice-does-not-fit", Severity.BlocksIssue), (finding.Id, finding.Severity));
        Assert.Equal([0.060, 0.050, 0.010], finding.Values.Select(v => Math.Round(v.Value, 12)));
    }

    [Theory]
    [InlineData("finger", "", "fit-family-not-allowed", "joints/j1/chosen-family")]
    [InlineData("strip-seal", "70", "fit-size-not-offered", "joints/j1/chosen-size")]
    public void A_choice_that_the_owner_does_not_offer_is_named_with_what_there_is(string family, string size, string id, string path)
    {
        var fit = Fit(Moving(0.5e-3, family, size), Owner(Strip), d);
        var finding = Assert.Single(d.Findings);

        Assert.Null(fit.Chosen);
        Assert.Equal((id, path, Severity.BlocksIssue), (finding.Id, finding.Path, finding.Severity));
        Assert.Contains(size.Length > 0 ? "80" : "strip-seal", finding.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void A_rule_set_that_lacks_a_figure_is_told_which()
    {
        var rejection = Fit(Moving(1e-3), Owner(Family("modular", [("least-cell-gap", 0.005), ("greatest-cell-gap", 0.080)], ("2", [("cells", 2)]))), d)
            .Families[0].Rejection!;

        Assert.Equal(("fit-figures-missing", Severity.Error), (rejection.Id, rejection.Severity));
        Assert.Contains("centre-beam-width", rejection.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void A_family_that_there_is_not_is_named_with_those_there_are()
    {
        var rejection = Fit(Moving(1e-3), Owner(Family("rubber-mat", [], ("1", []))), d).Families[0].Rejection!;

        Assert.Equal("fit-family-unknown", rejection.Id);
        Assert.Contains("compression-seal, strip-seal, finger, modular", rejection.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void Without_families_the_finding_says_what_to_do()
    {
        Assert.Null(Fit(Moving(1e-3), Owner(), d).Chosen);
        Assert.Equal("fit-no-families", Assert.Single(d.Findings).Id);
    }

    [Fact]
    public void The_doubt_about_setting_can_cost_a_size()
    {
        var certain = Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30)]);
        var doubtful = Demand(d, Joint(10), [Thermal(d, 1e-3, -10, 30, doubt: 10)]);

        Assert.Equal("60", Fit(certain, Owner(Strip), d).Chosen!.Size);
        Assert.Equal("80", Fit(doubtful, Owner(Strip), d).Chosen!.Size);
    }

    [Fact]
    public void Only_columns_by_which_the_choice_is_judged_ask_for_answers()
    {
        var counting = Counts() with { Entries = Counts().Entries.Remove((Cause.LiveLoad, Column.GapStrength)).Remove((Cause.LiveLoad, Column.SealRange)) };
        var demand = Moving(0.2e-3) with { Others = [Other(d, Cause.LiveLoad, 0.001, 0.001, false)] };
        Fit(demand, Owner(Strip), d, counting);

        var finding = Assert.Single(d.Findings);
        Assert.Equal("counting-silent", finding.Id);
        Assert.Contains("seal range", finding.Template, StringComparison.Ordinal);
    }

    [Fact]
    public void A_larger_working_range_never_turns_a_fit_into_a_rejection()
    {
        for (var greatest = 0.030; greatest < 0.150; greatest += 0.002)
        {
            var smaller = Fit(Moving(1.3e-3), Owner(Family("strip-seal", [("least-opening", 0.010)], ("s", [("greatest-opening", greatest)]))), d).Chosen;
            var larger = Fit(Moving(1.3e-3), Owner(Family("strip-seal", [("least-opening", 0.010)], ("s", [("greatest-opening", greatest + 0.002)]))), d).Chosen;
            Assert.True(smaller is null || larger is not null, $"{greatest} m fits, {greatest + 0.002} m does not");
        }
    }

    [Fact]
    public void Steps_or_none_the_numbers_are_the_same_bits()
    {
        var kept = Fit(Moving(0.7e-3), Owner(Compression, Strip, Modular), d);
        var bare = Fit(Moving(0.7e-3), Owner(Compression, Strip, Modular), new Derivation(keepsSteps: false));

        Assert.Equal(Numbers(bare), Numbers(kept));
        static double[] Numbers(JointFit fit) => [.. fit.Families.SelectMany(f => f.Sizes).SelectMany(s => s.Rules).SelectMany(r => new[] { r.Value.Value, r.Limit.Value, r.Room })];
    }

    /// <summary>A joint that closes and opens 20 K times the rate.</summary>
    private JointDemand Moving(double rate, string family = "", string size = "") =>
        Demand(d, Joint(10) with { ChosenFamily = family, ChosenSize = size }, [Thermal(d, rate, -10, 30)]);
}
