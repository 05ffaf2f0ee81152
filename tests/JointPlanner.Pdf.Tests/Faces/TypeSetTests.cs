using JointPlanner.Pdf.Faces;
using JointPlanner.Pictures;

namespace JointPlanner.Pdf.Tests.Faces;

public class TypeSetTests
{
    [Fact]
    public void Digits_are_all_of_one_width_in_each_style()
    {
        foreach (var style in Enum.GetValues<FaceStyle>())
            Assert.Single("0123456789".Select(d => TypeSet.Standard.Width(d.ToString(), style, 10)).Distinct());
    }

    [Fact]
    public void A_minus_sign_is_as_wide_as_a_plus_sign() =>
        Assert.Equal(TypeSet.Standard.Width("+", FaceStyle.Regular, 10), TypeSet.Standard.Width("−", FaceStyle.Regular, 10), 6);

    [Theory]
    [InlineData("ΔT ≤ 5 °C ± 0.5, √ · × ⁻⁶ ₀ ½ ‰ – … ″ ′ θ φ ψ ε")]
    [InlineData("Ångström Łódź İstanbul Straße naïve Þingvellir Ω Україна")]
    [InlineData("→ ← ↔ ⇄ ✓ ✗ ∑ ∫ ∅ ∞ ∆ ≈ ≠ ≥ ∥ ⊥")]
    public void The_signs_of_the_trade_can_all_be_set(string text)
    {
        SortedSet<int> missing = [];
        Assert.Equal(text, TypeSet.Standard.Settable(text, missing));
        Assert.Empty(missing);
    }

    [Fact]
    public void A_text_is_split_where_the_face_changes_and_loses_nothing()
    {
        var runs = TypeSet.Standard.Split("there ∥ and ∥.", FaceStyle.Strong);
        Assert.Equal("there ∥ and ∥.", string.Concat(runs.Select(r => r.Text)));
        Assert.Equal(["IBMPlexSans-SemiBold", "DejaVuSans-Bold", "IBMPlexSans-SemiBold", "DejaVuSans-Bold", "IBMPlexSans-SemiBold"], runs.Select(r => r.Face.PostScriptName));
    }

    [Theory]
    [InlineData("Pier 2")]
    [InlineData("Abutment A1, expansion joint J1")]
    [InlineData("opens by 48.5 mm")]
    [InlineData("ΔT = −24.3 °C")]
    [InlineData("mmmm WWWW")]
    [InlineData("illicit lil' jib")]
    public void A_picture_guesses_its_labels_never_narrower_than_they_are(string text)
    {
        foreach (var weight in Enum.GetValues<Weight>())
        {
            var style = weight == Weight.Semibold ? FaceStyle.Strong : FaceStyle.Regular;
            var guess = new Label(Role.Label, new(0, 0), text) { SizeMm = 10, Weight = weight }.GuessedWidthMm;
            var width = TypeSet.Standard.Width(text, style, 10);
            Assert.InRange(width, guess * 0.6, guess);
        }
    }

    [Fact]
    public void The_height_of_a_capital_is_what_pictures_take_it_for()
    {
        var capital = new JointPlanner.Pdf.Writing.GlyphProgram(TypeSet.Standard.Split("H", FaceStyle.Regular)[0].Face, ['H']).CapitalHeight / 1000.0;
        Assert.Equal(Label.CapitalHeight, capital, 3);
    }
}
