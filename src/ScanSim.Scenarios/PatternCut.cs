using System.Collections.Immutable;
using ScanSim.Physics.Antennas;

namespace ScanSim.Scenarios;

/// <summary>One cut of the antenna pattern. Angles are offsets from the beam's peak.</summary>
public abstract record PatternCut
{
    private PatternCut()
    {
    }

    /// <summary>Width between the one-way half-power points.</summary>
    public required double BeamwidthRad { get; init; }

    /// <summary>The formula of the cut.</summary>
    /// <param name="tiltRad">Elevation of the beam's peak; only the cosecant-squared shape depends on it.</param>
    public Pattern ToPattern(double tiltRad) => this switch
    {
        Gaussian => new GaussianPattern(BeamwidthRad),
        Uniform => new AperturePattern(ApertureTaper.Uniform, BeamwidthRad),
        Cosine => new AperturePattern(ApertureTaper.Cosine, BeamwidthRad),
        CosineSquared => new AperturePattern(ApertureTaper.CosineSquared, BeamwidthRad),
        CosecantSquared shaped => new CosecantSquaredPattern(BeamwidthRad, tiltRad, shaped.UpToRad),
        Table table => new TablePattern(table.OffsetsRad.AsSpan(), table.LevelsDb.AsSpan()),
        _ => throw new InvalidOperationException("unknown kind of pattern"),
    };

    public sealed record Gaussian : PatternCut;

    /// <summary>Uniform illumination of the aperture: sin x / x.</summary>
    public sealed record Uniform : PatternCut;

    public sealed record Cosine : PatternCut;

    public sealed record CosineSquared : PatternCut;

    /// <summary>Elevation only: a beam of <see cref="PatternCut.BeamwidthRad"/> below, cosecant-squared from half a beamwidth above the tilt up to <see cref="UpToRad"/> (elevation above the horizontal).</summary>
    public sealed record CosecantSquared : PatternCut
    {
        public required double UpToRad { get; init; }
    }

    /// <summary>Measured or data-sheet pattern: one-way level in dB below the peak at offsets in rising order, both of equal length (≥ 2).</summary>
    public sealed record Table : PatternCut
    {
        public required ImmutableArray<double> OffsetsRad { get; init; }

        public required ImmutableArray<double> LevelsDb { get; init; }
    }
}
