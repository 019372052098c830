using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>One row of the timeline: a mark for each look while there is room, else columns of a few scans filled by shares.</summary>
internal sealed class RowPainter(Sheet sheet, SKRect row, double fromS, double toS, double periodS)
{
    /// <summary>Narrower scans are gathered in columns.</summary>
    public const float LeastMarkPx = 7;

    public static bool IsInColumns(float width, double spanS, double periodS) => width * periodS / spanS < LeastMarkPx;

    public void Paint(RowMarks marks)
    {
        var first = marks.FirstFrom(fromS - periodS);
        var last = marks.FirstFrom(toS + periodS);
        if (IsInColumns(row.Width, toS - fromS, periodS))
        {
            PaintColumns(marks, first, last);
        }
        else
        {
            PaintMarks(marks, first, last);
        }
    }

    private float X(double timeS) => row.Left + (float)((timeS - fromS) / (toS - fromS)) * row.Width;

    private void PaintMarks(RowMarks marks, int first, int last)
    {
        var r = Math.Min((float)(row.Width * periodS / (toS - fromS)) / 2 - 0.75f, Math.Min(row.Height / 2 - 2.5f, 5.5f));
        var found = new List<SKPoint>[marks.Kinds, SnrShades.Count];
        for (var i = first; i < last; i++)
        {
            (found[marks.Kind(i), marks.Shade(i)] ??= []).Add(new SKPoint(X(marks.TimeS(i)), row.MidY));
        }

        for (var kind = 0; kind < marks.Kinds; kind++)
        {
            for (var shade = 0; shade < SnrShades.Count; shade++)
            {
                if (found[kind, shade] is { } points)
                {
                    marks.Draw(sheet, kind, [.. points], r, SnrShades.Alpha(shade));
                }
            }
        }
    }

    private void PaintColumns(RowMarks marks, int first, int last)
    {
        var scanPx = row.Width * periodS / (toS - fromS);
        var scans = Math.Max(1, (int)Math.Ceiling(OutcomeTexture.ColumnWidth / scanPx));
        var counts = new int[marks.Kinds];
        for (var next = first; next < last;)
        {
            Array.Clear(counts);
            // Counted from scan 0 whatever is shown, so that columns do not flicker while the timeline is moved.
            var column = marks.Scan(next) / scans;
            var start = next;
            for (; next < last && marks.Scan(next) / scans == column; next++)
            {
                counts[marks.Kind(next)]++;
            }

            var (left, right) = (Edge(column * scans * periodS), Edge((column + 1) * scans * periodS));
            if (right > left)
            {
                PaintColumn(marks, new SKRect(left, row.Top, right, row.Bottom), counts, next - start);
            }
        }
    }

    /// <summary>On whole units, so that neighbouring columns meet without a seam.</summary>
    private float Edge(double timeS) => Math.Clamp(MathF.Round(X(timeS)), row.Left, row.Right);

    private void PaintColumn(RowMarks marks, SKRect box, int[] counts, int all)
    {
        if (counts[marks.Nothing] == all)
        {
            marks.Fill(sheet, marks.Nothing, box);
            return;
        }

        var bottom = box.Bottom;
        foreach (var kind in marks.FromBelow)
        {
            if (counts[kind] > 0)
            {
                var top = bottom - box.Height * counts[kind] / all;
                marks.Fill(sheet, kind, new SKRect(box.Left, top, box.Right, bottom));
                bottom = top;
            }
        }
    }
}
