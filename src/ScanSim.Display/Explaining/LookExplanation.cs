using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Explaining;

/// <summary>Why one look saw its target or missed it.</summary>
/// <remarks>
/// The margin over the SNR that even odds need is split without remainder: <see cref="MarginDb"/> = −Σ <see cref="Losses"/>. Azimuth
/// beam, elevation beam and eclipsing are losses against the free-space SNR at the beam's peak; range is the spreading beyond
/// <see cref="EvenOddsRangeM"/>. They are the row's terms but for one case: at the side-lobe floor, when the elevation alone holds the
/// look there, the whole of the beam's loss counts as the elevation's (the row may have it under azimuth). The needed SNR supposes pulses of equal SNR: for fluctuation cases 2 and 4, where the beam weighs
/// the pulses differently, Pd at margin 0 is not exactly one half.
/// </remarks>
public sealed record LookExplanation
{
    public required LookRow Row { get; init; }

    /// <summary>Ids of the other targets in its cell, as far as the recording has their looks.</summary>
    public required ImmutableArray<string> CellMates { get; init; }

    /// <summary>SNR per pulse in free space at the beam's peak: radar + RCS + spreading.</summary>
    public required double FreeSpaceSnrDb { get; init; }

    /// <summary>SNR per pulse at which Pd is one half.</summary>
    public required double NeededDb { get; init; }

    /// <summary>The detection probability asked for.</summary>
    public required double WantedPd { get; init; }

    /// <summary>SNR per pulse at which <see cref="WantedPd"/> is reached.</summary>
    public required double NeededForWantedDb { get; init; }

    /// <summary>Range to which the target is seen with Pd one half, in free space at the beam's peak.</summary>
    public required double EvenOddsRangeM { get; init; }

    /// <summary>The same with <see cref="WantedPd"/>.</summary>
    public required double WantedRangeM { get; init; }

    /// <summary>By <see cref="LookTerm"/>: range, azimuth beam, elevation beam, eclipsing.</summary>
    public required ImmutableArray<TermLoss> Losses { get; init; }

    public required PassOutcome Outcome { get; init; }

    /// <summary>In words: "missed: 12.4 dB below need: 9.0 dB of range, 3.4 dB off the beam's elevation".</summary>
    public required string Reason { get; init; }

    /// <summary>SNR over <see cref="NeededDb"/>; −∞ for what is wholly eclipsed.</summary>
    public double MarginDb => Row.SnrDb - NeededDb;

    public double MarginForWantedDb => Row.SnrDb - NeededForWantedDb;

    /// <summary>The greatest loss; the first of equal ones.</summary>
    public TermLoss Costliest => Losses.MaxBy(l => l.LossDb);

    public double LossDb(LookTerm term) => Losses[(int)term].LossDb;
}
