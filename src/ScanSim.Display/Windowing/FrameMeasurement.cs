namespace ScanSim.Display.Windowing;

/// <summary>How long frames take, gathered by <see cref="WindowLoop"/> after the first second, in which code is still being compiled.</summary>
/// <param name="lengthS">Measured time.</param>
/// <param name="processorS">Processor time used by the process so far.</param>
public sealed class FrameMeasurement(double lengthS, Func<double> processorS)
{
    public const double WarmUpS = 1;

    private readonly List<double> workS = [];
    private double? openedS;
    private double? startS;
    private double startProcessorS;
    private double endS;
    private double endProcessorS;

    public bool IsComplete { get; private set; }

    public int Frames => workS.Count;

    /// <summary>Frames painted a second.</summary>
    public double RatePerS => Frames / (endS - startS ?? double.NaN);

    /// <summary>Of one core; all threads of the process together.</summary>
    public double ProcessorRatio => (endProcessorS - startProcessorS) / (endS - startS ?? double.NaN);

    /// <summary>Time from the frame's events to its pixels on the window, at this share of frames from the quickest; NaN without frames.</summary>
    public double WorkS(double quantileRatio)
    {
        if (workS.Count == 0)
        {
            return double.NaN;
        }

        var sorted = workS.Order().ToArray();
        return sorted[Math.Clamp((int)Math.Ceiling(quantileRatio * sorted.Length) - 1, 0, sorted.Length - 1)];
    }

    /// <summary>One round of the loop; <paramref name="frameWorkS"/> is null when it painted nothing.</summary>
    internal void Add(double nowS, double? frameWorkS)
    {
        openedS ??= nowS;
        if (nowS - openedS < WarmUpS || IsComplete)
        {
            return;
        }

        if (startS is not { } start)
        {
            startS = nowS;
            startProcessorS = processorS();
            return;
        }

        if (frameWorkS is { } work)
        {
            workS.Add(work);
        }

        if (nowS - start >= lengthS)
        {
            IsComplete = true;
            endS = nowS;
            endProcessorS = processorS();
        }
    }
}
