namespace ScanSim.Physics.Draws;

/// <summary>Draws of the gamma distribution with scale 1.</summary>
/// <remarks>
/// Shape 1 to 4 and whole: −ln of a product of that many uniform numbers. Else G. Marsaglia and W. W. Tsang, A simple method
/// for generating gamma variables, ACM TOMS 26 (2000), pp. 363-372, with its power of a uniform number for shapes below 1.
/// </remarks>
internal static class GammaDraw
{
    /// <summary>Above this shape the rejection is quicker than a product of uniform numbers; measured.</summary>
    private const int LargestProductShape = 4;

    public static double Next(ref DrawStream stream, double shape)
    {
        if (!(shape >= 0.0 && shape < double.PositiveInfinity))
        {
            throw new ArgumentOutOfRangeException(nameof(shape), shape, "the shape of a gamma distribution is finite and at least 0");
        }

        if (shape <= LargestProductShape && shape == Math.Floor(shape))
        {
            return ByProduct(ref stream, (int)shape);
        }

        return shape < 1.0
            ? ByRejection(ref stream, shape + 1.0) * Math.Pow(stream.NextUniform(), 1.0 / shape)
            : ByRejection(ref stream, shape);
    }

    private static double ByProduct(ref DrawStream stream, int shape)
    {
        double product = 1.0;
        for (int i = 0; i < shape; i++)
        {
            product *= stream.NextUniform();
        }

        return shape == 0 ? 0.0 : -Math.Log(product);
    }

    private static double ByRejection(ref DrawStream stream, double shape)
    {
        double d = shape - 1.0 / 3.0;
        double c = 1.0 / Math.Sqrt(9.0 * d);
        while (true)
        {
            double x = stream.NextNormal();
            double root = 1.0 + c * x;
            if (root <= 0.0)
            {
                continue;
            }

            double v = root * root * root;
            double u = stream.NextUniform();
            double square = x * x;
            if (u < 1.0 - 0.0331 * square * square || Math.Log(u) < 0.5 * square + d * (1.0 - v + Math.Log(v)))
            {
                return d * v;
            }
        }
    }
}
