using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Explaining;

/// <summary>The outcome of a look in words.</summary>
internal static class LookWords
{
    /// <summary>Losses that would be printed as 0.0 dB are left out.</summary>
    private const double LeastLossDb = 0.05;

    public static string Of(in LookRow row, double marginDb, ImmutableArray<TermLoss> losses, ImmutableArray<string> cellMates) => row.LostTo switch
    {
        LossReason.None when marginDb >= 0 => $"detected with {marginDb:0.0} dB to spare{InOneCell(row, cellMates)}",
        LossReason.None when row.TargetsInCell > 1 => $"detected together with {Names(cellMates)} in the same cell: {-marginDb:0.0} dB below need by itself, Pd {row.Pd:0.00}",
        LossReason.None => $"detected by chance: {-marginDb:0.0} dB below need, Pd was {row.Pd:0.00}, {Draw(row)}",
        LossReason.Fluctuation => $"missed by chance: Pd was {row.Pd:0.00}, {Draw(row)}",
        LossReason.SharedCell when row.FluctuationDb is { } drawnDb && marginDb + drawnDb < 0 => $"missed in one cell with {Names(cellMates)}: Pd alone was {row.Pd:0.00}, {Draw(row)}",
        LossReason.SharedCell => $"cancelled by {Names(cellMates)} in the same cell: Pd alone was {row.Pd:0.00}",
        _ when double.IsNegativeInfinity(marginDb) => "missed: the whole echo came while the receiver was shut",
        _ => $"missed: {-marginDb:0.0} dB below need: {Split(losses)}",
    };

    private static string Split(ImmutableArray<TermLoss> losses)
    {
        var lost = losses.Where(l => l.LossDb >= LeastLossDb).OrderByDescending(l => l.LossDb).Select(l => $"{l.LossDb:0.0} dB {Words(l.Term)}");
        var inHand = losses.Where(l => l.LossDb <= -LeastLossDb).Select(l => $"{-l.LossDb:0.0} dB in hand by {(l.Term == LookTerm.Range ? "range" : "the beam")}");
        return string.Join(", ", lost.Concat(inHand));
    }

    private static string Words(LookTerm term) => term switch
    {
        LookTerm.Range => "of range",
        LookTerm.AzimuthBeam => "off the beam's azimuth",
        LookTerm.ElevationBeam => "off the beam's elevation",
        _ => "of eclipsing",
    };

    /// <summary>What the draw did: by the RCS where one was drawn for the pass and it went the way of the outcome; else by the statistic.</summary>
    private static string Draw(in LookRow row)
    {
        if (row.FluctuationDb is { } db && db != 0 && db > 0 == row.Detected)
        {
            return $"the drawn echo was {Math.Abs(db):0.0} dB {(db > 0 ? "above" : "below")} its mean";
        }

        return $"the drawn signal and noise were {Math.Abs(row.StatisticDb):0.0} dB {(row.StatisticDb > 0 ? "over" : "below")} the threshold";
    }

    private static string InOneCell(in LookRow row, ImmutableArray<string> cellMates) =>
        row.TargetsInCell > 1 ? $", in one cell with {Names(cellMates)}" : "";

    private static string Names(ImmutableArray<string> cellMates) => cellMates.IsEmpty ? "another target" : string.Join(" and ", cellMates);
}
