using System.Collections.Immutable;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A row of a long recording: columns of several scans, filled from below by the share of each outcome.</summary>
internal sealed class TimelineColumns(Sheet sheet, double durationS, SKRect row)
{
    /// <summary>From below: what was seen, then why the rest was not.</summary>
    private static readonly LookOutcome[] FromBelow =
    [
        LookOutcome.Detected, LookOutcome.MissedChance, LookOutcome.MissedRange, LookOutcome.MissedBeam,
        LookOutcome.MissedMasked, LookOutcome.MissedUnrecorded,
    ];

    public void Paint(ImmutableArray<LookMark> looks)
    {
        var columns = (int)(row.Width / OutcomeTexture.ColumnWidth);
        var counts = new int[Enum.GetValues<LookOutcome>().Length];
        var next = 0;
        for (var column = 0; column < columns; column++)
        {
            Array.Clear(counts);
            var endS = durationS * (column + 1) * OutcomeTexture.ColumnWidth / row.Width;
            var first = next;
            for (; next < looks.Length && looks[next].TimeS < endS; next++)
            {
                counts[(int)looks[next].Outcome]++;
            }

            if (next > first)
            {
                PaintColumn(row.Left + column * OutcomeTexture.ColumnWidth, counts, next - first);
            }
        }
    }

    private void PaintColumn(float left, int[] counts, int all)
    {
        if (counts[(int)LookOutcome.NoLook] == all)
        {
            OutcomeTexture.Fill(sheet, LookOutcome.NoLook, new SKRect(left, row.Top, left + OutcomeTexture.ColumnWidth, row.Bottom));
            return;
        }

        var bottom = row.Bottom;
        foreach (var outcome in FromBelow)
        {
            if (counts[(int)outcome] > 0)
            {
                var top = bottom - row.Height * counts[(int)outcome] / all;
                OutcomeTexture.Fill(sheet, outcome, new SKRect(left, top, left + OutcomeTexture.ColumnWidth, bottom));
                bottom = top;
            }
        }
    }
}
