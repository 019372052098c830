namespace ScanSim.Physics.Antennas;

/// <summary>Field over a rectangular aperture: constant, cos or cos² falling to zero at the edges.</summary>
public enum ApertureTaper
{
    Uniform,
    Cosine,
    CosineSquared,
}
