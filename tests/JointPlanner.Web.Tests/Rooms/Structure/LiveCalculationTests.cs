using JointPlanner.Web.Rooms.Structure;

namespace JointPlanner.Web.Tests.Rooms.Structure;

public sealed class LiveCalculationTests
{
    [Fact]
    public async Task Only_the_newest_of_calls_that_overtake_each_other_gives_a_result()
    {
        using var begun = new ManualResetEventSlim();
        using var mayStop = new ManualResetEventSlim();
        using var calculation = new LiveCalculation<int, string>((given, token) =>
        {
            if (given != 1) return $"of {given}";
            // Stopping the first takes until the third has come: then the second is still waiting for it.
            using var stopping = token.Register(mayStop.Wait);
            begun.Set();
            token.WaitHandle.WaitOne();
            token.ThrowIfCancellationRequested();
            return "of 1";
        });
        var first = calculation.Newest(1);
        begun.Wait(TestContext.Current.CancellationToken);
        var second = calculation.Newest(2);
        var third = calculation.Newest(3);
        mayStop.Set();
        Assert.Equal([null, null, "of 3"], await Task.WhenAll(first, second, third));
    }

    [Fact]
    public async Task A_call_by_itself_gives_its_result()
    {
        using var calculation = new LiveCalculation<int, string>((given, _) => $"of {given}");
        Assert.Equal("of 7", await calculation.Newest(7));
        Assert.Equal("of 8", await calculation.Newest(8));
    }
}
