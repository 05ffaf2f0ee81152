using JointPlanner.Architecture.Tests.Compiled;
using JointPlanner.Architecture.Tests.Planted.Pages;
using JointPlanner.Architecture.Tests.Tree;

namespace JointPlanner.Architecture.Tests;

/// <summary>
/// A page shows and never computes. The compiled pages are searched, method by method, for arithmetic on floating-point numbers
/// (told from whole-number arithmetic by <see cref="StackWalk"/>) and for calls that compute: the mathematics classes, the
/// operators of decimal and of the program's own quantities, sums and averages. Only the room that turns paper into pixels may.
/// </summary>
public class PagesShowTests
{
    private const string Scale = "JointPlanner.Web.Shared.Scale";

    private static readonly HashSet<string> Operators =
        ["op_Addition", "op_Subtraction", "op_Multiply", "op_Division", "op_Modulus", "op_UnaryNegation", "op_Increment", "op_Decrement",
         "op_CheckedAddition", "op_CheckedSubtraction", "op_CheckedMultiply", "op_CheckedDivision", "op_CheckedUnaryNegation"];

    // What a page may ask of a number: is it one, which is larger, how is it written and read.
    private static readonly HashSet<string> AskedOfNumbers =
        ["Parse", "TryParse", "ToString", "TryFormat", "Equals", "CompareTo", "GetHashCode", "IsNaN", "IsFinite", "IsInfinity", "IsPositiveInfinity",
         "IsNegativeInfinity", "op_Equality", "op_Inequality", "op_LessThan", "op_GreaterThan", "op_LessThanOrEqual", "op_GreaterThanOrEqual",
         "op_Implicit", "op_Explicit", ".ctor"];

    [Fact]
    public void No_page_computes()
    {
        using var web = Assembly.Of("JointPlanner.Web");
        var methods = web.Methods().Where(m => !MayCompute(m.TypeName)).ToList();

        // From the first page on there must be something to search.
        Assert.Equal(Repository.FilesUnder("src/JointPlanner.Web/", ".razor").Count > 0, methods.Count > 100);
        Expect.NoBreach(methods.SelectMany(Computations));
    }

    [Theory]
    [InlineData(nameof(ComputingPage.Adds), "add")]
    [InlineData(nameof(ComputingPage.ScalesItsField), "mul")]
    [InlineData(nameof(ComputingPage.DividesElements), "div")]
    [InlineData(nameof(ComputingPage.Negates), "neg")]
    [InlineData(nameof(ComputingPage.AddsWhatMayBeMissing), "add")]
    [InlineData(nameof(ComputingPage.SubtractsInAConditional), "sub")]
    [InlineData(nameof(ComputingPage.MultipliesSingles), "mul")]
    [InlineData(nameof(ComputingPage.RoundsByMath), "System.Math.Round")]
    [InlineData(nameof(ComputingPage.TakesARoot), "System.Double.Sqrt")]
    [InlineData(nameof(ComputingPage.AddsDecimals), "System.Decimal.op_Addition")]
    [InlineData(nameof(ComputingPage.SumsAList), "System.Linq.Enumerable.Sum")]
    [InlineData(nameof(ComputingPage.UsesAnOperatorOfTheProgram), "JointPlanner.Architecture.Tests.Planted.Pages.Length.op_Addition")]
    public void A_page_that_computes_is_found(string method, string computation)
    {
        using var planted = Assembly.OfTheseTests();
        var name = typeof(ComputingPage).FullName + "." + method;

        var found = planted.Methods().Where(m => m.FullName == name).SelectMany(Computations);
        Assert.Equal([$"{name}: {computation}"], found);
    }

    [Theory]
    [InlineData(nameof(ComputingPage.AddsInALambda))]
    [InlineData(nameof(ComputingPage.AddsAfterWaiting))]
    public void Computing_hidden_in_a_type_that_the_compiler_makes_is_found(string method)
    {
        using var planted = Assembly.OfTheseTests();

        var found = planted.Methods().Where(m => m.FullName.Contains($"<{method}>", StringComparison.Ordinal)).SelectMany(Computations).ToList();
        Assert.Equal("add", Assert.Single(found).Split(": ")[1]);
    }

    [Fact]
    public void A_page_that_shows_counts_and_compares_is_left_in_peace()
    {
        using var planted = Assembly.OfTheseTests();
        var methods = planted.Methods().Where(m => m.TypeName.StartsWith(typeof(ShowingPage).FullName!, StringComparison.Ordinal)).ToList();

        Assert.True(methods.Count >= 6, $"only {methods.Count} methods");
        Expect.NoBreach(methods.SelectMany(Computations));
    }

    [Fact]
    public void The_search_finds_the_arithmetic_of_the_engine()
    {
        using var engine = Assembly.Of("JointPlanner.Engine");

        Assert.True(engine.Methods().SelectMany(Computations).Count() > 20, "an engine without arithmetic?");
    }

    [Theory]
    [InlineData("JointPlanner.Web.Shared.Scale.PaperToPixels", true)]
    [InlineData("JointPlanner.Web.Shared.Scale.PaperToPixels+<Of>d__3", true)]
    [InlineData("JointPlanner.Web.Shared.Scale", true)]
    [InlineData("JointPlanner.Web.Shared.ScaleOfFees", false)]
    [InlineData("JointPlanner.Web.Shared.PictureView", false)]
    public void Only_the_room_of_scale_may_compute(string type, bool may) => Assert.Equal(may, MayCompute(type));

    private static bool MayCompute(string type) => type == Scale || type.StartsWith(Scale + ".", StringComparison.Ordinal) || type.StartsWith(Scale + "+", StringComparison.Ordinal);

    private static IEnumerable<string> Computations(Method method)
    {
        var arithmetic = StackWalk.FloatingArithmeticOf(method).Select(c => c.Name!.Split('.')[0]);
        var calls = method.Instructions.Where(i => i.Code.OperandType == System.Reflection.Emit.OperandType.InlineMethod)
            .Select(i => Member.Of(method.Reader, i.Entity)).Where(Computes).Select(m => m.FullName);
        return arithmetic.Concat(calls).Select(c => $"{method.FullName}: {c}");
    }

    private static bool Computes(Member called) => called.Owner.Name switch
    {
        "System.Math" or "System.MathF" => true,
        "System.Double" or "System.Single" or "System.Decimal" or "System.Half" => !AskedOfNumbers.Contains(called.Name),
        "System.Linq.Enumerable" => called.Name is "Sum" or "Average",
        var owner => owner.StartsWith("System.Numerics.", StringComparison.Ordinal)
            || (owner.StartsWith("JointPlanner.", StringComparison.Ordinal) && Operators.Contains(called.Name)),
    };
}
