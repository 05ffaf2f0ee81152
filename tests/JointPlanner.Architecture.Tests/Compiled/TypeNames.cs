using System.Reflection.Metadata;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>Full names of types as source writes them: a nested type's name begins with its outer type's.</summary>
public static class TypeNames
{
    public static string Of(MetadataReader reader, TypeDefinitionHandle handle)
    {
        var type = reader.GetTypeDefinition(handle);
        var outer = type.GetDeclaringType();
        var name = reader.GetString(type.Name);
        return outer.IsNil ? Join(reader.GetString(type.Namespace), name) : Of(reader, outer) + "+" + name;
    }

    public static string Of(MetadataReader reader, TypeReferenceHandle handle)
    {
        var type = reader.GetTypeReference(handle);
        var name = reader.GetString(type.Name);
        return type.ResolutionScope.Kind == HandleKind.TypeReference
            ? Of(reader, (TypeReferenceHandle)type.ResolutionScope) + "+" + name
            : Join(reader.GetString(type.Namespace), name);
    }

    /// <summary>The namespace of the outermost type round this one: compiler-made types have none of their own.</summary>
    public static string NamespaceOf(string fullName)
    {
        var outermost = fullName.Split('+')[0];
        var end = outermost.LastIndexOf('.');
        return end < 0 ? "" : outermost[..end];
    }

    private static string Join(string space, string name) => space.Length == 0 ? name : space + "." + name;
}
