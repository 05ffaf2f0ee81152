using System.Xml.Linq;

namespace JointPlanner.Architecture.Tests.Tree;

/// <summary>What one project file refers to.</summary>
public sealed record ProjectFile(string Name, IReadOnlyList<string> Projects, IReadOnlyList<string> Packages)
{
    public static ProjectFile Read(string file)
    {
        var document = XDocument.Parse(Repository.Text(file));
        return new(
            Path.GetFileNameWithoutExtension(file),
            [.. document.Descendants("ProjectReference").Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value))],
            [.. document.Descendants("PackageReference").Select(r => r.Attribute("Include")!.Value)]);
    }
}
