using JointPlanner.Codes.En1992Part1To1Of2004;
using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;

namespace JointPlanner.Codes.Tests.Creep;

public sealed class En1992Part1To1Of2004ModelTests : CreepModelSpecification
{
    private const double Forever = 1e6;

    protected override CreepModel Model { get; } = new En1992Part1To1Of2004Model();

    /// <summary>The slab of the JRC composite twin-girder deck: C35/45, class N, 80 %, 3.9 m² with 11.6 m exposed, drying from one day.</summary>
    private static Concrete JrcSlab => new()
    {
        Source = "test",
        Strength = 35 * Mpa,
        CuringEnd = Day,
        Humidity = 0.8,
        Size = new SectionSize(3.9, 11.6),
        EndOfLife = 100 * Year,
    };

    /// <summary>
    /// Published: JRC "Bridge design to Eurocodes - Worked examples" 2012, as quoted in an open-source finite-element library's verification file.
    /// The quoting file computes at a million days; 1.15 for 88 d is 1.15496 there, a hair below the next digit.
    /// </summary>
    [Theory]
    [InlineData(22, 1.51)]
    [InlineData(1, 2.68)]
    [InlineData(88, 1.15)]
    [InlineData(50, 1.29)]
    public void Creep_of_the_JRC_slab_is_as_printed(double loadedAt, double printed) => Assert.Equal(printed, Creep(JrcSlab, Forever, loadedAt), 0.005);

    /// <summary>Published: as above.</summary>
    [Theory]
    [InlineData("α_1", 0.87, 0.005)]
    [InlineData("α_2", 0.96, 0.005)]
    [InlineData("α_3", 0.90, 0.005)]
    [InlineData("φ_RH", 1.15, 0.005)]
    [InlineData("β_fcm", 2.56, 0.005)]
    [InlineData("β_t0", 0.44, 0.005)]
    [InlineData("φ_0", 1.29, 0.005)]
    [InlineData("ε_ca,∞", 6.25e-5, 0.005e-5)]
    [InlineData("β_RH", 0.756, 0.0005)]
    [InlineData("ε_cd,0", 2.53e-4, 0.005e-4)]
    [InlineData("k_h", 0.70, 0.005)]
    public void Parts_of_the_JRC_slab_are_as_printed(string symbol, double printed, double halfDigit) =>
        Assert.Equal(printed, Steps(JrcSlab, Forever, 50)[symbol], halfDigit);

    /// <summary>Published: as above.</summary>
    [Theory]
    [InlineData("β_as", 0.827, 0.0005)]
    [InlineData("ε_ca", 5.17e-5, 0.005e-5)]
    public void Autogenous_shrinkage_of_the_JRC_slab_at_77_days_is_as_printed(string symbol, double printed, double halfDigit) =>
        Assert.Equal(printed, Steps(JrcSlab, 77, 50)[symbol], halfDigit);

    /// <summary>
    /// The report prints β_ds(77, 1) = 1.00, ε_cd = 1.76e-4, ε_cs = 2.28e-4, wrong by a factor of ten: with the notional size in millimetres, as
    /// (3.10) asks, the document's own inputs give 0.0983, 1.742e-5, 6.911e-5 (own arithmetic, not published; the last is a sum of rounded parts). The printed values are not met.
    /// </summary>
    [Theory]
    [InlineData("β_ds", 1.00, 0.0983, 0.00005)]
    [InlineData("ε_cd", 1.76e-4, 1.742e-5, 0.0005e-5)]
    [InlineData("ε_cs", 2.28e-4, 6.911e-5, 0.001e-5)]
    public void The_misprinted_drying_of_the_JRC_slab_is_not_reproduced(string symbol, double printed, double ownArithmetic, double halfDigit)
    {
        var ours = Steps(JrcSlab, 77, 50)[symbol];
        Assert.Equal(ownArithmetic, ours, halfDigit);
        Assert.True(Math.Abs(ours - printed) > 0.5 * printed, "the misprint is far off");
    }

    /// <summary>With the size in metres the printed 1.00 comes out: that is where the misprint seems to come from (our inference).</summary>
    [Fact]
    public void The_misprint_fits_a_size_taken_in_metres()
    {
        const double h0 = 7.8 / 11.6;
        Assert.Equal(1.00, 76 / (76 + (0.04 * Math.Sqrt(h0 * h0 * h0))), 0.005);
    }

    /// <summary>From memory, check against the licensed text: EN 1992-1-1:2004 Table 3.2, per mille, class N. For f_ck 40, RH 20 the table truncates 0.485.</summary>
    [Theory]
    [InlineData(20, new[] { 0.62, 0.58, 0.49, 0.30, 0.17 })]
    [InlineData(40, new[] { 0.48, 0.46, 0.38, 0.24, 0.13 })]
    [InlineData(60, new[] { 0.38, 0.36, 0.30, 0.19, 0.10 })]
    [InlineData(80, new[] { 0.30, 0.28, 0.24, 0.15, 0.08 })]
    [InlineData(90, new[] { 0.27, 0.25, 0.21, 0.13, 0.07 })]
    public void Basic_drying_shrinkage_gives_the_table_of_the_code(double strength, double[] row)
    {
        double[] humidities = [0.20, 0.40, 0.60, 0.80, 0.90];
        foreach (var (humidity, printed) in humidities.Zip(row))
            Assert.Equal(printed, 1000 * Steps(JrcSlab with { Strength = strength * Mpa, Humidity = humidity }, 77, 50)["ε_cd,0"], strength == 40 ? 0.0055 : 0.005);
    }

    /// <summary>An early draft of the code has another table, 0.64 0.60 0.50 0.31 0.17 for f_ck 20 (seen): it is not the edition's, and is not met.</summary>
    [Fact]
    public void The_drafts_table_is_not_reproduced() =>
        Assert.True(Math.Abs(0.64 - (1000 * Steps(JrcSlab with { Strength = 20 * Mpa, Humidity = 0.2 }, 77, 50)["ε_cd,0"])) > 0.015);

    /// <summary>Published: an open-source structural-concrete code library's unit-test reference values, EN 1992-1-1:2004 (seen).</summary>
    [Fact]
    public void Creep_of_a_thin_member_is_that_of_a_public_library()
    {
        var member = JrcSlab with { Cement = CementClass.Rapid, Humidity = 0.5, Size = new NotionalSize(138.5 * Mm) };
        Assert.Equal(2.567, Creep(member, 18263, 7), 0.0005);
    }

    /// <summary>Published: as above.</summary>
    [Theory]
    [InlineData(138.5, CementClass.Rapid, 656.02)]
    [InlineData(600, CementClass.Normal, 370.48)]
    public void Shrinkage_is_that_of_a_public_library(double size, CementClass cement, double printed)
    {
        var member = JrcSlab with { Cement = cement, Humidity = 0.5, Size = new NotionalSize(size * Mm), CuringEnd = 28 * Day };
        Assert.Equal(printed, 1e6 * Shrinkage(member, 18263), 0.005);
        Assert.Equal(62.5, 1e6 * Steps(member, 18263, 28)["ε_ca,∞"], 0.05);
    }

    /// <summary>Regression check, own arithmetic, not published: share of the JRC slab's shrinkage still to come at ages.</summary>
    [Theory]
    [InlineData(30, 48.7)]
    [InlineData(90, 73.2)]
    [InlineData(180, 94.4)]
    [InlineData(365, 121.9)]
    [InlineData(730, 152.8)]
    public void The_JRC_slab_dries_slowly(double age, double millionths) => Assert.Equal(millionths, 1e6 * Shrinkage(JrcSlab, age), 0.05);

    /// <summary>Regression check, own arithmetic, not published: (B.9) for seven days with the three cements.</summary>
    [Theory]
    [InlineData(CementClass.Slow, 4.046)]
    [InlineData(CementClass.Normal, 7)]
    [InlineData(CementClass.Rapid, 12.109)]
    public void The_cement_shifts_the_age_at_loading(CementClass cement, double days) =>
        Assert.Equal(days, Steps(JrcSlab with { Cement = cement }, 1000, 7)["t_0,adj"], 0.0005);

    /// <summary>Regression check, own arithmetic, not published.</summary>
    [Fact]
    public void A_box_of_C40_keeps_half_of_its_shortening_after_half_a_year()
    {
        var box = JrcSlab with { Strength = 40 * Mpa, Humidity = 0.75, Size = new NotionalSize(0.5), CuringEnd = 3 * Day };
        Assert.Equal(0.7441, Creep(box, 180, 28), 0.00005);
        Assert.Equal(1.3806, Creep(box, 36500, 28), 0.00005);
        Assert.Equal(125.97, 1e6 * Shrinkage(box, 180), 0.005);
        Assert.Equal(270.42, 1e6 * Shrinkage(box, 36500), 0.005);
        var derivation = new Derivation();
        Assert.Equal(36.981e9, Said(Model.CreepModulus(Of(box), Age(28, derivation), derivation)), 0.0005e9);
    }

    [Fact]
    public void A_younger_concrete_has_a_smaller_modulus_and_at_28_days_its_own()
    {
        var derivation = new Derivation();
        var at28 = Said(Model.CreepModulus(Of(JrcSlab), Age(28, derivation), derivation));
        Assert.Equal(at28, Said(Model.ElasticModulus(Of(JrcSlab), Age(28, derivation), derivation)), 1);
        Assert.True(Said(Model.ElasticModulus(Of(JrcSlab), Age(7, derivation), derivation)) < at28);
    }
}
