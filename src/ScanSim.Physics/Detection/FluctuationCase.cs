namespace ScanSim.Physics.Detection;

/// <summary>How the echo of a target fluctuates while it is in the beam: Swerling's four cases and the steady target.</summary>
/// <remarks>
/// Source: [Swerling1954]; the steady target is that of [Marcum1947]. The energy of n pulses is n·S·E with E ~ Gamma(K, 1/K);
/// K is given at each member. Some texts call the steady target case 0, others case 5.
/// </remarks>
public enum FluctuationCase
{
    /// <summary>No fluctuation (K → ∞).</summary>
    Steady = 0,

    /// <summary>Exponential power, one draw for all pulses of a scan (K = 1): many scatterers, slow.</summary>
    Case1 = 1,

    /// <summary>Exponential power, a new draw at each pulse (K = n): many scatterers, fast.</summary>
    Case2 = 2,

    /// <summary>Power density 4x/m²·exp(−2x/m), one draw for all pulses of a scan (K = 2): one dominant scatterer, slow.</summary>
    Case3 = 3,

    /// <summary>Power density 4x/m²·exp(−2x/m), a new draw at each pulse (K = 2n): one dominant scatterer, fast.</summary>
    Case4 = 4,
}
