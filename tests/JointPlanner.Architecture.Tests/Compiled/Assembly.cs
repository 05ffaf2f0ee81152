using System.Collections.Immutable;
using System.Reflection.Metadata;
using System.Reflection.PortableExecutable;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>A compiled assembly opened for reading; nothing in it is run.</summary>
public sealed class Assembly : IDisposable
{
    private readonly PEReader file;

    private Assembly(string path)
    {
        file = new PEReader(File.OpenRead(path));
        Reader = file.GetMetadataReader();
    }

    public MetadataReader Reader { get; }

    /// <summary>An assembly of the program, as it was built together with these tests.</summary>
    public static Assembly Of(string name) => new(Path.Combine(AppContext.BaseDirectory, name + ".dll"));

    public static Assembly OfTheseTests() => new(typeof(Assembly).Assembly.Location);

    public IEnumerable<(TypeDefinitionHandle Handle, string Name)> Types() =>
        Reader.TypeDefinitions.Select(h => (h, TypeNames.Of(Reader, h)));

    /// <summary>Every method with a body, with the full name of its type.</summary>
    public IEnumerable<Method> Methods() =>
        from type in Types()
        from handle in Reader.GetTypeDefinition(type.Handle).GetMethods()
        let definition = Reader.GetMethodDefinition(handle)
        where definition.RelativeVirtualAddress != 0
        select new Method(this, type.Name, handle, file.GetMethodBody(definition.RelativeVirtualAddress));

    /// <summary>Every member of another assembly that this one uses, wherever it uses it.</summary>
    public IEnumerable<Member> MembersUsed() =>
        Reader.MemberReferences.Select(h => Member.Of(Reader, h));

    public IEnumerable<string> TypesUsed() => Reader.TypeReferences.Select(h => TypeNames.Of(Reader, h));

    public void Dispose() => file.Dispose();
}

/// <summary>One method with its body.</summary>
public sealed record Method(Assembly Assembly, string TypeName, MethodDefinitionHandle Handle, MethodBodyBlock Body)
{
    public MetadataReader Reader => Assembly.Reader;

    public Member Member => Member.Of(Reader, Handle);

    public string FullName => TypeName + "." + Member.Name;

    public ImmutableArray<Shape> Locals => Body.LocalSignature.IsNil
        ? []
        : Reader.GetStandaloneSignature(Body.LocalSignature).DecodeLocalSignature(ShapeReader.Instance, null);

    public IEnumerable<Instruction> Instructions => Instruction.Read(Body);
}
