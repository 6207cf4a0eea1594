using System.Text.RegularExpressions;
using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;
using ClubBench.Printing.Tests.Samples;
using UglyToad.PdfPig;
using UglyToad.PdfPig.DocumentLayoutAnalysis.TextExtractor;

namespace ClubBench.Printing.Tests.Sheets;

public class CardSetTests
{
    private static readonly Lazy<byte[]> s_card = new(() => CardSet.Pdf(SampleCards.Card));

    [Theory]
    [InlineData("A5")]
    [InlineData("Low-pass")]
    [InlineData("Quern-30, board issue C")]
    [InlineData("30 m → 20 m")]
    [InlineData("Q05")]
    [InlineData("tag: Hana")]
    [InlineData("A5 card 3")]
    [InlineData("plan 4")]
    [InlineData("2026-12-01")]
    [InlineData("page 1 of 1")]
    [InlineData("µH")]
    [InlineData("1 MΩ")]
    [InlineData("C15–C18")]
    [InlineData("T37-6")]
    [InlineData("mentor, not the builder")]
    public void Pdf_Card_HoldsSearchableText(string text) => Assert.Contains(text, TextOf(s_card.Value), StringComparison.Ordinal);

    [Fact]
    public void Pdf_DegreeAndMinus_AreFoundAgain()
    {
        var context = SampleCards.Context with { ClubName = "at −5 °C, 10 µF, 5 Ω → ≤ ≥ ± × Łódź Grün" };

        Assert.Contains(context.ClubName, TextOf(CardSet.Pdf(new PrintedCard(SampleCards.LowPass, context))), StringComparison.Ordinal);
    }

    [Fact]
    public void Pdf_Card_ShowsEveryFigure()
    {
        var text = TextOf(s_card.Value);

        var figures = CardFigures.Of(SampleCards.LowPass);

        Assert.True(figures.Count >= 20);
        Assert.All(figures, f => Assert.Contains(Plain(f.Text), text, StringComparison.Ordinal));
    }

    /// <summary>The drawing names parts as well; without it the figures must stand in the lists beside the boxes.</summary>
    [Theory]
    [InlineData("20 m", true)]
    [InlineData("20 m", false)]
    [InlineData("40 m", false)]
    public void Pdf_EveryCardOfAPlan_ShowsItsFiguresOnItsOwnPage(string band, bool drawn)
    {
        var cards = SamplePlans.QuernOn(band).Stages.Select(s => drawn ? s.Card : s.Card with { Drawing = Schematic.Empty }).ToList();

        using var pdf = PdfDocument.Open(CardSet.Pdf([.. cards.Select(c => new PrintedCard(c, SampleCards.Context))]));

        Assert.Equal((12, 12), (cards.Count, pdf.NumberOfPages));
        foreach (var (card, page) in cards.Zip(pdf.GetPages().Select(OneLine)))
        {
            Assert.Contains($"{card.Stage} card", page, StringComparison.Ordinal);
            Assert.NotEmpty(CardFigures.Of(card));
            Assert.All(CardFigures.Of(card), f => Assert.True(Stands(f.Text, page), $"{card.Stage} {f.Of}: {f.Text} is not in the text of its page"));
        }

        Assert.True(cards.Sum(c => CardFigures.Of(c).Count) >= 80);
    }

    [Theory]
    [InlineData("15 t", true)]
    [InlineData("5 t", false)]
    [InlineData("0.714 µH", true)]
    [InlineData("0.71", false)]
    public void Stands_PartOfAnotherFigure_IsNotTheFigure(string figure, bool stands) => Assert.Equal(stands, Stands(figure, "L4 15 t of wire 0.714 µH"));

    [Fact]
    public void Pdf_SameCardTwice_GivesSameBytes() => Assert.Equal(s_card.Value, CardSet.Pdf(SampleCards.Card));

    [Fact]
    public void Pdf_OtherDate_GivesOtherBytes() =>
        Assert.NotEqual(s_card.Value, CardSet.Pdf(new PrintedCard(SampleCards.LowPass, SampleCards.Context with { Date = new DateOnly(2026, 12, 2) })));

    [Fact]
    public void Pdf_Card_HasTitleAndAuthor()
    {
        using var pdf = PdfDocument.Open(s_card.Value);

        Assert.Equal("Quern-30: A5 Low-pass", pdf.Information.Title);
        Assert.Equal("Marrowby Radio Constructors", pdf.Information.Author);
    }

    [Fact]
    public void Pdf_Set_HasOneBookmarkPerCardOnItsFirstPage()
    {
        var longCard = new PrintedCard(SampleCards.LowPassWith(9), SampleCards.Context);
        var kept = new PrintedCard(SampleCards.Kept with { Stage = "A6" }, SampleCards.Context);

        using var pdf = PdfDocument.Open(CardSet.Pdf([longCard, kept]));

        Assert.Equal(3, pdf.NumberOfPages);
        Assert.True(pdf.TryGetBookmarks(out var bookmarks));
        var nodes = bookmarks.GetNodes().OfType<UglyToad.PdfPig.Outline.DocumentBookmarkNode>().ToList();
        Assert.Equal(["A5 Low-pass", "A6 Low-pass"], nodes.Select(n => n.Title));
        Assert.Equal([1, 3], nodes.Select(n => n.PageNumber));
    }

    [Fact]
    public void Pdf_SetOfTen_EmbedsTheTypefaceOnce()
    {
        var ten = CardSet.Pdf([.. Enumerable.Repeat(SampleCards.Card, 10)]);

        Assert.True(ten.Length < 3 * s_card.Value.Length, $"one card {s_card.Value.Length}, ten cards {ten.Length}");
    }

    [Theory]
    [InlineData("A4", 595.28, 841.89)]
    [InlineData("Letter", 612, 792)]
    public void Pdf_Paper_HasItsSize(string name, double width, double height)
    {
        var paper = name == "A4" ? PaperSize.A4 : PaperSize.Letter;

        using var pdf = PdfDocument.Open(CardSet.Pdf(new PrintedCard(SampleCards.LowPass, SampleCards.Context with { Paper = paper })));

        Assert.Equal(width, pdf.GetPage(1).Width, 0.5);
        Assert.Equal(height, pdf.GetPage(1).Height, 0.5);
    }

    [Fact]
    public void Pdf_NoCards_Throws() => Assert.Throws<ArgumentException>(() => CardSet.Pdf([]));

    private static string TextOf(byte[] pdf)
    {
        using var document = PdfDocument.Open(pdf);
        return Plain(string.Join('\n', document.GetPages().Select(p => ContentOrderTextExtractor.GetText(p))));
    }

    private static string OneLine(UglyToad.PdfPig.Content.Page page) => Plain(ContentOrderTextExtractor.GetText(page)).ReplaceLineEndings(" ");

    /// <summary>Whether a figure stands in a text by itself, not as a piece of a longer number or word.</summary>
    private static bool Stands(string figure, string text) =>
        Regex.IsMatch(text, $@"(?<![\w.,]){Regex.Escape(Plain(figure))}(?![\w]|[.,]\d)", RegexOptions.ExplicitCapture, TimeSpan.FromSeconds(1));

    /// <summary>A space that does not break is a space to whoever searches.</summary>
    private static string Plain(string text) => text.Replace('\u00A0', ' ');
}
