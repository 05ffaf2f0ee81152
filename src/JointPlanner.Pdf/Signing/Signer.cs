using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using JointPlanner.Pdf.Reading;
using JointPlanner.Pdf.Verifying;

namespace JointPlanner.Pdf.Signing;

/// <summary>Signs one prepared field of a sheet by one update appended to it.</summary>
/// <remarks>Needs no network (but for a time stamp, where asked for), no clock, no file and no settings of the machine.</remarks>
public static class Signer
{
    private const int RangeWidth = 32; // room for the three numbers of the signed range, of at most ten digits each
    private const int LongestText = 200;

    /// <summary>Signs, or refuses by name.</summary>
    /// <param name="pdf">The file to sign.</param>
    /// <param name="request">Who signs what, where and when.</param>
    /// <param name="cancellation">Stops the work.</param>
    /// <exception cref="SigningRefusedException">Nothing was signed, for the reason it names.</exception>
    public static async Task<SignedFile> SignAsync(byte[] pdf, SignRequest request, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(pdf);
        ArgumentNullException.ThrowIfNull(request);
        CheckTexts(request);
        if (!string.Equals(Convert.ToHexString(SHA256.HashData(pdf)), request.ExpectedSha256, StringComparison.OrdinalIgnoreCase))
            throw new SigningRefusedException(SigningRefusal.OtherBytes, "The file is not the one that was shown for signing: its SHA-256 differs. Load the sheet again.");
        if (!request.Certificate.HasPrivateKey)
            throw new SigningRefusedException(SigningRefusal.NoPrivateKey, "The certificate comes without its private key, so it cannot sign.");
        if (CertificateRules.Fault(request.Certificate, request.Instant) is { } fault)
            throw new SigningRefusedException(fault.Refusal, fault.Text);
        UpdateWriter update;
        int signature, room;
        try
        {
            var file = PdfRevisions.Open(pdf, null, cancellation);
            var field = FindField(file, request);
            update = new UpdateWriter(file);
            room = request.ReservedBytes ?? SignatureMaker.RoomNeeded(request);
            signature = FillField(update, file, field, request, room);
        }
        catch (PdfReadException e)
        {
            throw new SigningRefusedException(SigningRefusal.NotReadable, e.Message, e);
        }
        var (bytes, start) = update.Finish(signature);
        await FillHoleAsync(bytes, start, room, request, cancellation);
        return new SignedFile(bytes, pdf.Length, Convert.ToHexString(SHA256.HashData(bytes)));
    }

    private static void CheckTexts(SignRequest request)
    {
        foreach (var (name, text) in new[] { ("name", request.SignerName), ("reason", request.Reason), ("place", request.Place) })
            if (text.Length > LongestText || PlainText.Of(text) != text.Normalize(NormalizationForm.FormC))
                throw new SigningRefusedException(SigningRefusal.TextNotWritable, string.Create(CultureInfo.InvariantCulture, $"The signature's {name} is longer than {LongestText} characters, is not in composed form (NFC), or holds control or invisible characters."));
        if (request.SignerName.Length == 0)
            throw new SigningRefusedException(SigningRefusal.TextNotWritable, "The signer's name is empty.");
    }

    private static FormField FindField(PdfRevisions file, SignRequest request)
    {
        var view = file.Last;
        var fields = FormFields.In(view);
        var named = fields.Where(known => known.Name == request.Field).ToList();
        if (named.Count != 1 || view.Entry(named[0].Number) is not { Kind: CrossReferenceKind.InFile } || view.Array(named[0].Dictionary["Rect"]) is not { Items.Count: 4 })
            throw new SigningRefusedException(SigningRefusal.NoSuchField, fields.Count == 0
                ? "The file has no prepared signature field: it is not a sheet made by this program."
                : $"The file has no prepared signature field \"{request.Field}\"; it has {PlainText.List([.. fields.Select(known => PlainText.Of(known.Name))])}.");
        if (named[0].IsFilled(view))
            throw new SigningRefusedException(SigningRefusal.FieldAlreadySigned, $"The field {request.Field} is signed already.");
        var filled = fields.Where(known => known.IsFilled(view)).ToList();
        if (request.Certify && filled.Count > 0)
            throw new SigningRefusedException(SigningRefusal.CertificationNotFirst, "The file is signed already; only the first signature can certify it.");
        foreach (var other in filled)
        {
            var (_, value, why) = SignatureCheck.Value(file, view, other);
            if (value is null)
                throw new SigningRefusedException(SigningRefusal.NotReadable, $"The signature in the field {PlainText.Of(other.Name)} is not whole: {why}. Do not sign this file.");
            if (CertificateRules.SameKey(value.Certificate, request.Certificate))
                throw new SigningRefusedException(SigningRefusal.KeyUsedInOtherField, $"The field {PlainText.Of(other.Name)} is signed with the same key; designer and checker must be two persons with two keys.");
        }
        return named[0];
    }

    private static int FillField(UpdateWriter update, PdfRevisions file, FormField field, SignRequest request, int room)
    {
        var view = file.Last;
        string certification = request.Certify ? "/Reference[<</Type/SigRef/TransformMethod/DocMDP/TransformParams<</Type/TransformParams/P 2/V/1.2>>>>]" : "";
        // The handler's name is the one that ISO 32000-2, 12.8.1 gives as example and that readers know; it says nothing of who wrote the file.
        int signature = update.Add(
            $"<</Type/Sig/Filter/Adobe.PPKLite/SubFilter/ETSI.CAdES.detached/ByteRange[0 {new string(' ', RangeWidth)}]/Contents<{new string('0', 2 * room)}>"
            + $"/M{ValueText.Of(ValueText.Date(request.Instant))}/Name{ValueText.Of(ValueText.Text(request.SignerName))}"
            + (request.Reason.Length == 0 ? "" : $"/Reason{ValueText.Of(ValueText.Text(request.Reason))}")
            + (request.Place.Length == 0 ? "" : $"/Location{ValueText.Of(ValueText.Text(request.Place))}") + certification + ">>");
        var filled = new PdfDictionary(new(field.Dictionary.Entries)
        {
            ["V"] = new PdfReference(signature, 0),
            ["AP"] = new PdfDictionary(new() { ["N"] = new PdfReference(SignatureAppearance.Add(update, view, field, request), 0) }),
        });
        update.Set(field.Number, ValueText.Of(filled), view.Object(field.Number)!.Generation);
        FlagForm(update, view, request.Certify ? signature : null);
        return signature;
    }

    /// <summary>Says in the form that the file is signed and only grows (SigFlags 3), and in the catalog that it is certified.</summary>
    private static void FlagForm(UpdateWriter update, RevisionView view, int? certifying)
    {
        var catalog = new PdfDictionary(new(view.Catalog.Entries));
        bool catalogChanges = certifying is not null;
        if (certifying is { } signature) catalog.Entries["Perms"] = new PdfDictionary(new() { ["DocMDP"] = new PdfReference(signature, 0) });
        var form = FormFields.Form(view)!;
        if (view.Whole(form["SigFlags"]) != 3)
        {
            var flagged = new PdfDictionary(new(form.Entries) { ["SigFlags"] = ValueText.Number(3) });
            if (view.Catalog["AcroForm"] is PdfReference reference) update.Set(reference.Number, ValueText.Of(flagged), reference.Generation);
            else
            {
                catalog.Entries["AcroForm"] = flagged;
                catalogChanges = true;
            }
        }
        if (catalogChanges) update.Set(view.Root.Number, ValueText.Of(catalog), view.Root.Generation);
    }

    private static async Task FillHoleAsync(byte[] bytes, int start, int room, SignRequest request, CancellationToken cancellation)
    {
        int hole = start + bytes.AsSpan(start).IndexOf("/Contents<"u8) + 9, after = hole + 2 * room + 2;
        int range = start + bytes.AsSpan(start).IndexOf("/ByteRange[0 "u8) + 13;
        Encoding.ASCII.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{hole} {after} {bytes.Length - after}").PadRight(RangeWidth)).CopyTo(bytes, range);
        var value = await SignatureMaker.MakeAsync([.. bytes.AsSpan(0, hole), .. bytes.AsSpan(after)], request, cancellation);
        if (value.Length > room)
            throw new SigningRefusedException(SigningRefusal.HoleTooSmall, string.Create(CultureInfo.InvariantCulture, $"The signature needs {value.Length} bytes, but {room} are reserved for it. Nothing was signed."));
        Encoding.ASCII.GetBytes(Convert.ToHexString(value)).CopyTo(bytes, hole + 1);
    }
}
