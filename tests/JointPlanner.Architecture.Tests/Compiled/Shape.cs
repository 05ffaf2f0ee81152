using System.Collections.Immutable;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>As much of a type as the checks ask for: is it a floating-point number, what is it called, what is it made of.</summary>
public sealed record Shape(ShapeKind Kind, string Name, ImmutableArray<Shape> Arguments, int Index = 0)
{
    public static Shape Void { get; } = new(ShapeKind.Void, "System.Void", []);

    public static Shape Other(string name) => new(ShapeKind.Other, name, []);

    public bool IsFloating => Kind == ShapeKind.Floating;

    /// <summary>The same shape with the parameters of the generic type and method replaced by what stands for them here.</summary>
    public Shape With(ImmutableArray<Shape> ofType, ImmutableArray<Shape> ofMethod) => Kind switch
    {
        ShapeKind.TypeParameter => Index < ofType.Length ? ofType[Index] : this,
        ShapeKind.MethodParameter => Index < ofMethod.Length ? ofMethod[Index] : this,
        _ => Arguments.IsEmpty ? this : this with { Arguments = [.. Arguments.Select(a => a.With(ofType, ofMethod))] },
    };

    /// <summary>This type's name and those of everything that it is made of.</summary>
    public IEnumerable<string> Names() => Arguments.SelectMany(a => a.Names()).Prepend(Name);
}

public enum ShapeKind
{
    Void,
    Floating,
    Other,
    TypeParameter,
    MethodParameter,
}
