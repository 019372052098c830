using CsCheck;

namespace ScanSim.Physics.Tests;

public sealed class RadarEquationTermsTests
{
    private static readonly Gen<RadarEquationTerms> AnyTerms =
        from power in Decades(0, 7)
        from gains in Gen.Select(Decades(0, 5), Decades(0, 5))
        from wave in Decades(-2.5, 0.5)
        from rcs in Decades(-4, 5)
        from range in Decades(1, 6)
        from loss in Decades(0, 2)
        from noise in Gen.Select(Decades(1, 4), Decades(3, 8))
        from energy in Decades(0, 4)
        select new RadarEquationTerms
        {
            PeakPowerW = power,
            TransmitGainRatio = gains.Item1,
            ReceiveGainRatio = gains.Item2,
            WavelengthM = wave,
            RcsM2 = rcs,
            RangeM = range,
            LossRatio = loss,
            NoiseTemperatureK = noise.Item1,
            NoiseBandwidthHz = noise.Item2,
            EnergyGainRatio = energy,
        };

    [Fact]
    public void Each_solution_put_back_gives_the_wanted_ratio()
    {
        Property.Holds(
            Gen.Select(AnyTerms, Decades(-3, 6)),
            2000,
            v =>
            {
                var (t, snr) = v;
                double[] back =
                [
                    (t with { RangeM = t.SolveRangeM(snr) }).SnrRatio(),
                    (t with { PeakPowerW = t.SolvePeakPowerW(snr) }).SnrRatio(),
                    (t with { TransmitGainRatio = t.SolveGainRatio(snr), ReceiveGainRatio = t.SolveGainRatio(snr) }).SnrRatio(),
                    (t with { RcsM2 = t.SolveRcsM2(snr) }).SnrRatio(),
                    (t with { WavelengthM = t.SolveWavelengthM(snr) }).SnrRatio(),
                    (t with { LossRatio = t.SolveLossRatio(snr) }).SnrRatio(),
                ];
                return Array.TrueForAll(back, b => Math.Abs(b / snr - 1.0) < 1e-14);
            });
    }

    [Fact]
    public void A_solution_does_not_read_the_term_it_solves_for()
    {
        RadarEquationTerms t = RadarEquationTests.OneWattOfNoise() with { PeakPowerW = 1e5, RangeM = 1e4 };
        Assert.Equal(t.SolveRangeM(1e-20), (t with { RangeM = double.NaN }).SolveRangeM(1e-20));
        Assert.Equal(t.SolvePeakPowerW(1e-20), (t with { PeakPowerW = double.NaN }).SolvePeakPowerW(1e-20));
        Assert.Equal(t.SolveRcsM2(1e-20), (t with { RcsM2 = double.NaN }).SolveRcsM2(1e-20));
        Assert.Equal(t.SolveWavelengthM(1e-20), (t with { WavelengthM = double.NaN }).SolveWavelengthM(1e-20));
        Assert.Equal(t.SolveLossRatio(1e-20), (t with { LossRatio = double.NaN }).SolveLossRatio(1e-20));
        Assert.Equal(
            t.SolveGainRatio(1e-20), (t with { TransmitGainRatio = double.NaN, ReceiveGainRatio = double.NaN }).SolveGainRatio(1e-20));
    }

    [Fact]
    public void Compression_by_a_hundred_at_equal_cell_gains_20_dB()
    {
        RadarEquationTerms plain = RadarEquationTests.OneWattOfNoise();
        Assert.Equal(20.0, Decibels.FromRatio((plain with { EnergyGainRatio = 100.0 }).SnrRatio() / plain.SnrRatio()), 1e-12);
    }

    private static Gen<double> Decades(double from, double to) => Gen.Double[from, to].Select(e => Math.Pow(10.0, e));
}
