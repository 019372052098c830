namespace ScanSim.Physics.Draws;

/// <summary>Four words that one counter gives.</summary>
public readonly record struct PhiloxBlock(uint Word0, uint Word1, uint Word2, uint Word3);
