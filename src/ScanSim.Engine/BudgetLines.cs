using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>The lines of a budget. Their sum is the radar equation (see <see cref="RadarEquationTerms"/>), which a test holds them to.</summary>
internal static class BudgetLines
{
    public static ImmutableArray<BudgetTerm> Received(in RadarEquationTerms terms, Losses losses, in Look look) =>
    [
        Ratio("peak power", terms.PeakPowerW, "W"),
        Ratio("transmit gain", terms.TransmitGainRatio, ""),
        Ratio("receive gain", terms.ReceiveGainRatio, ""),
        new("wavelength squared", terms.WavelengthM, "m", 2 * Decibels.FromRatio(terms.WavelengthM)),
        Ratio("radar cross section", terms.RcsM2, "m²"),
        new("spreading out and back", terms.RangeM, "m", -4 * Decibels.FromRatio(terms.RangeM)),
        new("(4π)³", Math.Pow(4 * Math.PI, 3), "", -3 * Decibels.FromRatio(4 * Math.PI)),
        Ratio("azimuth beam, two-way", look.AzimuthBeamRatio, ""),
        Ratio("elevation beam, two-way", look.ElevationBeamRatio, ""),
        Ratio("eclipsing", look.EclipsingRatio, ""),
        Loss("transmit loss", losses.TransmitRatio),
        Loss("processing loss", losses.ProcessingRatio),
    ];

    public static ImmutableArray<BudgetTerm> ToSnr(in RadarEquationTerms terms) =>
    [
        Ratio("pulse compression", terms.EnergyGainRatio, ""),
        new("Boltzmann constant", Constants.BoltzmannJPerK, "J/K", -Decibels.FromRatio(Constants.BoltzmannJPerK)),
        new("system noise temperature", terms.NoiseTemperatureK, "K", -Decibels.FromRatio(terms.NoiseTemperatureK)),
        new("noise bandwidth", terms.NoiseBandwidthHz, "Hz", -Decibels.FromRatio(terms.NoiseBandwidthHz)),
    ];

    private static BudgetTerm Ratio(string name, double value, string unit) => new(name, value, unit, Decibels.FromRatio(value));

    private static BudgetTerm Loss(string name, double lossRatio) => new(name, lossRatio, "", -Decibels.FromRatio(lossRatio));
}
