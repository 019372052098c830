using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The marks of a row of the timeline, whatever they stand for, and how each kind looks.</summary>
internal abstract class RowMarks
{
    public abstract int Count { get; }

    public abstract int Kinds { get; }

    /// <summary>Kinds in the order in which a column is filled from below; what is left is the kind for nothing to see.</summary>
    public abstract IReadOnlyList<int> FromBelow { get; }

    public abstract int Nothing { get; }

    public abstract double TimeS(int index);

    public abstract int Scan(int index);

    public abstract int Kind(int index);

    /// <summary>From 0, weak, to <see cref="SnrShades.Count"/> − 1.</summary>
    public abstract int Shade(int index);

    public abstract void Fill(Sheet sheet, int kind, SKRect box);

    public abstract void Draw(Sheet sheet, int kind, SKPoint[] centres, float r, byte alpha);

    public int FirstFrom(double timeS)
    {
        var (low, high) = (0, Count);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = TimeS(middle) < timeS ? (middle + 1, high) : (low, middle);
        }

        return low;
    }
}
