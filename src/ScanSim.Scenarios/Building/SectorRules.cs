using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Rules of the scanned sector and of the blanked ones.</summary>
internal static class SectorRules
{
    /// <summary>Smaller than this a gap is the rounding of azimuths given in degrees.</summary>
    private const double RoundingRad = 1e-9;

    public static void Check(CheckedBlock radar, FaultList faults)
    {
        var scanned = radar.BlockOrNull("sector") is { Sound: true } sector ? sector : null;
        if (scanned is not null && IsEmpty(scanned))
        {
            faults.Add(scanned, "a sector with 'from' equal to 'to'", "two different azimuths, or 'rotation' for full turns");
            return;
        }

        var blanked = radar.Blocks("blanked").ToList();
        if (blanked.TrueForAll(block => block.Sound) && (scanned is not null || radar.Has("rotation")))
        {
            Blanked(blanked, scanned is null ? null : Limits(scanned), radar, faults);
        }
    }

    /// <summary>The sector of a sound block with from and to.</summary>
    public static AzimuthSector Limits(CheckedBlock block) =>
        new(Angles.Positive(block.Si("from")), Angles.Positive(block.Si("to")));

    private static void Blanked(List<CheckedBlock> blanked, AzimuthSector? scanned, CheckedBlock radar, FaultList faults)
    {
        foreach (var block in blanked.Where(IsEmpty))
        {
            faults.Add(block, "a sector with 'from' equal to 'to'", "two different azimuths");
        }

        if (blanked.Count > 0 && Covers(blanked.ConvertAll(Limits), scanned ?? default, scanned?.WidthRad ?? Angles.TurnRad))
        {
            faults.Add(radar.Values["blanked"], "blanked sectors that cover all that is scanned", "some azimuth in which the radar sends");
        }
    }

    private static bool IsEmpty(CheckedBlock block) => Limits(block) is var limits && limits.FromRad == limits.ToRad;

    /// <summary>True when the sectors leave nothing free of the width clockwise from scanned.FromRad.</summary>
    private static bool Covers(List<AzimuthSector> sectors, AzimuthSector scanned, double widthRad)
    {
        var spans = sectors.Select(sector => (From: Angles.Positive(sector.FromRad - scanned.FromRad), Width: sector.WidthRad))
            .SelectMany(span => new[] { (span.From, To: span.From + span.Width), (From: span.From - Angles.TurnRad, To: span.From - Angles.TurnRad + span.Width) })
            .OrderBy(span => span.From);
        var reachedRad = 0.0;
        foreach (var (fromRad, toRad) in spans)
        {
            if (fromRad > reachedRad + RoundingRad)
            {
                break;
            }

            reachedRad = Math.Max(reachedRad, toRad);
        }

        return reachedRad >= widthRad - RoundingRad;
    }
}
