using System.Buffers.Binary;

namespace ScanSim.Display.Films;

/// <summary>Animated GIF with one palette; each frame holds only the rectangle that changed, and in it only the pixels that changed.</summary>
/// <remarks>Source of the layout: CompuServe, Graphics Interchange Format, Version 89a (1990); the looping extension is Netscape's (1995).</remarks>
internal sealed class GifEncoder : IFilmEncoder
{
    /// <summary>Frames shorter than two hundredths of a second are slowed down to a tenth by common viewers.</summary>
    public const int MostFramesPerSecond = 50;

    private const int DelayUnitsPerSecond = 100;

    private readonly Stream into;
    private readonly FilmPlan plan;
    private readonly GifPalette palette;

    public GifEncoder(Stream into, FilmPlan plan, GifPalette palette)
    {
        this.into = into;
        this.plan = plan;
        this.palette = palette;
        Span<byte> head = stackalloc byte[13];
        "GIF89a"u8.CopyTo(head);
        BinaryPrimitives.WriteUInt16LittleEndian(head[6..], (ushort)plan.Size.WidthPx);
        BinaryPrimitives.WriteUInt16LittleEndian(head[8..], (ushort)plan.Size.HeightPx);
        // One palette for all frames, of 256 colours with 8 bits each.
        head[10] = 0xF7;
        into.Write(head);
        into.Write(palette.Table);
        // Repeat for ever.
        into.Write([0x21, 0xFF, 11, .. "NETSCAPE2.0"u8, 3, 1, 0, 0, 0]);
    }

    public static void Check(FilmPlan plan)
    {
        if (plan.FramesPerSecond > MostFramesPerSecond)
        {
            throw new PictureException($"{plan.FramesPerSecond} frames a second do not go in a GIF: at most {MostFramesPerSecond}.");
        }
    }

    public ReadOnlyMemory<byte> Encode(int index, FrameBuffer frame, FrameBuffer? before)
    {
        var area = ChangedArea.Of(frame, before);
        var indices = Indices(frame, before, area);
        var encoded = new MemoryStream();
        Span<byte> head = stackalloc byte[8 + 10];
        // Leave the frame when the next comes (1 << 2); one colour of the palette is transparent (1).
        ReadOnlySpan<byte> control = [0x21, 0xF9, 4, (1 << 2) | 1];
        control.CopyTo(head);
        var hundredths = plan.ShownAt(index + 1, DelayUnitsPerSecond) - plan.ShownAt(index, DelayUnitsPerSecond);
        BinaryPrimitives.WriteUInt16LittleEndian(head[4..], (ushort)hundredths);
        head[6] = GifPalette.Transparent;
        head[8] = 0x2C;
        BinaryPrimitives.WriteUInt16LittleEndian(head[9..], (ushort)area.Left);
        BinaryPrimitives.WriteUInt16LittleEndian(head[11..], (ushort)area.Top);
        BinaryPrimitives.WriteUInt16LittleEndian(head[13..], (ushort)area.Width);
        BinaryPrimitives.WriteUInt16LittleEndian(head[15..], (ushort)area.Height);
        encoded.Write(head);
        LzwCompression.Write(indices, encoded);
        return encoded.GetBuffer().AsMemory(0, (int)encoded.Length);
    }

    public void Write(ReadOnlyMemory<byte> encoded) => into.Write(encoded.Span);

    public void Finish()
    {
        into.WriteByte(0x3B);
        into.Flush();
    }

    private byte[] Indices(FrameBuffer frame, FrameBuffer? before, ChangedArea area)
    {
        var indices = new byte[area.Width * area.Height];
        for (var y = 0; y < area.Height; y++)
        {
            var now = frame.Row(area.Top + y).Slice(area.Left, area.Width);
            var then = before is null ? default : before.Row(area.Top + y).Slice(area.Left, area.Width);
            var row = indices.AsSpan(y * area.Width, area.Width);
            for (var x = 0; x < row.Length; x++)
            {
                row[x] = before is null || (now[x] != then[x] && palette.IndexOf(now[x]) != palette.IndexOf(then[x]))
                    ? palette.IndexOf(now[x])
                    : GifPalette.Transparent;
            }
        }

        return indices;
    }
}
