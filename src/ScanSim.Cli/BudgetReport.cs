using System.Globalization;
using ScanSim.Engine;
using ScanSim.Physics;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>A budget as a table that adds up in dB, the three factors of the radar equation, and the term solved for.</summary>
internal static class BudgetReport
{
    private const double DegPerRad = 180 / Math.PI;

    public static void Write(TextWriter output, Scenario scenario, Budget budget, Wanted wanted, double pd)
    {
        WriteGeometry(output, scenario, budget);
        output.WriteLine();
        var rows = budget.Received.Select(TermRow)
            .Append(["= received power", EngineeringText.Of(Math.Pow(10, budget.ReceivedDbW / 10), "W"), Db(budget.ReceivedDbW) + " dBW"])
            .Concat(budget.ToSnr.Select(TermRow))
            .Append(["= SNR per pulse", "", Db(budget.SnrDb) + " dB"]);
        TextTable.Write(output, ["term", ">value", ">dB"], rows);
        output.WriteLine();
        WriteFactors(output, budget.Terms);
        output.WriteLine();
        WriteDetection(output, budget, pd);
        if (wanted != Wanted.None)
        {
            output.WriteLine(Solution(budget, wanted, pd));
        }
    }

    private static void WriteGeometry(TextWriter output, Scenario scenario, Budget budget)
    {
        var target = budget.Target;
        output.WriteLine(Text($"{scenario.Name}"));
        output.WriteLine(Text($"target {target.Id} ({target.Class}), fluctuation case {target.FluctuationCase}, at {budget.TimeS:0.###} s"));
        output.WriteLine(Text(
            $"slant range {budget.Sight.RangeM / 1000:0.000} km ({budget.Sight.RangeM / 1852:0.000} nmi), bearing {budget.Sight.AzimuthRad * DegPerRad:000.0}°, elevation {budget.Sight.ElevationRad * DegPerRad:0.00}°, height {budget.HeightM:0.#} m"));
        var warning = budget.View switch
        {
            TargetView.BelowHorizon => "The target is below the horizon: there is no look, and Pd is 0. The terms are those of free space.",
            TargetView.BeyondInstrumentedRange => "The echo comes from beyond the instrumented range: there is no look, and Pd is 0.",
            _ => null,
        };
        if (warning is not null)
        {
            output.WriteLine(warning);
        }
    }

    private static void WriteFactors(TextWriter output, in RadarEquationTerms terms)
    {
        var density = RadarEquation.PowerDensityWPerM2(terms.PeakPowerW, terms.TransmitGainRatio, terms.RangeM);
        var returned = RadarEquation.ReturnedFractionPerM2(terms.RcsM2, terms.RangeM);
        var aperture = RadarEquation.EffectiveApertureM2(terms.ReceiveGainRatio, terms.WavelengthM);
        output.WriteLine("In three factors, at the peak of the beam and before losses:");
        output.WriteLine(Text($"  power density at the target          {EngineeringText.Of(density, "W/m²")}"));
        output.WriteLine(Text($"  returned per unit of aperture        {returned:0.000e+0} /m² ({Decibels.FromRatio(returned):0.0} dB)"));
        output.WriteLine(Text($"  effective aperture                   {aperture:0.000} m²"));
        output.WriteLine(Text($"  their product, the received power    {Decibels.FromRatio(density * returned * aperture):0.0} dBW"));
    }

    private static void WriteDetection(TextWriter output, Budget budget, double pd)
    {
        var neededDb = Decibels.FromRatio(budget.NeededSnrRatio(pd));
        output.WriteLine(Text($"{budget.Pulses} pulses integrated, Pfa {budget.FalseAlarmProbability:0.##E+0}: Pd = {budget.Pd:0.0000}"));
        var margin = budget.SnrDb - neededDb;
        output.WriteLine(Text($"Pd {pd:0.####} needs {neededDb:0.00} dB per pulse: {Math.Abs(margin):0.00} dB {(margin >= 0 ? "to spare" : "short")}"));
    }

    private static string Solution(Budget budget, Wanted wanted, double pd)
    {
        var needed = budget.NeededSnrRatio(pd);
        var terms = budget.Terms;
        var answer = wanted switch
        {
            Wanted.Range => Text($"slant range {terms.SolveRangeM(needed) / 1000:0.000} km ({terms.SolveRangeM(needed) / 1852:0.000} nmi)"),
            Wanted.Power => $"peak power {EngineeringText.Of(terms.SolvePeakPowerW(needed), "W")}",
            Wanted.Rcs => Text($"radar cross section {terms.SolveRcsM2(needed):0.####} m² ({Decibels.FromRatio(terms.SolveRcsM2(needed)):0.00} dBsm)"),
            Wanted.Gain => Text($"antenna gain {Decibels.FromRatio(terms.SolveGainRatio(needed)):0.00} dBi, both ways"),
            _ => Text($"SNR per pulse {Decibels.FromRatio(needed):0.00} dB"),
        };
        return Text($"Solved for Pd {pd:0.####}, beams and eclipsing as they stand above: {answer}");
    }

    private static string[] TermRow(BudgetTerm term) =>
    [
        term.Name,
        term.Unit.Length > 0 ? EngineeringText.Of(term.Value, term.Unit) : "",
        Db(term.Db),
    ];

    private static string Db(double db) => double.IsNegativeInfinity(db) ? "−∞" : db.ToString("0.00", CultureInfo.InvariantCulture);

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
