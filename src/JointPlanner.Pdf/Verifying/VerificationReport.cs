namespace JointPlanner.Pdf.Verifying;

/// <summary>What kind of file was given.</summary>
public enum FileOrigin
{
    /// <summary>The bytes could not be read as a PDF within the limits.</summary>
    NotReadable,

    /// <summary>A PDF without the attachments and signature fields that every sheet of this program has.</summary>
    NotMadeByThisProgram,

    /// <summary>A PDF in the form of a sheet of this program. That alone proves nothing: anyone can imitate the form.</summary>
    InTheFormOfASheet,
}

/// <summary>What a reader may conclude from a file, one statement at a time; there is no overall tick.</summary>
/// <param name="Origin">What kind of file it is.</param>
/// <param name="OriginText">The same in a sentence, with the reason where it could not be read.</param>
/// <param name="Length">Length of the file in bytes.</param>
/// <param name="Sha256">SHA-256 of the file, upper-case hexadecimal.</param>
/// <param name="Signatures">One report per filled signature field, in the order of signing.</param>
/// <param name="EmptyFields">Names of the signature fields that nobody has filled.</param>
/// <param name="Archive">How the bytes compare with the archived ones; null when no archived hashes were given.</param>
/// <param name="Checked">What was checked and what was not, as sentences.</param>
public sealed record VerificationReport(
    FileOrigin Origin, string OriginText, long Length, string Sha256, IReadOnlyList<SignatureReport> Signatures,
    IReadOnlyList<string> EmptyFields, ArchiveStatement? Archive, IReadOnlyList<string> Checked)
{
    /// <summary>"no signature", or how many there are; not a verdict.</summary>
    public string SignatureCountText => Signatures.Count switch
    {
        0 => "no signature",
        1 => "1 signature",
        _ => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Signatures.Count} signatures"),
    };
}

/// <summary>Three separate statements about one signature.</summary>
/// <param name="Field">Name of the signature field.</param>
/// <param name="Unchanged">Are the signed bytes as signed, and what came after?</param>
/// <param name="Who">Whose certificate is it, and who vouches for that?</param>
/// <param name="When">When was it signed, and who says so?</param>
/// <param name="StatedName">Name that the signer wrote into the signature; part of what is signed, checked by nobody.</param>
/// <param name="Reason">Reason that the signer gave; empty where none.</param>
/// <param name="Place">Place that the signer gave; empty where none.</param>
/// <param name="NotSigned">Parts of the signature itself that it does not protect, such as certificates carried along.</param>
public sealed record SignatureReport(
    string Field, UnchangedStatement Unchanged, WhoStatement Who, WhenStatement When, string StatedName, string Reason, string Place, IReadOnlyList<string> NotSigned);

/// <summary>The answer to "unchanged?".</summary>
public enum UnchangedVerdict
{
    /// <summary>The signed bytes are as signed; later updates, if any, only signed other prepared fields or stored certificates.</summary>
    Unchanged,

    /// <summary>The signed bytes are as signed, but a later update changed the document.</summary>
    ChangedAfterSigning,

    /// <summary>The bytes are not those that were signed, or the signature leaves open what was signed.</summary>
    Broken,

    /// <summary>A kind of signature that this program does not check.</summary>
    NotCheckable,
}

/// <summary>The answer to "unchanged?".</summary>
/// <param name="Verdict">The answer, for programs.</param>
/// <param name="Text">The answer, for people.</param>
/// <param name="CoveredBytes">The signature speaks for the file's first so many bytes, its own value apart; 0 where that is not established.</param>
/// <param name="LaterChanges">What later updates did, allowed or not.</param>
public sealed record UnchangedStatement(UnchangedVerdict Verdict, string Text, int CoveredBytes, IReadOnlyList<FileChange> LaterChanges);

/// <summary>The answer to "who?".</summary>
public enum WhoVerdict
{
    /// <summary>The certificate leads to a root that the operator trusts, and was within its dates at the time stated by <see cref="WhenStatement"/>.</summary>
    KnownIssuer,

    /// <summary>The certificate leads to no root that the operator trusts.</summary>
    UnknownIssuer,

    /// <summary>The certificate leads to a trusted root, but was not within its dates then, or is not made for signing.</summary>
    CertificateUnsuitable,

    /// <summary>Nothing can be said, because the signature does not fit or cannot be read.</summary>
    NotEstablished,
}

/// <summary>The answer to "who?".</summary>
/// <param name="Verdict">The answer, for programs.</param>
/// <param name="Text">The answer, for people.</param>
/// <param name="Subject">Subject of the signer's certificate; empty where not established.</param>
/// <param name="Issuer">Issuer that the certificate names; empty where not established.</param>
/// <param name="Root">Subject of the trusted root that it leads to; empty where none.</param>
/// <param name="Fingerprint">SHA-256 of the certificate, upper-case hexadecimal; empty where not established.</param>
public sealed record WhoStatement(WhoVerdict Verdict, string Text, string Subject, string Issuer, string Root, string Fingerprint);

/// <summary>The answer to "when?".</summary>
public enum WhenVerdict
{
    /// <summary>A time stamp by a server whose certificate leads to a trusted root.</summary>
    TimeStamped,

    /// <summary>The signer's own word.</summary>
    ClaimedBySigner,

    /// <summary>Neither.</summary>
    NotStated,
}

/// <summary>The answer to "when?".</summary>
/// <param name="Verdict">The answer, for programs.</param>
/// <param name="Text">The answer, for people.</param>
/// <param name="Instant">The instant, in UTC; null where not stated.</param>
public sealed record WhenStatement(WhenVerdict Verdict, string Text, DateTimeOffset? Instant);
