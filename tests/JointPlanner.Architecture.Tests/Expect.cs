namespace JointPlanner.Architecture.Tests;

/// <summary>Says every breach in full: the runner's own message for a list that should be empty cuts it short.</summary>
public static class Expect
{
    public static void NoBreach(IEnumerable<string> breaches)
    {
        var found = breaches.ToList();
        Assert.True(found.Count == 0, string.Join('\n', found));
    }
}
