using System.Diagnostics;

namespace JointPlanner.Pdf.Tests;

/// <summary>Outside programs that read what we wrote. A missing one is a failed test, never a skipped one.</summary>
internal static class Tool
{
    public static (int Code, string Output) Run(string program, params string[] arguments)
    {
        var start = new ProcessStartInfo(program, arguments)
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = System.Text.Encoding.UTF8,
        };
        Process process;
        try
        {
            process = Process.Start(start)!;
        }
        catch (System.ComponentModel.Win32Exception fault)
        {
            throw new InvalidOperationException($"The tests need the program {program}; it is in the packages qpdf and poppler-utils.", fault);
        }
        using (process)
        {
            var errors = process.StandardError.ReadToEndAsync();
            var output = process.StandardOutput.ReadToEnd();
            process.WaitForExit();
            return (process.ExitCode, output + errors.GetAwaiter().GetResult());
        }
    }

    /// <summary>Writes a file into a folder of its own, hands its path over and removes it afterwards.</summary>
    public static T With<T>(byte[] pdf, Func<string, T> use)
    {
        var folder = Directory.CreateTempSubdirectory("sheet-");
        try
        {
            var path = Path.Combine(folder.FullName, "sheet.pdf");
            File.WriteAllBytes(path, pdf);
            return use(path);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    public static string Output(byte[] pdf, string program, params string[] before) => With(pdf, path =>
    {
        string[] after = program == "pdftotext" ? ["-"] : [];
        var (code, output) = Run(program, [.. before, path, .. after]);
        Assert.True(code == 0, $"{program} ended with {code}: {output}");
        return output;
    });
}
