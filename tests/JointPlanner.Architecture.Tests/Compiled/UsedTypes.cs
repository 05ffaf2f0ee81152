using System.Reflection.Emit;
using System.Reflection.Metadata;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>Names of all types that one type has to do with: its base and interfaces, its fields, signatures, locals, and every token in its methods.</summary>
public static class UsedTypes
{
    public static IEnumerable<string> Of(Assembly assembly, TypeDefinitionHandle handle)
    {
        var reader = assembly.Reader;
        var type = reader.GetTypeDefinition(handle);
        var name = TypeNames.Of(reader, handle);
        var shapes = new List<Shape>();
        if (!type.BaseType.IsNil)
        {
            shapes.Add(Member.OwnerOf(reader, type.BaseType));
        }
        shapes.AddRange(type.GetInterfaceImplementations().Select(i => Member.OwnerOf(reader, reader.GetInterfaceImplementation(i).Interface)));
        shapes.AddRange(type.GetFields().Select(f => Member.Of(reader, f).Result));
        shapes.AddRange(type.GetMethods().SelectMany(m => Member.Of(reader, m).Shapes));
        foreach (var method in assembly.Methods().Where(m => m.TypeName == name))
        {
            shapes.AddRange(method.Locals);
            shapes.AddRange(method.Instructions.Where(i => i.NamesAnEntity).SelectMany(i => Named(reader, i)));
        }
        return shapes.SelectMany(s => s.Names());
    }

    private static IEnumerable<Shape> Named(MetadataReader reader, Instruction instruction)
    {
        var isType = instruction.Entity.Kind is HandleKind.TypeDefinition or HandleKind.TypeReference or HandleKind.TypeSpecification;
        if (isType || instruction.Code.OperandType == OperandType.InlineType)
        {
            return [Member.OwnerOf(reader, instruction.Entity)];
        }
        var shapes = Member.Of(reader, instruction.Entity).Shapes;
        return instruction.Entity.Kind == HandleKind.MethodSpecification
            ? shapes.Concat(reader.GetMethodSpecification((MethodSpecificationHandle)instruction.Entity).DecodeSignature(ShapeReader.Instance, null))
            : shapes;
    }
}
