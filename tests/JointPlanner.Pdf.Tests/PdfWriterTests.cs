using System.Globalization;
using System.Security.Cryptography;
using System.Text.RegularExpressions;
using UglyToad.PdfPig;

namespace JointPlanner.Pdf.Tests;

/// <summary>Whole sheets, read by programs that are not ours.</summary>
public partial class PdfWriterTests
{
    private static readonly byte[] Sheet = PdfWriter.Write(SampleSheet.Make()).Bytes;
    private static readonly byte[] LongSheet = PdfWriter.Write(SampleSheet.Make(settingRows: 130)).Bytes;

    [Fact]
    public void A_sheet_is_clean_for_a_strict_reader()
    {
        foreach (var pdf in new[] { Sheet, LongSheet, PdfWriter.Write(SampleSheet.Make(PaperSize.Letter, SampleSheet.Hostile)).Bytes })
        {
            var report = Tool.Output(pdf, "qpdf", "--check");
            Assert.Contains("No syntax or stream encoding errors found", report, StringComparison.Ordinal);
            Assert.DoesNotContain("WARNING", report, StringComparison.OrdinalIgnoreCase);
        }
    }

    [Fact]
    public void A_strict_reader_finds_the_damage_when_there_is_some()
    {
        var broken = Sheet.ToArray();
        var at = broken.AsSpan().LastIndexOf("startxref"u8);
        broken[at + 10] = (byte)(broken[at + 10] == '9' ? '1' : '9');
        Assert.NotEqual(0, Tool.With(broken, path => Tool.Run("qpdf", "--check", path)).Code);
    }

    [Fact]
    public void All_fonts_are_embedded_as_subsets_with_their_way_back_to_Unicode()
    {
        var fonts = Tool.Output(Sheet, "pdffonts").Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(2).ToList();
        Assert.True(fonts.Count >= 3);
        Assert.All(fonts, f => Assert.Matches(@"^[A-Z]{6}\+\S+\s+CID TrueType\s+Identity-H\s+yes yes yes", f));
        Assert.Contains(fonts, f => f.Contains("+IBMPlexSans-SemiBold", StringComparison.Ordinal));
    }

    [Fact]
    public void The_structure_names_headings_tables_figures_formulas_and_fields()
    {
        var structure = Tool.Output(Sheet, "pdfinfo", "-struct-text");
        foreach (var tag in new[] { "Document", "H1 ", "H2 ", "P ", "Table", "Caption", "TR", "TH ", "TD ", "Figure", "Formula", "Form" })
            Assert.Contains(tag.Trim(), structure, StringComparison.Ordinal);
        Assert.Matches(@"H1[^\n]*\n\s*""1 *Basis""", structure);
        Assert.Contains("Tagged:          yes", Tool.Output(Sheet, "pdfinfo"), StringComparison.Ordinal);
        // Page furniture is not read out.
        Assert.DoesNotContain("Page 1 of", structure, StringComparison.Ordinal);
        Assert.DoesNotContain("continued", Tool.Output(LongSheet, "pdfinfo", "-struct-text"), StringComparison.Ordinal);
    }

    [Fact]
    public void Formulas_and_figures_have_words_and_a_box_for_whoever_cannot_see_them()
    {
        var structure = Tool.Output(Sheet, "pdfinfo", "-struct");
        var objects = Tool.Output(Sheet, "qpdf", "--json=2");
        Assert.Contains("\"/Alt\": \"u:u_br = (F_br · h^3)/(3 · E · I) = (900 · 8.2^3)/(3 · 34 · 1.84) = 2.64 mm\"", objects, StringComparison.Ordinal);
        Assert.Contains("\"/Alt\": \"u:Elevation. Deck of three spans", objects, StringComparison.Ordinal);
        Assert.Equal(5, Regex.Count(structure, "/BBox "));
        Assert.Contains("/Scope /Row", structure, StringComparison.Ordinal);
    }

    [Fact]
    public void The_attachments_come_back_byte_for_byte()
    {
        Tool.With(Sheet, path =>
        {
            var folder = Path.GetDirectoryName(path)!;
            Assert.Equal(0, Tool.Run("pdfdetach", "-saveall", "-o", folder, path).Code);
            foreach (var (name, bytes) in new[] { ("calculation.json", SampleSheet.Package), ("results.json", SampleSheet.Results) })
                Assert.Equal(SHA256.HashData(bytes), SHA256.HashData(File.ReadAllBytes(Path.Combine(folder, name))));
            return true;
        });
        var text = Tool.Output(Sheet, "pdftotext");
        Assert.Contains(Convert.ToHexStringLower(SHA256.HashData(SampleSheet.Package)), text, StringComparison.Ordinal);
    }

    [Fact]
    public void Text_comes_out_in_reading_order()
    {
        var text = Tool.Output(Sheet, "pdftotext", "-layout");
        string[] inOrder =
        [
            "Movements at joints and bearings", "calculation.json, SHA-256", "Figure 1.", "Movements are counted from", "Caution. This calculation assists",
            "Joint at abutment A2", "u_T = α · ΔT_(N,con) · L", "= 31.5 mm", "Counting table", "Sum, strength", "Setting table", "Signatures",
        ];
        var at = inOrder.Select(t => text.IndexOf(t, StringComparison.Ordinal)).ToList();
        Assert.All(at, a => Assert.True(a >= 0));
        Assert.Equal(at.Order(), at);
    }

    [Fact]
    public void A_formula_is_copied_as_one_line_however_it_is_set()
    {
        var text = Tool.Output(Sheet, "pdftotext", "-layout");
        Assert.Matches(@"(?m)^\s*u_br = \(F_br · h\^3\)/\(3 · E · I\)\s*$", text);
        Assert.Matches(@"(?m)^\s*u_res = √\(u_x\^2 \+ \(\(u_y \+ e_0\)/\(cos θ\)\)\^2\) ≤ u_R\s*$", text);
    }

    [Fact]
    public void The_watermark_stands_on_every_page_and_mixes_into_no_text()
    {
        var pages = Tool.Output(LongSheet, "pdftotext", "-layout").Split('\f', StringSplitOptions.RemoveEmptyEntries);
        Assert.All(pages, p => Assert.Single(Regex.Matches(p, "DEMONSTRATION, not for construction")));
    }

    [Fact]
    public void Another_reader_finds_the_same_pages_words_and_outline()
    {
        using var pdf = PdfDocument.Open(LongSheet);
        Assert.Equal(PdfWriter.Write(SampleSheet.Make(settingRows: 130)).PageCount, pdf.NumberOfPages);
        var words = pdf.GetPages().SelectMany(p => p.GetWords()).Select(w => w.Text).ToHashSet();
        Assert.Superset(new HashSet<string> { "Ängsholm", "designer", "bearings", "temperature" }, words);
        Assert.True(pdf.TryGetBookmarks(out var outline));
        Assert.Equal(["1 Basis", "2 Movements", "3 Setting table", "4 Signatures"], outline.Roots.Select(r => r.Title));
        Assert.Equal(["2.1 Joint at abutment A2", "2.2 Counting table"], outline.Roots[1].Children.Select(c => c.Title));
        Assert.True(pdf.Advanced.TryGetEmbeddedFiles(out var files));
        Assert.Equal(2, files.Count);
    }

    [Fact]
    public void Nothing_is_painted_outside_the_margins_of_the_paper()
    {
        using var pdf = PdfDocument.Open(PdfWriter.Write(SampleSheet.Make(PaperSize.Letter, new string('W', 200))).Bytes);
        foreach (var page in pdf.GetPages())
        {
            Assert.Equal((612, 792), (page.Width, page.Height));
            // The watermark runs from corner to corner; everything else keeps the side margins.
            Assert.All(page.Letters.Where(l => l.PointSize < 30), l => Assert.InRange(l.BoundingBox.Right, 60, 612 - 49));
        }
    }

    [Fact]
    public void A_table_over_three_pages_repeats_its_head_on_each()
    {
        var pages = Tool.Output(LongSheet, "pdftotext", "-layout").Split('\f', StringSplitOptions.RemoveEmptyEntries);
        var withRows = pages.Where(p => p.Contains("Deck temperature (°C)", StringComparison.Ordinal)).ToList();
        Assert.True(withRows.Count >= 3);
        Assert.DoesNotContain("(continued)", withRows[0], StringComparison.Ordinal);
        Assert.All(withRows.Skip(1), p => Assert.Contains("Table 2. Opening to set at joint A2 (continued)", p, StringComparison.Ordinal));
        var temperatures = Regex.Matches(string.Concat(withRows), @"(?m)^ +([−\d]+) +\d+\.\d +\d+\.\d +\d+\.\d").Select(m => m.Groups[1].Value).ToList();
        Assert.Equal(Enumerable.Range(-20, 130).Select(t => t.ToString(CultureInfo.InvariantCulture).Replace('-', '−')), temperatures.Take(130));
    }

    [Fact]
    public void Each_page_says_which_of_how_many_it_is()
    {
        var pages = Tool.Output(LongSheet, "pdftotext", "-layout").Split('\f', StringSplitOptions.RemoveEmptyEntries);
        for (var i = 0; i < pages.Length; i++) Assert.Contains($"Page {i + 1} of {pages.Length}", pages[i], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("en-US")]
    [InlineData("de-DE")]
    [InlineData("ar-SA")]
    [InlineData("fa-IR")]
    [InlineData("tr-TR")]
    public void The_bytes_are_the_same_in_every_culture(string culture)
    {
        var was = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(Sheet, PdfWriter.Write(SampleSheet.Make()).Bytes);
        }
        finally
        {
            CultureInfo.CurrentCulture = was;
        }
    }

    [Fact]
    public void The_bytes_are_the_same_on_eight_threads_at_once()
    {
        var all = new byte[8][];
        var threads = Enumerable.Range(0, 8).Select(i => new Thread(() => all[i] = PdfWriter.Write(SampleSheet.Make()).Bytes)).ToList();
        threads.ForEach(t => t.Start());
        threads.ForEach(t => t.Join());
        Assert.All(all, pdf => Assert.Equal(Sheet, pdf));
    }

    [Fact]
    public void Another_content_gives_another_file_identifier()
    {
        static string Identifier(byte[] pdf) => IdentifierPattern().Match(Tool.Output(pdf, "qpdf", "--show-object=trailer")).Groups[1].Value;
        Assert.NotEmpty(Identifier(Sheet));
        Assert.NotEqual(Identifier(Sheet), Identifier(LongSheet));
    }

    [Fact]
    public void Words_from_people_stay_words()
    {
        var result = PdfWriter.Write(SampleSheet.Make(structure: SampleSheet.Hostile));
        Assert.Contains("</script><svg onload=\"x\">'&[U+202E]\\(end)", Tool.Output(result.Bytes, "pdftotext"), StringComparison.Ordinal);
        Assert.Contains("[U+202E]", Tool.Output(result.Bytes, "pdfinfo"), StringComparison.Ordinal);
        var metadata = Tool.Output(result.Bytes, "pdfinfo", "-meta");
        Assert.Contains("&lt;/script&gt;&lt;svg onload=", metadata, StringComparison.Ordinal);
        var raw = Tool.Output(result.Bytes, "pdfinfo", "-js");
        Assert.True(string.IsNullOrWhiteSpace(raw));
    }

    [Fact]
    public void A_character_that_no_face_has_is_spelt_out_and_reported()
    {
        var document = SampleSheet.Make() with { Watermark = null, Blocks = [new Paragraph("Kanji 橋, Arabic جسر, Greek γέφυρα, arrows → ⇄, tick ✓")] };
        var result = PdfWriter.Write(document);
        Assert.Equal([0x062C, 0x0631, 0x0633, 0x6A4B], result.SpeltOut);
        Assert.Contains("Kanji [U+6A4B], Arabic [U+062C][U+0633][U+0631], Greek γέφυρα, arrows → ⇄, tick ✓", Tool.Output(result.Bytes, "pdftotext"), StringComparison.Ordinal);
    }

    [Fact]
    public void Any_text_at_all_gives_a_clean_file()
    {
        var random = new Random(20260302);
        List<Block> blocks = [];
        for (var i = 0; i < 60; i++)
        {
            var text = new string([.. Enumerable.Range(0, random.Next(0, 400)).Select(_ => (char)random.Next(0, random.Next(2) == 0 ? 0x180 : 0x10000))]);
            blocks.Add(i % 3 == 0 ? new Heading(1 + (i % 2), text) : i % 3 == 1 ? new Paragraph(text) : Table.Of(text, [new(text), new("n", Align.Decimal)], [[text, text]]));
        }
        Assert.Contains("No syntax or stream encoding errors found", Tool.Output(PdfWriter.Write(SampleSheet.Make() with { Blocks = blocks }).Bytes, "qpdf", "--check"), StringComparison.Ordinal);
    }

    [Fact]
    public void An_empty_document_still_has_a_page()
    {
        var result = PdfWriter.Write(SampleSheet.Make() with { Blocks = [], Attachments = [], Watermark = null });
        Assert.Equal(1, result.PageCount);
        Assert.Contains("No syntax or stream encoding errors found", Tool.Output(result.Bytes, "qpdf", "--check"), StringComparison.Ordinal);
    }

    [GeneratedRegex(@"/ID \[ (<[^>]+>)")]
    private static partial Regex IdentifierPattern();
}
