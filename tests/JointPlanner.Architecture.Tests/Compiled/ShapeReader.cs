using System.Collections.Immutable;
using System.Reflection.Metadata;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>Reads signatures of a compiled assembly as shapes. Array, pointer and reference types keep their element as an argument.</summary>
public sealed class ShapeReader : ISignatureTypeProvider<Shape, object?>
{
    public static ShapeReader Instance { get; } = new();

    public Shape GetPrimitiveType(PrimitiveTypeCode typeCode) => typeCode switch
    {
        PrimitiveTypeCode.Void => Shape.Void,
        PrimitiveTypeCode.Single or PrimitiveTypeCode.Double => new(ShapeKind.Floating, "System." + typeCode, []),
        _ => Shape.Other("System." + typeCode),
    };

    public Shape GetTypeFromDefinition(MetadataReader reader, TypeDefinitionHandle handle, byte rawTypeKind) =>
        Shape.Other(TypeNames.Of(reader, handle));

    public Shape GetTypeFromReference(MetadataReader reader, TypeReferenceHandle handle, byte rawTypeKind) =>
        Shape.Other(TypeNames.Of(reader, handle));

    public Shape GetTypeFromSpecification(MetadataReader reader, object? genericContext, TypeSpecificationHandle handle, byte rawTypeKind) =>
        reader.GetTypeSpecification(handle).DecodeSignature(this, genericContext);

    public Shape GetGenericInstantiation(Shape genericType, ImmutableArray<Shape> typeArguments) => genericType with { Arguments = typeArguments };

    public Shape GetGenericTypeParameter(object? genericContext, int index) => new(ShapeKind.TypeParameter, "!" + index, [], index);

    public Shape GetGenericMethodParameter(object? genericContext, int index) => new(ShapeKind.MethodParameter, "!!" + index, [], index);

    public Shape GetSZArrayType(Shape elementType) => MadeOf("[]", elementType);

    public Shape GetArrayType(Shape elementType, ArrayShape shape) => MadeOf("[,]", elementType);

    public Shape GetByReferenceType(Shape elementType) => MadeOf("&", elementType);

    public Shape GetPointerType(Shape elementType) => MadeOf("*", elementType);

    public Shape GetFunctionPointerType(MethodSignature<Shape> signature) => Shape.Other("function pointer");

    public Shape GetModifiedType(Shape modifier, Shape unmodifiedType, bool isRequired) => unmodifiedType;

    public Shape GetPinnedType(Shape elementType) => elementType;

    private static Shape MadeOf(string mark, Shape element) => new(ShapeKind.Other, mark, [element]);
}
