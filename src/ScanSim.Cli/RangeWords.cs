using System.Globalization;
using ScanSim.Display;

namespace ScanSim.Cli;

/// <summary>Ranges in the unit asked for.</summary>
internal static class RangeWords
{
    private const double MetresPerKilometre = 1000;

    /// <summary>International nautical mile, exact (SI Brochure 8th ed., table 8).</summary>
    private const double MetresPerNauticalMile = 1852;

    public static string Of(double rangeM, RangeUnit unit) => unit == RangeUnit.NauticalMile
        ? (rangeM / MetresPerNauticalMile).ToString("0.00", CultureInfo.InvariantCulture) + " nmi"
        : (rangeM / MetresPerKilometre).ToString("0.00", CultureInfo.InvariantCulture) + " km";
}
