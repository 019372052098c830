namespace ScanSim.Physics.Detection;

/// <summary>The term x^a·e^(−x)/Γ(a+1) from which every sum of this folder is built, without cancellation for large a and x.</summary>
/// <remarks>
/// Source: [Loader2000], the "saddle-point expansion" of the Poisson density: log term = −D(a, x) − δ(a) − ½·log(2πa) with the
/// deviance D = a·log(a/x) + x − a and the error δ of Stirling's formula. Accuracy: the logarithm has an absolute error of about
/// 2⁻⁵²·(1 + |logarithm|), so the term has a relative error of 1e-13 at 1e-300.
/// </remarks>
internal static class PoissonTerm
{
    private const double SeriesFrom = 16;
    private static readonly double[] SmallWholeErrors = TabulateSmallWholeErrors();

    /// <summary>log of x^a·e^(−x)/Γ(a+1) for a ≥ 0, x ≥ 0.</summary>
    public static double Log(double a, double x)
    {
        if (a == 0)
        {
            return -x;
        }

        return x == 0
            ? double.NegativeInfinity
            : -Deviance(a, x) - StirlingError(a) - 0.5 * Math.Log(2 * Math.PI * a);
    }

    /// <summary>log(1 + x), accurate for small x. Source: [Goldberg1991] theorem 4; relative error below 5·2⁻⁵³.</summary>
    public static double LogOnePlus(double x)
    {
        var u = 1 + x;
        return u == 1 ? x : Math.Log(u) * (x / (u - 1));
    }

    /// <summary>a·log(a/x) + x − a, relative accuracy also where a is close to x.</summary>
    private static double Deviance(double a, double x)
    {
        var difference = a - x;
        if (Math.Abs(difference) >= 0.1 * (a + x))
        {
            return a * Math.Log(a / x) - difference;
        }

        // log(a/x) = 2·artanh(v), v = (a−x)/(a+x): the leading parts cancel on paper instead of in the computer.
        var v = difference / (a + x);
        var sum = difference * v;
        var power = 2 * a * v;
        for (var j = 3; ; j += 2)
        {
            power *= v * v;
            var next = sum + power / j;
            if (next == sum)
            {
                return sum;
            }

            sum = next;
        }
    }

    /// <summary>δ(a) = log Γ(a+1) − (a + ½)·log a + a − ½·log 2π; the series is [DLMF] 5.11.1, below 16 it is stepped down.</summary>
    private static double StirlingError(double a)
    {
        if (a >= SeriesFrom)
        {
            var inverseSquare = 1 / (a * a);
            return (1.0 / 12 - (1.0 / 360 - (1.0 / 1260 - (1.0 / 1680 - (1.0 / 1188 - 691.0 / 360360 * inverseSquare)
                * inverseSquare) * inverseSquare) * inverseSquare) * inverseSquare) / a;
        }

        return a == Math.Floor(a) ? SmallWholeErrors[(int)a] : StepDown(a);
    }

    private static double StepDown(double a)
    {
        var sum = 0.0;
        for (; a < SeriesFrom; a++)
        {
            sum += (a + 0.5) * LogOnePlus(1 / a) - 1;
        }

        return sum + StirlingError(a);
    }

    private static double[] TabulateSmallWholeErrors()
    {
        var errors = new double[(int)SeriesFrom];
        for (var a = 1; a < errors.Length; a++)
        {
            errors[a] = StepDown(a);
        }

        return errors;
    }
}
