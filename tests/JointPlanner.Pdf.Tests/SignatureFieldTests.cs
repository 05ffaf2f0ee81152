using System.Text.RegularExpressions;

namespace JointPlanner.Pdf.Tests;

/// <summary>What a signer finds, as promised at <see cref="SignatureField"/>.</summary>
public class SignatureFieldTests
{
    private static readonly byte[] Sheet = PdfWriter.Write(SampleSheet.Make()).Bytes;

    [Fact]
    public void Fields_exist_empty_with_a_place_on_a_page()
    {
        using var pdf = UglyToad.PdfPig.PdfDocument.Open(Sheet);
        Assert.True(pdf.TryGetForm(out var form));
        Assert.Equal(["designer", "checker"], form.Fields.Select(f => f.Information.PartialName));
        Assert.All(form.Fields, f =>
        {
            Assert.Equal(pdf.NumberOfPages, f.PageNumber);
            Assert.True(f.Bounds is { Width: > 150, Height: > 35 });
        });
        Assert.DoesNotContain("/V ", Tool.Output(Sheet, "qpdf", "--show-object=" + FieldIds()[0]), StringComparison.Ordinal);
    }

    [Fact]
    public void What_an_update_rewrites_is_in_no_object_stream()
    {
        var references = Tool.Output(Sheet, "qpdf", "--show-xref");
        var root = Regex.Match(Tool.Output(Sheet, "qpdf", "--show-object=trailer"), @"/Root (\d+) 0 R").Groups[1].Value;
        var catalog = Tool.Output(Sheet, "qpdf", "--show-object=" + root);
        var form = Regex.Match(catalog, @"/AcroForm (\d+) 0 R").Groups[1].Value;
        var pages = Regex.Match(catalog, @"/Pages (\d+) 0 R").Groups[1].Value;
        var kids = Regex.Matches(Tool.Output(Sheet, "qpdf", "--show-object=" + pages), @"(\d+) 0 R").Select(m => m.Groups[1].Value);
        string[] all = [root, form, pages, .. kids, .. FieldIds()];
        Assert.True(all.Length >= 8);
        Assert.All(all, id => Assert.Matches($@"(?m)^{id}/0: uncompressed", references));
        Assert.Matches(@"(?m): compressed", references);
        Assert.Contains("/SigFlags 3", Tool.Output(Sheet, "qpdf", "--show-object=" + form), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("Designer")]
    [InlineData("a b")]
    [InlineData("a.b")]
    public void A_field_without_a_plain_name_is_refused(string name) =>
        Assert.Throws<ArgumentException>(() => PdfWriter.Write(SampleSheet.Make() with { Blocks = [new SignatureFields([new(name, "Designer")])] }));

    [Fact]
    public void Two_fields_of_one_name_are_refused() =>
        Assert.Throws<ArgumentException>(() => PdfWriter.Write(SampleSheet.Make() with { Blocks = [new SignatureFields([new("a", "A"), new("a", "B")])] }));

    [Fact]
    public void How_many_fields_there_are_is_up_to_the_document()
    {
        var fields = Enumerable.Range(1, 5).Select(i => new SignatureField("signer-" + i, "Signer " + i)).ToList();
        using var pdf = UglyToad.PdfPig.PdfDocument.Open(PdfWriter.Write(SampleSheet.Make() with { Blocks = [new SignatureFields(fields)] }).Bytes);
        Assert.True(pdf.TryGetForm(out var form));
        Assert.Equal(5, form.Fields.Count);
    }

    private static List<string> FieldIds()
    {
        var text = System.Text.Encoding.Latin1.GetString(Sheet);
        return [.. Regex.Matches(text, @"(\d+) 0 obj\n<</Type/Annot/Subtype/Widget/FT/Sig/T\([a-z]+\)").Select(m => m.Groups[1].Value)];
    }
}
