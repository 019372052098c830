namespace ScanSim.Display.Films;

/// <summary>The smallest rectangle that holds every pixel in which two frames differ.</summary>
/// <remarks>default(ChangedArea) is no area.</remarks>
internal readonly record struct ChangedArea(int Left, int Top, int Width, int Height)
{
    /// <summary>Everything when there is no frame before; one pixel when nothing changed, as a frame must have some.</summary>
    public static ChangedArea Of(FrameBuffer frame, FrameBuffer? before)
    {
        if (before is null)
        {
            return new ChangedArea(0, 0, frame.Size.WidthPx, frame.Size.HeightPx);
        }

        var (left, top, right, bottom) = (int.MaxValue, int.MaxValue, -1, -1);
        for (var y = 0; y < frame.Size.HeightPx; y++)
        {
            var now = frame.Row(y);
            var then = before.Row(y);
            var same = now.CommonPrefixLength(then);
            if (same == now.Length)
            {
                continue;
            }

            left = Math.Min(left, same);
            top = Math.Min(top, y);
            bottom = y;
            var last = now.Length - 1;
            while (last > right && now[last] == then[last])
            {
                last--;
            }

            right = Math.Max(right, last);
        }

        return right < 0 ? new ChangedArea(0, 0, 1, 1) : new ChangedArea(left, top, right - left + 1, bottom - top + 1);
    }

    /// <summary>Grown to the left and upwards until it begins at even pixels.</summary>
    public ChangedArea FromEven() => new(Left & ~1, Top & ~1, Width + (Left & 1), Height + (Top & 1));
}
