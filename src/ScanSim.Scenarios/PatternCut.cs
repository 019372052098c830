using System.Collections.Immutable;

namespace ScanSim.Scenarios;

/// <summary>One cut of the antenna pattern. Angles are offsets from the beam's peak.</summary>
public abstract record PatternCut
{
    private PatternCut()
    {
    }

    /// <summary>Width between the one-way half-power points.</summary>
    public required double BeamwidthRad { get; init; }

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
