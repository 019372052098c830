using System.Collections.Immutable;
using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A row of a long recording: each column is one scan or a few, filled from below by the share of each outcome.</summary>
internal sealed class TimelineColumns(Sheet sheet, float scanPx, SKRect row)
{
    /// <summary>From below: what was seen, then why the rest was not.</summary>
    private static readonly LookOutcome[] FromBelow =
    [
        LookOutcome.Detected, LookOutcome.MissedChance, LookOutcome.MissedRange, LookOutcome.MissedBeam,
        LookOutcome.MissedMasked, LookOutcome.MissedUnrecorded,
    ];

    private readonly int scansPerColumn = Math.Max(1, (int)MathF.Ceiling(OutcomeTexture.ColumnWidth / scanPx));

    public void Paint(ImmutableArray<LookMark> looks, int firstScan)
    {
        var counts = new int[Enum.GetValues<LookOutcome>().Length];
        for (var next = 0; next < looks.Length;)
        {
            Array.Clear(counts);
            var column = Column(looks[next], firstScan);
            var first = next;
            for (; next < looks.Length && Column(looks[next], firstScan) == column; next++)
            {
                counts[(int)looks[next].Outcome]++;
            }

            PaintColumn(Edge(column), Edge(column + 1), counts, next - first);
        }
    }

    private int Column(in LookMark look, int firstScan) => (look.Scan - firstScan) / scansPerColumn;

    /// <summary>On whole units, so that neighbouring columns meet without a seam.</summary>
    private float Edge(int column) => Math.Min(row.Right, MathF.Round(row.Left + column * scansPerColumn * scanPx));

    private void PaintColumn(float left, float right, int[] counts, int all)
    {
        if (counts[(int)LookOutcome.NoLook] == all)
        {
            OutcomeTexture.Fill(sheet, LookOutcome.NoLook, new SKRect(left, row.Top, right, row.Bottom));
            return;
        }

        var bottom = row.Bottom;
        foreach (var outcome in FromBelow)
        {
            if (counts[(int)outcome] > 0)
            {
                var top = bottom - row.Height * counts[(int)outcome] / all;
                OutcomeTexture.Fill(sheet, outcome, new SKRect(left, top, right, bottom));
                bottom = top;
            }
        }
    }
}
