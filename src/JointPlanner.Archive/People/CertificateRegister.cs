using System.Security.Cryptography;
using System.Security.Cryptography.X509Certificates;
using JointPlanner.Archive.Acts;
using JointPlanner.Archive.Values;
using Microsoft.EntityFrameworkCore;

namespace JointPlanner.Archive.People;

public sealed record CertificateAnswer(Guid CertificateId, string Fingerprint, string PublicKeyHash);

/// <summary>Persons hand in their public certificates; an administrator confirms each by its fingerprint.</summary>
public sealed class CertificateRegister(ActDesk desk)
{
    /// <param name="encoded">The public certificate, DER or PEM.</param>
    public Task<CertificateAnswer> Register(ActCall call, byte[] encoded, CancellationToken cancel = default) =>
        desk.Once(call, Act.RegisterCertificate, $"certificate {Fingerprint.Of(encoded)}", (run, stop) => Register(run, encoded, stop), cancel);

    /// <param name="fingerprint">As the person read it out: it is compared, not taken from the page.</param>
    public Task<CertificateAnswer> Confirm(ActCall call, Guid certificateId, string fingerprint, CancellationToken cancel = default) =>
        desk.Once(call, Act.ConfirmCertificate, $"certificate {certificateId:D}", async (run, stop) =>
        {
            run.NeedAdministrator(Act.ConfirmCertificate);
            var certificate = await Find(run, certificateId, stop);
            if (!Fingerprint.Same(fingerprint.Replace(":", "", StringComparison.Ordinal).Replace(" ", "", StringComparison.Ordinal), certificate.Fingerprint))
                throw new ActRefused(RefusalReason.HashDiffers, $"The fingerprint {fingerprint} is not that of the registered certificate. Ask the person to read it out again; do not copy it from this page.");
            certificate.ConfirmedById = run.Person.Id;
            certificate.ConfirmedAt = run.Now;
            return Answer(certificate);
        }, cancel);

    /// <summary>Takes a certificate out of use, by its person or an administrator; signatures already issued stay.</summary>
    public Task<CertificateAnswer> Revoke(ActCall call, Guid certificateId, CancellationToken cancel = default) =>
        desk.Once(call, Act.RegisterCertificate, $"revoke certificate {certificateId:D}", async (run, stop) =>
        {
            var certificate = await Find(run, certificateId, stop);
            certificate.RevokedAt ??= run.Now;
            return Answer(certificate);
        }, cancel);

    private static async Task<CertificateAnswer> Register(ActRun run, byte[] encoded, CancellationToken cancel)
    {
        using var read = Read(encoded);
        var fingerprint = Fingerprint.Of(read.RawData);
        var key = Fingerprint.Of(read.PublicKey.ExportSubjectPublicKeyInfo());
        if (await run.Archive.Certificates.AnyAsync(row => row.Fingerprint == fingerprint, cancel))
            throw new ActRefused(RefusalReason.AlreadyDone, "This certificate is registered already.");
        if (await run.Archive.Certificates.AnyAsync(row => row.PublicKeyHash == key && row.PersonId != run.Person.Id, cancel))
            throw new ActRefused(RefusalReason.SameKey, "Another person has registered a certificate with the same key. Each person signs with a key of their own.");
        var certificate = new Certificate
        {
            PersonId = run.Person.Id,
            Subject = read.Subject,
            Fingerprint = fingerprint,
            PublicKeyHash = key,
            Encoded = read.RawData,
            ValidUntil = new DateTimeOffset(read.NotAfter),
            RegisteredAt = run.Now,
        };
        run.Archive.Certificates.Add(certificate);
        return Answer(certificate);
    }

    private static X509Certificate2 Read(byte[] encoded)
    {
        try
        {
            return X509CertificateLoader.LoadCertificate(encoded);
        }
        catch (CryptographicException problem)
        {
            throw new ActRefused(RefusalReason.CertificateUnknown, $"This file is no public certificate ({problem.Message}). Hand in the .cer, .crt or .pem file, never the one with the private key.");
        }
    }

    private static async Task<Certificate> Find(ActRun run, Guid certificateId, CancellationToken cancel) =>
        await run.Scope.Certificates().FirstOrDefaultAsync(row => row.Id == certificateId, cancel) ?? throw new NotFound("certificate");

    private static CertificateAnswer Answer(Certificate certificate) => new(certificate.Id, certificate.Fingerprint, certificate.PublicKeyHash);
}
