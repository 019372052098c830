using ScanSim.Physics.Earth;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Earth;

public sealed class Wgs84Tests
{
    [Fact]
    public void Derived_constants_have_their_published_values()
    {
        var comparison = new Comparison("WGS-84 derived constants", "NIMA TR8350.2, 3rd ed., tables 3.1 and 3.3 (printed to 0.1 mm)", 5.1e-5, 0.0, "m");
        comparison.Add("semi-minor axis", 6_356_752.3142, Wgs84.SemiMinorAxisM);
        comparison.Add("polar radius of curvature", 6_399_593.6258, EarthRadius.GaussianMeanM(0.5 * Math.PI));
        comparison.Conclude();
        Assert.Equal(6.69437999014e-3, Wgs84.EccentricitySquared, 5e-15);
    }

    /// <summary>Second route: from the curvatures of meridian and prime vertical.</summary>
    [Fact]
    public void The_Gaussian_radius_is_the_geometric_mean_of_the_two_curvatures()
    {
        for (double latitude = -1.5; latitude <= 1.5; latitude += 0.1)
        {
            double w = Math.Sqrt(1.0 - Wgs84.EccentricitySquared * Math.Pow(Math.Sin(latitude), 2));
            double primeVerticalM = Wgs84.SemiMajorAxisM / w;
            double meridianM = Wgs84.SemiMajorAxisM * (1.0 - Wgs84.EccentricitySquared) / (w * w * w);
            Assert.Equal(Math.Sqrt(meridianM * primeVerticalM), EarthRadius.GaussianMeanM(latitude), 1e-8);
        }
    }
}
