using System.Reflection;

namespace JointPlanner.Issuing;

/// <summary>The program's name and version as packages and sheets carry them.</summary>
public static class ProgramVersion
{
    /// <summary>Version of this build.</summary>
    public static string Number { get; } =
        typeof(ProgramVersion).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion.Split('+')[0] ?? "0";

    /// <summary>Name and version.</summary>
    public static string Name => $"Joint Planner {Number}";
}
