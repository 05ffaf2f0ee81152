using System.Diagnostics;

namespace JointPlanner.Pdf.Tests.Signing;

/// <summary>Runs a program that knows nothing of this project, in a folder of its own.</summary>
internal sealed class OutsideTool : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("jointplanner-pdf-");

    public string PathOf(string name) => Path.Combine(_folder.FullName, name);

    public string Write(string name, byte[] bytes)
    {
        string path = PathOf(name);
        File.WriteAllBytes(path, bytes);
        return path;
    }

    public byte[] Read(string name) => File.ReadAllBytes(PathOf(name));

    /// <summary>What the program printed, and its exit code. A program that is missing fails the test.</summary>
    public (int ExitCode, string Output) Run(string program, params string[] arguments)
    {
        var start = new ProcessStartInfo(program, arguments) { WorkingDirectory = _folder.FullName, RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["LC_ALL"] = "C.UTF-8";
        start.Environment["TZ"] = "UTC";
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        string output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output + errors.Result);
    }

    public void Dispose() => _folder.Delete(recursive: true);
}
