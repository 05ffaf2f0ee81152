namespace JointPlanner.Pdf.Reading;

/// <summary>A PDF could not be read; the only exception that reading any bytes may end in, apart from cancellation.</summary>
/// <param name="failure">The reason, for programs.</param>
/// <param name="message">The reason, for people.</param>
public sealed class PdfReadException(PdfReadFailure failure, string message) : Exception(message)
{
    /// <summary>The reason, for programs.</summary>
    public PdfReadFailure Failure { get; } = failure;

    internal static PdfReadException Malformed(string what, int at) =>
        new(PdfReadFailure.Malformed, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"The PDF is damaged at byte {at}: {what}."));

    internal static PdfReadException Malformed(string what) => new(PdfReadFailure.Malformed, $"The PDF is damaged: {what}.");
}
