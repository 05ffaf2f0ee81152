namespace JointPlanner.Engine.Bases;

/// <summary>What a basis says to a question: an answer or silence. Silence is printed and the designer decides; nothing is borrowed from another code.</summary>
/// <typeparam name="T">Kind of answer.</typeparam>
public abstract record Answer<T>
{
    /// <summary>The answer, where there is one.</summary>
    public static implicit operator Answer<T>(T value) => new Said<T>(value);
}

/// <summary>An answer.</summary>
/// <typeparam name="T">Kind of answer.</typeparam>
/// <param name="Value">The answer.</param>
public sealed record Said<T>(T Value) : Answer<T>;

/// <summary>The basis is silent.</summary>
/// <typeparam name="T">Kind of answer.</typeparam>
/// <param name="Why">Why, as a sentence for screen and sheet.</param>
public sealed record Silent<T>(string Why) : Answer<T>;
