using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Painting;
using ScanSim.Display.Explaining;

namespace ScanSim.Cli;

/// <summary>Looks as a table, one row each; scans without a look give one row, and several alike in succession give one together.</summary>
internal static class LookTableText
{
    private static readonly string[] Columns =
    [
        ">time", ">scan", ">range", ">bearing", ">elev.", ">radar", ">RCS", ">spreading", ">azimuth", ">elevation", ">eclipsing", ">SNR dB", ">need", ">margin", ">Pd", ">drawn RCS", ">over thr.", "outcome",
    ];

    public static void Write(TextWriter output, IEnumerable<TargetPass> passes, RangeUnit unit) => TextTable.Write(output, Columns, Rows([.. passes], unit));

    private static IEnumerable<string[]> Rows(TargetPass[] passes, RangeUnit unit)
    {
        for (var i = 0; i < passes.Length; i++)
        {
            var pass = passes[i];
            foreach (var look in pass.Looks)
            {
                yield return LookRow(look, ReferenceEquals(look, pass.Best) ? pass.Reason : look.Reason, unit);
            }

            if (pass.SideLooks > 0)
            {
                yield return [Line($"{pass.TimeS:0.00} s"), Line($"{pass.Scan}"), .. Enumerable.Repeat("", Columns.Length - 3), Line($"and {pass.SideLooks} looks through side lobes, without a hit")];
            }

            if (!pass.Looks.IsEmpty)
            {
                continue;
            }

            var last = i;
            while (last + 1 < passes.Length && IsAlike(pass, passes[last + 1], passes[last]))
            {
                last++;
            }

            yield return NoLookRow(pass, passes[last], unit);
            i = last;
        }
    }

    private static bool IsAlike(TargetPass first, TargetPass next, TargetPass previous) =>
        next.Looks.IsEmpty && next.Outcome == first.Outcome && next.Scan == previous.Scan + 1;

    private static string[] LookRow(LookExplanation look, string reason, RangeUnit unit)
    {
        var row = look.Row;
        return
        [
            Line($"{row.TimeS:0.00} s"),
            Line($"{row.Scan}"),
            RangeText.Precise(row.RangeM, unit),
            Line($"{row.AzimuthDeg:000.0}°"),
            Line($"{row.ElevationDeg:0.0}°"),
            Db(row.RadarDb),
            Db(row.RcsDb),
            Db(row.SpreadingDb),
            Db(row.AzimuthBeamDb),
            Db(row.ElevationBeamDb),
            Db(row.EclipsingDb),
            Db(row.SnrDb),
            Db(look.NeededDb),
            Db(look.MarginDb),
            Line($"{row.Pd:0.000}"),
            row.FluctuationDb is { } drawnDb ? Db(drawnDb) : "–",
            Db(row.StatisticDb),
            reason,
        ];
    }

    private static string[] NoLookRow(TargetPass first, TargetPass last, RangeUnit unit)
    {
        var truth = first.Truth!.Value;
        var several = last.Scan > first.Scan ? Line($"{last.Scan - first.Scan + 1} scans, the first: ") : "";
        return
        [
            Line($"{first.TimeS:0.00} s"),
            last.Scan > first.Scan ? Line($"{first.Scan}–{last.Scan}") : Line($"{first.Scan}"),
            RangeText.Precise(truth.RangeM, unit),
            Line($"{truth.AzimuthDeg:000.0}°"),
            Line($"{truth.ElevationDeg:0.0}°"),
            .. Enumerable.Repeat("", Columns.Length - 6),
            several + first.Reason,
        ];
    }

    /// <summary>What rounds to nothing is 0.0, never -0.0.</summary>
    private static string Db(double db) => double.IsNegativeInfinity(db) ? "−∞" : Line($"{Math.Round(db, 1) + 0.0:0.0}");

    private static string Line(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
