using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;

namespace ClubBench.Printing.Layout;

/// <summary>
/// Adds an outline to a finished PDF by an incremental update (ISO 32000-1, 7.5.6 and 12.3.3): new objects, a new catalog, a new
/// cross-reference section and trailer behind the file. The library that writes the PDF has no outline of its own.
/// </summary>
internal static class PdfBookmarks
{
    private static readonly Regex s_size = Pattern(@"/Size (?<n>\d+)");
    private static readonly Regex s_root = Pattern(@"/Root (?<n>\d+) 0 R");
    private static readonly Regex s_startXref = Pattern(@"startxref\s+(?<n>\d+)");
    private static readonly Regex s_pages = Pattern(@"/Pages (?<n>\d+) 0 R");
    private static readonly Regex s_kids = Pattern(@"/Kids \[[^\]]*\]");
    private static readonly Regex s_reference = Pattern(@"(?<n>\d+) 0 R");
    private static readonly Regex s_infoOrId = Pattern(@"/Info \d+ 0 R|/ID \[[^\]]*\]");

    /// <summary>The file with one bookmark per entry; unchanged without entries.</summary>
    /// <param name="pdf">A closed file with a classic cross-reference table and a flat or nested page tree.</param>
    /// <param name="bookmarks">Titles and zero-based pages.</param>
    public static byte[] Append(byte[] pdf, IReadOnlyList<(string Title, int Page)> bookmarks)
    {
        if (bookmarks.Count == 0) return pdf;
        var text = Encoding.Latin1.GetString(pdf);
        var trailer = text[text.LastIndexOf("trailer", StringComparison.Ordinal)..];
        var size = Number(s_size.Match(trailer));
        var catalog = Number(s_root.Match(trailer));
        var previous = Number(s_startXref.Match(trailer));
        var pages = new List<int>();
        Walk(text, Number(s_pages.Match(Object(text, catalog))), pages);
        var outline = size;

        var objects = new List<(int Id, string Body)> { (catalog, WithOutline(Object(text, catalog), outline)) };
        objects.Add((outline, $"<</Type /Outlines /First {outline + 1} 0 R /Last {outline + bookmarks.Count} 0 R /Count {bookmarks.Count}>>"));
        for (var i = 0; i < bookmarks.Count; i++)
            objects.Add((outline + 1 + i, Item(bookmarks[i].Title, pages[bookmarks[i].Page], outline, i, bookmarks.Count)));

        return [.. pdf, .. Encoding.Latin1.GetBytes(Update(objects, pdf.Length, size + bookmarks.Count + 1, catalog, previous, Extra(trailer)))];
    }

    private static string Item(string title, int page, int outline, int index, int count)
    {
        var neighbours = (index > 0 ? $" /Prev {outline + index} 0 R" : "") + (index < count - 1 ? $" /Next {outline + index + 2} 0 R" : "");
        return $"<</Title <FEFF{Convert.ToHexString(Encoding.BigEndianUnicode.GetBytes(title))}> /Parent {outline} 0 R{neighbours} /Dest [{page} 0 R /Fit]>>";
    }

    private static string WithOutline(string catalog, int outline) =>
        catalog[..catalog.LastIndexOf(">>", StringComparison.Ordinal)] + $"\n/Outlines {outline} 0 R\n/PageMode /UseOutlines>>";

    private static string Update(List<(int Id, string Body)> objects, int offset, int size, int catalog, int previous, string extra)
    {
        var update = new StringBuilder("\n");
        var entries = new SortedDictionary<int, int>();
        foreach (var (id, body) in objects)
        {
            entries[id] = offset + update.Length;
            update.Append(CultureInfo.InvariantCulture, $"{id} 0 obj\n{body}\nendobj\n");
        }
        var xref = offset + update.Length;
        update.Append("xref\n");
        foreach (var (id, at) in entries) update.Append(CultureInfo.InvariantCulture, $"{id} 1\n{at:D10} 00000 n \n");
        update.Append(CultureInfo.InvariantCulture, $"trailer\n<</Size {size}\n/Root {catalog} 0 R\n{extra}/Prev {previous}>>\nstartxref\n{xref}\n%%EOF\n");
        return update.ToString();
    }

    /// <summary>Collects the object numbers of the pages in reading order: the tree is walked, for nothing says that the writer numbers them so.</summary>
    private static void Walk(string text, int node, List<int> pages)
    {
        var body = Object(text, node);
        var kids = s_kids.Match(body);
        if (!kids.Success) pages.Add(node);
        else
            foreach (Match kid in s_reference.Matches(kids.Value)) Walk(text, Number(kid), pages);
    }

    private static string Object(string text, int id)
    {
        var start = text.IndexOf($"\n{id} 0 obj", StringComparison.Ordinal) + 1;
        var from = text.IndexOf("obj", start, StringComparison.Ordinal) + 3;
        return text[from..text.IndexOf("endobj", from, StringComparison.Ordinal)].Trim();
    }

    private static string Extra(string trailer) =>
        string.Concat(s_infoOrId.Matches(trailer).Select(m => m.Value + "\n"));

    private static int Number(Match match) => int.Parse(match.Groups["n"].Value, CultureInfo.InvariantCulture);

    private static Regex Pattern(string pattern) => new(pattern, RegexOptions.NonBacktracking | RegexOptions.ExplicitCapture | RegexOptions.CultureInvariant);
}
