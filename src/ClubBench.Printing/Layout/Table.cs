namespace ClubBench.Printing.Layout;

/// <summary>A column.</summary>
/// <param name="Title">Heading; may be empty.</param>
/// <param name="Share">Share of the width.</param>
/// <param name="Side">Side its texts stand on.</param>
internal sealed record Column(string Title, float Share, TextSide Side = TextSide.Start);

/// <summary>What a cell draws.</summary>
internal interface ICell
{
    /// <summary>Height at a width.</summary>
    float Height(ICardSurface surface, float width);

    /// <summary>Draws into the cell, on the column's side.</summary>
    void Draw(ICardSurface surface, Area area, TextSide side);
}

/// <summary>Rows under column headings, a thin rule below each row. It can be cut between rows; the headings then stand again.</summary>
internal sealed record Table(IReadOnlyList<Column> Columns, IReadOnlyList<IReadOnlyList<ICell>> Rows) : IBlock
{
    private const float CellGap = 6;
    private const float RowGap = 1.2f;
    private static readonly TextStyle s_title = TextStyle.Strong;

    private bool HasTitles => Columns.Any(c => c.Title.Length > 0);

    private float TitleHeight => HasTitles ? s_title.LineHeight + 1 : 0;

    public float Height(ICardSurface surface, float width) => TitleHeight + Rows.Sum(r => RowHeight(surface, r, width));

    public void Draw(ICardSurface surface, Area area)
    {
        var edges = Edges(area);
        for (var i = 0; i < Columns.Count && HasTitles; i++)
            new TextCell(Columns[i].Title, s_title).Draw(surface, Cell(edges, i, area.Y, TitleHeight), Columns[i].Side);
        var y = area.Y + TitleHeight;
        if (HasTitles) surface.Line(area.X, y, area.Right, y, 0.5f, Shade.Grey);
        foreach (var row in Rows)
        {
            var height = RowHeight(surface, row, area.Width);
            for (var i = 0; i < row.Count; i++) row[i].Draw(surface, Cell(edges, i, y, height), Columns[i].Side);
            y += height;
            surface.Line(area.X, y, area.Right, y, 0.5f, Shade.Grey);
        }
    }

    public (IBlock Head, IBlock Tail)? CutAt(ICardSurface surface, float width, float room)
    {
        var used = TitleHeight;
        var fits = 0;
        while (fits < Rows.Count && used + RowHeight(surface, Rows[fits], width) <= room) used += RowHeight(surface, Rows[fits++], width);
        return fits == 0 || fits == Rows.Count ? null : (this with { Rows = [.. Rows.Take(fits)] }, this with { Rows = [.. Rows.Skip(fits)] });
    }

    private static Area Cell(float[] edges, int column, float y, float height) =>
        new(edges[column], y, edges[column + 1] - edges[column] - (column == edges.Length - 2 ? 0 : CellGap), height);

    private float[] Edges(Area area)
    {
        var total = Columns.Sum(c => c.Share);
        var edges = new float[Columns.Count + 1];
        edges[0] = area.X;
        for (var i = 0; i < Columns.Count; i++) edges[i + 1] = edges[i] + (area.Width * Columns[i].Share / total);
        return edges;
    }

    private float RowHeight(ICardSurface surface, IReadOnlyList<ICell> row, float width)
    {
        var edges = Edges(new Area(0, 0, width, 0));
        return row.Select((cell, i) => cell.Height(surface, Cell(edges, i, 0, 0).Width)).Max() + RowGap;
    }
}
