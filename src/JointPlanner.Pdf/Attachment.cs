using System.Security.Cryptography;

namespace JointPlanner.Pdf;

/// <summary>A file that travels inside the PDF, byte for byte.</summary>
/// <param name="Name">File name, without folders; once in a document.</param>
/// <param name="MediaType">Media type, such as <c>application/json</c>.</param>
/// <param name="Bytes">The content.</param>
/// <param name="Relation">What it is to the sheet.</param>
/// <param name="Description">What it is, in words.</param>
public sealed record Attachment(string Name, string MediaType, ReadOnlyMemory<byte> Bytes, AttachmentRelation Relation, string Description)
{
    /// <summary>SHA-256 of the content in lower-case hexadecimal digits, as printed on the sheet.</summary>
    public string Sha256 => Convert.ToHexStringLower(SHA256.HashData(Bytes.Span));
}
