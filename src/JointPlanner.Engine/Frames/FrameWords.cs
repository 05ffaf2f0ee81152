namespace JointPlanner.Engine.Frames;

/// <summary>What the solved model is called where a value names it.</summary>
internal static class FrameWords
{
    public const string Name = "frame of the deck";
}
