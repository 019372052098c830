using System.Runtime.Intrinsics;

namespace ScanSim.Physics.Detection;

/// <summary>Saddle point of M(t)·exp(−t·T)/t on the real axis, and the integral along the parabola of steepest descent through it.</summary>
/// <remarks>
/// Each pulse is a sum of exponentials: M(t) = Π (1−t)^(s−1)/(1−c·t)^s, s = 1 (case 2) or 2 (case 4), c its mean. Below the mean of
/// the sum the negative saddle gives the probability of a miss, above it the positive one gives that of detection, so the result is the
/// smaller tail with relative accuracy. The parabola follows the path of steepest descent of M·exp(−tT) alone: bent after the pole at 0
/// as well, it would run to where M grows when there are many pulses. The trapezoidal rule converges geometrically because the poles next
/// to the saddle lie at least one width 1/√φ'' away ([TrefethenWeideman2014]); the step of 0.4 widths leaves exp(−2π/0.4) = 2e-7 of the part of a single pole, in practice 1e-9 of the tail.
/// </remarks>
internal readonly ref struct SaddlePoint
{
    private const double StepInWidths = 0.4;
    private const double Negligible = 1e-10;
    private const int BlockCap = 400;

    private readonly int stages;
    private readonly double threshold;
    private readonly double curvature;
    private readonly double bend;

    public SaddlePoint(ReadOnlySpan<double> means, int stages, double threshold)
    {
        this.stages = stages;
        this.threshold = threshold;
        double sum = 0, greatest = 0;
        foreach (var c in means)
        {
            sum += c;
            greatest = Math.Max(greatest, c);
        }

        var mean = stages == 1 ? sum : 2 * sum - means.Length;
        IsUpperTail = threshold > mean;
        (Location, curvature, bend) = Find(means, mean / means.Length, greatest);
    }

    /// <summary>True where the integral is the probability of detection, false where it is that of a miss.</summary>
    public bool IsUpperTail { get; }

    public double Location { get; }

    /// <summary>The tail probability. <paramref name="means"/> is used as scratch space.</summary>
    public double Integrate(Span<double> means)
    {
        var logPeak = -Location * threshold;
        var product = 1.0;
        for (var i = 0; i < means.Length; i++)
        {
            var factor = 1 - means[i] * Location;
            means[i] /= factor;
            product *= factor;
            if (product is < 1e-150 or > 1e150)
            {
                logPeak -= stages * Math.Log(product);
                product = 1;
            }
        }

        logPeak -= stages * Math.Log(product);
        if (stages == 2)
        {
            logPeak += means.Length * PoissonTerm.LogOnePlus(-Location);
        }

        var step = StepInWidths / Math.Sqrt(curvature);
        return Math.Exp(logPeak) / Math.Abs(Location) * (step / Math.PI) * HalfLine(means, step);
    }

    /// <summary>Σ over the upper half of the contour of the integrand over its value at the saddle, four nodes at a time.</summary>
    private double HalfLine(ReadOnlySpan<double> slopes, double step)
    {
        var sum = 0.5;
        var index = Vector256.Create(1.0, 2.0, 3.0, 4.0);
        for (var block = 0; block < BlockCap; block++)
        {
            var y = index * step;
            var terms = Nodes(slopes, y);
            sum += Vector256.Sum(terms);
            if (Vector256.LessThanAll(Vector256.Abs(terms), Vector256.Create(Negligible * sum)))
            {
                break;
            }

            index += Vector256.Create(4.0);
        }

        return sum;
    }

    /// <summary>Re[(dt/i dy)·exp(−wT)·M(t0+w)/M(t0)·t0/(t0+w)] at w = bend·y² + i·y; every factor of M is 1 − slope·w.</summary>
    private Vector256<double> Nodes(ReadOnlySpan<double> slopes, Vector256<double> y)
    {
        var real = y * y * bend;
        var (productReal, productImaginary) = Product(slopes, real, y);
        var (sin, cos) = Vector256.SinCos(y * threshold);
        var size = Vector256.Exp(real * -threshold);
        var turn = y * (2 * bend);
        var topReal = cos - turn * sin;
        var topImaginary = -(sin + turn * cos);
        if (stages == 2)
        {
            (productReal, productImaginary) = Times(productReal, productImaginary, productReal, productImaginary);
            var slope = 1 / (1 - Location);
            var (powerReal, powerImaginary) = Power(Vector256<double>.One - real * slope, y * -slope, slopes.Length);
            (topReal, topImaginary) = Times(topReal, topImaginary, powerReal, powerImaginary);
        }

        var inverse = 1 / Location;
        (productReal, productImaginary) = Times(productReal, productImaginary, Vector256<double>.One + real * inverse, y * inverse);
        return size * (topReal * productReal + topImaginary * productImaginary) / (productReal * productReal + productImaginary * productImaginary);
    }

    private static (Vector256<double> Real, Vector256<double> Imaginary) Product(ReadOnlySpan<double> slopes, Vector256<double> real, Vector256<double> imaginary)
    {
        var productReal = Vector256<double>.One;
        var productImaginary = Vector256<double>.Zero;
        foreach (var slope in slopes)
        {
            (productReal, productImaginary) = Times(productReal, productImaginary, Vector256<double>.One - real * slope, imaginary * -slope);
        }

        return (productReal, productImaginary);
    }

    private static (Vector256<double> Real, Vector256<double> Imaginary) Power(Vector256<double> real, Vector256<double> imaginary, int exponent)
    {
        var resultReal = Vector256<double>.One;
        var resultImaginary = Vector256<double>.Zero;
        for (; exponent > 0; exponent >>= 1)
        {
            if ((exponent & 1) == 1)
            {
                (resultReal, resultImaginary) = Times(resultReal, resultImaginary, real, imaginary);
            }

            (real, imaginary) = Times(real, imaginary, real, imaginary);
        }

        return (resultReal, resultImaginary);
    }

    private static (Vector256<double> Real, Vector256<double> Imaginary) Times(
        Vector256<double> aReal, Vector256<double> aImaginary, Vector256<double> bReal, Vector256<double> bImaginary) =>
        (aReal * bReal - aImaginary * bImaginary, aReal * bImaginary + aImaginary * bReal);

    /// <summary>Newton's method within a bracket on φ' = 0, φ = log M − tT − log|t|; a twentieth of the width is close enough for the contour.</summary>
    private (double Location, double Curvature, double Bend) Find(ReadOnlySpan<double> means, double mean, double greatest)
    {
        double low = IsUpperTail ? 0 : double.NegativeInfinity, high = IsUpperTail ? 1 / greatest : 0;
        var t = EqualPulses(means.Length, mean);
        for (var i = 0; i < 200; i++)
        {
            if (!(t > low && t < high))
            {
                t = double.IsInfinity(low) ? 2 * t : 0.5 * (low + high);
            }

            var (first, second, turn) = Derivatives(means, t);
            var move = -first / second;
            if (!(Math.Abs(move) * Math.Sqrt(second) > 0.05))
            {
                return (t, second, turn);
            }

            (low, high) = first < 0 ? (t, high) : (low, t);
            t += move;
        }

        throw new ArithmeticException($"The saddle point for threshold {threshold:R} did not settle; the last one was {t:R}.");
    }

    /// <summary>The saddle of n equal exponentials of mean c: T·c·t² + ((n+1)·c − T)·t − 1 = 0.</summary>
    private double EqualPulses(int pulses, double mean)
    {
        var linear = (pulses + 1) * mean - threshold;
        var root = Math.Sqrt(linear * linear + 4 * threshold * mean);
        return IsUpperTail ? 2 / (linear + root) : -(linear + root) / (2 * threshold * mean);
    }

    private (double First, double Second, double Bend) Derivatives(ReadOnlySpan<double> means, double t)
    {
        double first = 0, second = 0, third = 0;
        foreach (var c in means)
        {
            var d = c / (1 - c * t);
            first += d;
            second += d * d;
            third += d * d * d;
        }

        var inverse = 1 / t;
        var noise = (stages - 1) * means.Length;
        var e = 1 / (1 - t);
        first = stages * first - noise * e;
        second = stages * second - noise * e * e;
        third = 2 * (stages * third - noise * e * e * e);
        return (first - threshold - inverse, second + inverse * inverse, third / (6 * second));
    }
}
