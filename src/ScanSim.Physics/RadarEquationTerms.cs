namespace ScanSim.Physics;

/// <summary>The terms of the radar equation of one pulse; gives the signal-to-noise ratio, or any one term for a wanted ratio.</summary>
/// <remarks>
/// SNR = P Gt Gr λ² σ n / ((4π)³ R⁴ k T B L): mean signal power over mean noise power at the matched filter, per pulse.
/// Source: M. I. Skolnik, Introduction to Radar Systems, 3rd ed., 2001, section 2.1 ff. (from memory). Each Solve method reads
/// every term but the one it solves for. Domain: all terms &gt; 0 and the wanted SNR &gt; 0. Accuracy: a solution put back gives the
/// SNR to 1e-14 relative. NaN in, NaN out. The default value has all terms 0 and gives NaN.
/// </remarks>
public readonly record struct RadarEquationTerms
{
    public required double PeakPowerW { get; init; }

    public required double TransmitGainRatio { get; init; }

    public required double ReceiveGainRatio { get; init; }

    public required double WavelengthM { get; init; }

    public required double RcsM2 { get; init; }

    public required double RangeM { get; init; }

    /// <summary>All losses that lower the signal, ≥ 1; the receiving line's is in <see cref="NoiseTemperatureK"/> already.</summary>
    public required double LossRatio { get; init; }

    /// <summary>System noise temperature at the antenna terminals.</summary>
    public required double NoiseTemperatureK { get; init; }

    /// <summary>Noise bandwidth of the whole receiver: 1 / compressed pulse width.</summary>
    public required double NoiseBandwidthHz { get; init; }

    /// <summary>Transmitted over compressed pulse width; 1 for a plain pulse.</summary>
    public required double EnergyGainRatio { get; init; }

    public double SnrRatio() =>
        RadarEquation.ReceivedPowerW(PeakPowerW, TransmitGainRatio, ReceiveGainRatio, WavelengthM, RcsM2, RangeM, LossRatio)
        * EnergyGainRatio / Noise.PowerW(NoiseTemperatureK, NoiseBandwidthHz);

    /// <summary>Greatest range at which the SNR is still reached.</summary>
    public double SolveRangeM(double requiredSnrRatio) =>
        Math.Sqrt(Math.Sqrt((this with { RangeM = 1.0 }).SnrRatio() / requiredSnrRatio));

    public double SolvePeakPowerW(double requiredSnrRatio) =>
        requiredSnrRatio / (this with { PeakPowerW = 1.0 }).SnrRatio();

    /// <summary>Gain needed when one antenna serves both ways.</summary>
    public double SolveGainRatio(double requiredSnrRatio) =>
        Math.Sqrt(requiredSnrRatio / (this with { TransmitGainRatio = 1.0, ReceiveGainRatio = 1.0 }).SnrRatio());

    public double SolveRcsM2(double requiredSnrRatio) =>
        requiredSnrRatio / (this with { RcsM2 = 1.0 }).SnrRatio();

    /// <summary>Wavelength needed when the gains stay as they are.</summary>
    public double SolveWavelengthM(double requiredSnrRatio) =>
        Math.Sqrt(requiredSnrRatio / (this with { WavelengthM = 1.0 }).SnrRatio());

    /// <summary>Greatest loss that still leaves the SNR; below 1 when even a loss-free radar does not reach it.</summary>
    public double SolveLossRatio(double requiredSnrRatio) =>
        (this with { LossRatio = 1.0 }).SnrRatio() / requiredSnrRatio;
}
