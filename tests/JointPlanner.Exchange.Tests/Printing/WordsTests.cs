using JointPlanner.Engine.Bases;
using JointPlanner.Engine.Formulas;
using JointPlanner.Engine.Plans;
using JointPlanner.Exchange.Printing;

namespace JointPlanner.Exchange.Tests.Printing;

public class WordsTests
{
    [Fact]
    public void Every_member_has_a_word_of_its_own()
    {
        Distinct<Cause>(Words.Of);
        Distinct<Column>(Words.Of);
        Distinct<Measure>(Words.Of);
        Distinct<DeckKind>(Words.Of);
        Distinct<BearingKind>(Words.Of);
        Distinct<SupportKind>(Words.Of);
        Distinct<SettingDoubt>(Words.Of);
        Distinct<SafetyFormat>(Words.Of);
        Distinct<Severity>(FindingText.Of);

        static void Distinct<T>(Func<T, string> word) where T : struct, Enum
        {
            var words = Enum.GetValues<T>().Select(word).ToArray();
            Assert.Equal(words.Length, words.Distinct().Count());
            Assert.DoesNotContain("", words);
        }
    }
}
