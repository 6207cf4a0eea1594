using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Plots;

namespace ClubBench.Printing.Sheets;

/// <summary>The drawing of a stage and, where its response says more, the response beside it.</summary>
/// <param name="Drawing">The schematic.</param>
/// <param name="Response">The response; null leaves the drawing the whole width.</param>
/// <param name="Kind">Stage kind, for the words of the response.</param>
internal sealed record CardPicture(DrawingBlock Drawing, Plot? Response, string Kind) : IBlock
{
    private const float Gap = 10;

    /// <summary>Narrower, the words of a response do not find room beside its curves.</summary>
    private const float LeastPlotWidth = 180;

    /// <summary>Lower, its curves lie on each other.</summary>
    private const float LeastPlotHeight = 86;

    /// <summary>Points per unit of a plot: its smallest letters then have 9 points.</summary>
    private const float PlotScale = CardPages.LeastLetterPoints / PlotModelBuilder.AxisTextSize;

    /// <summary>The same picture in less height.</summary>
    public CardPicture NoHigherThan(float height) => this with { Drawing = Drawing.NoHigherThan(height) };

    /// <summary>Points of the schematic's letters at a width.</summary>
    public float LetterPoints(float width) => Drawing.LetterPoints(DrawingRoom(width));

    public float Height(ICardSurface surface, float width)
    {
        var height = Drawing.Height(surface, DrawingRoom(width));
        return Response is null ? height : Math.Max(height, LeastPlotHeight);
    }

    public void Draw(ICardSurface surface, Area area)
    {
        var room = area with { Height = Height(surface, area.Width) };
        if (Response is null)
        {
            Drawing.Draw(surface, room);
            return;
        }

        var left = room with { Width = Drawing.WidthTaken(DrawingRoom(area.Width)) };
        var right = new Area(left.Right + Gap, room.Y, room.Right - left.Right - Gap, room.Height);
        Drawing.Draw(surface, left);
        surface.Svg(PlotDrawing.Of(Response, PlotFrame.Of(Response, right.Width / PlotScale, right.Height / PlotScale), Kind).Svg, right);
    }

    private float DrawingRoom(float width) => Response is null ? width : width - Gap - LeastPlotWidth;
}
