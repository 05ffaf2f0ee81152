using JointPlanner.Pdf.Reading;

namespace JointPlanner.Cli.Comparing;

/// <summary>The stored package and results of a sheet, out of the sheet itself or from two files.</summary>
internal static class StoredFiles
{
    private const string Package = "calculation.json", Results = "results.json";

    /// <summary>Reads them.</summary>
    /// <param name="path">A sheet or a package.</param>
    /// <param name="results">File of the results; null to look beside the package.</param>
    /// <exception cref="InvalidDataException">Something is missing or cannot be read; the message names the file and what to do.</exception>
    public static (byte[] Package, byte[] Results) Read(string path, string? results)
    {
        var bytes = Existing(path);
        if (bytes.AsSpan().StartsWith("%PDF-"u8)) return Attached(path, bytes);
        var beside = results ?? Path.Combine(Path.GetDirectoryName(Path.GetFullPath(path)) ?? ".", Results);
        return File.Exists(beside)
            ? (bytes, File.ReadAllBytes(beside))
            : throw new InvalidDataException($"--results {beside}: there is no such file. Give the results that belong to the package, or the sheet that carries both.");
    }

    private static (byte[], byte[]) Attached(string path, byte[] pdf)
    {
        try
        {
            var attached = Attachments.Read(pdf).ToDictionary(a => a.Name, a => a.Bytes);
            return attached.TryGetValue(Package, out var package) && attached.TryGetValue(Results, out var results)
                ? (package, results)
                : throw new InvalidDataException($"{path}: the PDF was not made by this program: it carries no {Package} and {Results}. Choose the sheet itself.");
        }
        catch (PdfReadException unreadable)
        {
            throw new InvalidDataException($"{path}: {unreadable.Message}", unreadable);
        }
    }

    private static byte[] Existing(string path) =>
        File.Exists(path) ? File.ReadAllBytes(path) : throw new InvalidDataException($"{path}: there is no such file. Check the name.");
}
