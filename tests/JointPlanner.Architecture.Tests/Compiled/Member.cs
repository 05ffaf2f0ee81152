using System.Collections.Immutable;
using System.Reflection.Metadata;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>A method or field that an instruction names: its type, its name, and what goes in and comes out (a field takes nothing).</summary>
public sealed record Member(Shape Owner, string Name, bool HasThis, ImmutableArray<Shape> Parameters, Shape Result)
{
    public string FullName => Owner.Name + "." + Name;

    public IEnumerable<Shape> Shapes => Parameters.Append(Result).Prepend(Owner);

    public static Member Of(MetadataReader reader, EntityHandle handle)
    {
        switch (handle.Kind)
        {
            case HandleKind.MethodDefinition:
                var method = reader.GetMethodDefinition((MethodDefinitionHandle)handle);
                return Made(Shape.Other(TypeNames.Of(reader, method.GetDeclaringType())), reader.GetString(method.Name),
                    method.DecodeSignature(ShapeReader.Instance, null), []);
            case HandleKind.FieldDefinition:
                var field = reader.GetFieldDefinition((FieldDefinitionHandle)handle);
                return new(Shape.Other(TypeNames.Of(reader, field.GetDeclaringType())), reader.GetString(field.Name), false, [],
                    field.DecodeSignature(ShapeReader.Instance, null));
            case HandleKind.MethodSpecification:
                var specification = reader.GetMethodSpecification((MethodSpecificationHandle)handle);
                var arguments = specification.DecodeSignature(ShapeReader.Instance, null);
                return Of(reader, specification.Method).With(arguments);
            case HandleKind.MemberReference:
                var reference = reader.GetMemberReference((MemberReferenceHandle)handle);
                var owner = OwnerOf(reader, reference.Parent);
                return reference.GetKind() == MemberReferenceKind.Field
                    ? new(owner, reader.GetString(reference.Name), false, [],
                        reference.DecodeFieldSignature(ShapeReader.Instance, null).With(owner.Arguments, []))
                    : Made(owner, reader.GetString(reference.Name), reference.DecodeMethodSignature(ShapeReader.Instance, null), owner.Arguments);
            default:
                throw new NotSupportedException($"An instruction names a {handle.Kind} as a member.");
        }
    }

    /// <summary>The type that a type handle names.</summary>
    public static Shape OwnerOf(MetadataReader reader, EntityHandle handle) => handle.Kind switch
    {
        HandleKind.TypeDefinition => Shape.Other(TypeNames.Of(reader, (TypeDefinitionHandle)handle)),
        HandleKind.TypeReference => Named(TypeNames.Of(reader, (TypeReferenceHandle)handle)),
        HandleKind.TypeSpecification => reader.GetTypeSpecification((TypeSpecificationHandle)handle).DecodeSignature(ShapeReader.Instance, null),
        HandleKind.MethodDefinition => Of(reader, handle).Owner,
        _ => throw new NotSupportedException($"A member belongs to a {handle.Kind}."),
    };

    // A type token spells out a floating-point type by name, where a signature has a code for it.
    private static Shape Named(string name) => name is "System.Double" or "System.Single" ? new(ShapeKind.Floating, name, []) : Shape.Other(name);

    private static Member Made(Shape owner, string name, MethodSignature<Shape> signature, ImmutableArray<Shape> ofType) =>
        new(owner, name, signature.Header.IsInstance, [.. signature.ParameterTypes.Select(p => p.With(ofType, []))], signature.ReturnType.With(ofType, []));

    private Member With(ImmutableArray<Shape> ofMethod) =>
        this with { Parameters = [.. Parameters.Select(p => p.With([], ofMethod))], Result = Result.With([], ofMethod) };
}
