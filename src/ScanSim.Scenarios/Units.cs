using System.Collections.Immutable;

namespace ScanSim.Scenarios;

/// <summary>The units of every dimension, the most usual first; symbols are case-sensitive.</summary>
/// <remarks>
/// Sources: SI prefixes, degree, minute, hour, decibel: BIPM, SI Brochure, 9th ed. (2019), tables 7 and 8. Nautical mile 1852 m
/// and knot: First International Extraordinary Hydrographic Conference, Monaco 1929, kept in SI Brochure, 8th ed., table 8.
/// Foot 0.3048 m and mile 5280 ft: international yard and pound agreement of 1959 (NIST SP 811 (2008), appendix B).
/// </remarks>
public static class Units
{
    private const string Prefix = "SI prefix";
    private const string Foot = "0.3048 m, international foot of 1959";
    private const string NauticalMile = "1852 m, international nautical mile of 1929";

    private static readonly ImmutableArray<Unit> Frequency =
    [
        Unit.Linear("GHz", 1e9, 1, Prefix),
        Unit.Linear("MHz", 1e6, 1, Prefix),
        Unit.Linear("kHz", 1e3, 1, Prefix),
        Unit.Linear("Hz", 1, 1, "SI"),
    ];

    private static readonly ImmutableArray<Unit> Power =
    [
        Unit.Linear("W", 1, 1, "SI"),
        Unit.Linear("kW", 1e3, 1, Prefix),
        Unit.Linear("MW", 1e6, 1, Prefix),
        Unit.Linear("mW", 1, 1e3, Prefix),
        Unit.Decibel("dBW", 0, "decibels over 1 W"),
        Unit.Decibel("dBm", -30, "decibels over 1 mW"),
    ];

    private static readonly ImmutableArray<Unit> Gain = [Unit.Decibel("dBi", 0, "decibels over the isotropic radiator")];

    private static readonly ImmutableArray<Unit> Ratio = [Unit.Decibel("dB", 0, "ten times the decimal logarithm of a power ratio")];

    private static readonly ImmutableArray<Unit> Angle =
    [
        Unit.Linear("deg", Math.PI, 180, "pi/180 rad"),
        Unit.Linear("arcmin", Math.PI, 10_800, "1/60 deg"),
        Unit.Linear("mrad", 1, 1e3, Prefix),
        Unit.Linear("rad", 1, 1, "SI"),
    ];

    private static readonly ImmutableArray<Unit> AngularRate =
    [
        Unit.Linear("rpm", Math.PI, 30, "one turn (2 pi rad) a minute"),
        Unit.Linear("deg/s", Math.PI, 180, "pi/180 rad/s"),
        Unit.Linear("rad/s", 1, 1, "SI"),
    ];

    private static readonly ImmutableArray<Unit> Length =
    [
        Unit.Linear("m", 1, 1, "SI"),
        Unit.Linear("km", 1e3, 1, Prefix),
        Unit.Linear("nmi", 1852, 1, NauticalMile),
        Unit.Linear("ft", 3048, 1e4, Foot),
        Unit.Linear("mi", 1_609_344, 1e3, "5280 ft, statute mile"),
        Unit.Linear("cm", 1, 1e2, Prefix),
    ];

    private static readonly ImmutableArray<Unit> Speed =
    [
        Unit.Linear("m/s", 1, 1, "SI"),
        Unit.Linear("kn", 1852, 3600, "one nautical mile (1852 m) an hour"),
        Unit.Linear("km/h", 1e3, 3600, "1000 m in 3600 s"),
        Unit.Linear("ft/min", 3048, 6e5, "one foot (0.3048 m) a minute"),
    ];

    private static readonly ImmutableArray<Unit> Acceleration = [Unit.Linear("m/s^2", 1, 1, "SI")];

    private static readonly ImmutableArray<Unit> Area =
    [
        Unit.Linear("m^2", 1, 1, "SI"),
        Unit.Decibel("dBsm", 0, "decibels over 1 m^2"),
        Unit.Linear("cm^2", 1, 1e4, Prefix),
    ];

    private static readonly ImmutableArray<Unit> Time =
    [
        Unit.Linear("s", 1, 1, "SI"),
        Unit.Linear("ms", 1, 1e3, Prefix),
        Unit.Linear("us", 1, 1e6, Prefix),
        Unit.Linear("ns", 1, 1e9, Prefix),
        Unit.Linear("min", 60, 1, "60 s"),
        Unit.Linear("h", 3600, 1, "3600 s"),
    ];

    private static readonly ImmutableArray<Unit> Temperature =
    [
        Unit.Linear("K", 1, 1, "SI"),
        Unit.Shifted("degC", 273.15, "degree Celsius: K less 273.15"),
    ];

    public static ImmutableArray<Unit> Of(Dimension dimension) => dimension switch
    {
        Dimension.Frequency => Frequency,
        Dimension.Power => Power,
        Dimension.Gain => Gain,
        Dimension.Ratio => Ratio,
        Dimension.Angle => Angle,
        Dimension.AngularRate => AngularRate,
        Dimension.Length => Length,
        Dimension.Speed => Speed,
        Dimension.Acceleration => Acceleration,
        Dimension.Area => Area,
        Dimension.Time => Time,
        Dimension.Temperature => Temperature,
        _ => throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "not a dimension"),
    };

    /// <summary>The unit with this symbol, or null.</summary>
    public static Unit? Find(Dimension dimension, string symbol) =>
        Of(dimension).FirstOrDefault(unit => string.Equals(unit.Symbol, symbol, StringComparison.Ordinal));

    /// <summary>"angular rate", as it stands in messages.</summary>
    public static string Words(Dimension dimension) => dimension switch
    {
        Dimension.AngularRate => "angular rate",
        Dimension.Ratio => "ratio in decibels",
#pragma warning disable CA1308 // For reading, not for comparing.
        _ => dimension.ToString().ToLowerInvariant(),
#pragma warning restore CA1308
    };

    /// <summary>"W, kW, MW, mW, dBW, dBm".</summary>
    public static string List(Dimension dimension) => string.Join(", ", Of(dimension).Select(unit => unit.Symbol));
}
