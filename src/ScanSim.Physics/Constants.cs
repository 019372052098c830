namespace ScanSim.Physics;

/// <summary>Constants of nature and of the trade, in SI units.</summary>
public static class Constants
{
    /// <summary>Speed of light in vacuum. Source: SI (BIPM, SI Brochure 9th ed., 2019), exact.</summary>
    public const double SpeedOfLightMps = 299_792_458.0;

    /// <summary>Boltzmann constant. Source: SI (BIPM, SI Brochure 9th ed., 2019), exact.</summary>
    public const double BoltzmannJPerK = 1.380649e-23;

    /// <summary>Standard noise temperature T0 of the definition of noise figure. Source: IEEE definition, 290 K.</summary>
    public const double StandardTemperatureK = 290.0;
}
