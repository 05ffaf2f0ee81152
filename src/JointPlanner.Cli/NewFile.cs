namespace JointPlanner.Cli;

/// <summary>Writes a file that must not exist yet: nothing of anybody is replaced.</summary>
internal static class NewFile
{
    /// <summary>Writes it.</summary>
    /// <returns>Null when written, else the exit code; the reason was told.</returns>
    public static int? Write(string path, byte[] bytes, TextWriter error)
    {
        try
        {
            using var file = new FileStream(path, FileMode.CreateNew, FileAccess.Write);
            file.Write(bytes);
            return null;
        }
        catch (IOException problem)
        {
            error.WriteLine($"--out {path}: {problem.Message} Give the name of a file that does not exist, in a folder that does.");
            return ExitCodes.WrongUsage;
        }
    }
}
