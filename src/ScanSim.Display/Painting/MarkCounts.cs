using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Counts marks within boxes in constant time: sums over cells of 4 units, so a box counts its neighbourhood too.</summary>
internal sealed class MarkCounts
{
    private const float CellPx = 4;
    private readonly SKRect area;
    private readonly int columns;
    private readonly int rows;
    private readonly int[] sums;

    public MarkCounts(SKRect area, IEnumerable<SKPoint> marks)
    {
        this.area = area;
        columns = (int)(area.Width / CellPx) + 2;
        rows = (int)(area.Height / CellPx) + 2;
        sums = new int[columns * rows];
        foreach (var mark in marks)
        {
            if (area.Contains(mark))
            {
                sums[(Row(mark.Y) + 1) * columns + Column(mark.X) + 1]++;
            }
        }

        for (var row = 1; row < rows; row++)
        {
            for (var column = 1; column < columns; column++)
            {
                sums[row * columns + column] +=
                    sums[(row - 1) * columns + column] + sums[row * columns + column - 1] - sums[(row - 1) * columns + column - 1];
            }
        }
    }

    public int In(SKRect box)
    {
        var (left, right) = (Column(box.Left), Column(box.Right) + 1);
        var (top, bottom) = (Row(box.Top), Row(box.Bottom) + 1);
        return sums[bottom * columns + right] - sums[top * columns + right] - sums[bottom * columns + left] + sums[top * columns + left];
    }

    private int Column(float x) => Math.Clamp((int)((x - area.Left) / CellPx), 0, columns - 2);

    private int Row(float y) => Math.Clamp((int)((y - area.Top) / CellPx), 0, rows - 2);
}
