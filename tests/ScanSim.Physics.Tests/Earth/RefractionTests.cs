using ScanSim.Physics.Earth;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Earth;

public sealed class RefractionTests
{
    [Fact]
    public void The_effective_earth_factor_agrees_with_the_recommendation()
    {
        var comparison = new Comparison(
            "Effective-earth factor", "Recommendation ITU-R P.452-18, equation (5): k = 157/(157 − ΔN), whose 157 is a rounded 156.96", 0.0, 5e-4);
        foreach (double drop in new[] { -20.0, 0.0, 20.0, 39.25, 45.0, 70.0, 100.0 })
        {
            comparison.Add($"{drop} N-units per km", 157.0 / (157.0 - drop), Refraction.EffectiveEarthFactor(-drop));
        }

        comparison.Conclude();
        Assert.Equal(4.0 / 3.0, Refraction.EffectiveEarthFactor(-39.24), 2e-5);
        Assert.Equal(1.0, Refraction.EffectiveEarthFactor(0.0));
    }

    [Theory]
    [InlineData(-157.0)]
    [InlineData(-400.0)]
    public void A_duct_has_no_effective_earth(double gradientPerKm)
    {
        Assert.Contains("duct", Assert.Throws<ArgumentOutOfRangeException>(() => Refraction.EffectiveEarthFactor(gradientPerKm)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_gradient_has_an_unknown_factor() => Assert.Equal(double.NaN, Refraction.EffectiveEarthFactor(double.NaN));
}
