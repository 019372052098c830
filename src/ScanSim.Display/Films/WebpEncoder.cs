using System.Buffers.Binary;

namespace ScanSim.Display.Films;

/// <summary>Animated WebP: each frame lossless, holding only the pixels that changed; the others are transparent and show the frame before.</summary>
/// <remarks>Source of the layout: RFC 9649, WebP Image Format (2024), section 2.7, chunks VP8X, ANIM and ANMF.</remarks>
internal sealed class WebpEncoder : IFilmEncoder
{
    private const uint Opaque = 0xFF00_0000;
    private const int RiffHeaderBytes = 8;
    private const int FrameHeaderBytes = 16;

    /// <summary>The animation flag and the alpha flag of the VP8X chunk.</summary>
    private const byte AnimationWithAlpha = 0x02 | 0x10;

    private readonly Stream into;
    private readonly FilmPlan plan;

    public WebpEncoder(Stream into, FilmPlan plan)
    {
        this.into = into;
        this.plan = plan;
        Span<byte> head = stackalloc byte[12 + 18 + 14];
        "RIFF"u8.CopyTo(head);
        "WEBPVP8X"u8.CopyTo(head[8..]);
        BinaryPrimitives.WriteUInt32LittleEndian(head[16..], 10);
        head[20] = AnimationWithAlpha;
        WriteUInt24(head[24..], plan.Size.WidthPx - 1);
        WriteUInt24(head[27..], plan.Size.HeightPx - 1);
        "ANIM"u8.CopyTo(head[30..]);
        // Background opaque black, and a loop count of 0: for ever.
        BinaryPrimitives.WriteUInt32LittleEndian(head[34..], 6);
        BinaryPrimitives.WriteUInt32LittleEndian(head[38..], Opaque);
        into.Write(head);
    }

    public ReadOnlyMemory<byte> Encode(int index, FrameBuffer frame, FrameBuffer? before)
    {
        var area = ChangedArea.Of(frame, before).FromEven();
        var pixels = new uint[area.Width * area.Height];
        CopyChanged(frame, before, area, pixels);
        var image = LosslessWebp.Encode(pixels, area.Width);
        var length = FrameHeaderBytes + RiffHeaderBytes + image.Length + (image.Length & 1);
        var chunk = new byte[RiffHeaderBytes + length];
        "ANMF"u8.CopyTo(chunk);
        BinaryPrimitives.WriteInt32LittleEndian(chunk.AsSpan(4), length);
        var head = chunk.AsSpan(RiffHeaderBytes, FrameHeaderBytes);
        WriteUInt24(head, area.Left / 2);
        WriteUInt24(head[3..], area.Top / 2);
        WriteUInt24(head[6..], area.Width - 1);
        WriteUInt24(head[9..], area.Height - 1);
        WriteUInt24(head[12..], plan.ShownAt(index + 1, 1000) - plan.ShownAt(index, 1000));
        // The last byte stays 0: blend over what is there, and leave it when the next frame comes.
        var still = chunk.AsSpan(RiffHeaderBytes + FrameHeaderBytes);
        "VP8L"u8.CopyTo(still);
        BinaryPrimitives.WriteInt32LittleEndian(still[4..], image.Length);
        image.CopyTo(still[RiffHeaderBytes..]);
        return chunk;
    }

    public void Write(ReadOnlyMemory<byte> encoded)
    {
        if (into.Position + encoded.Length > uint.MaxValue - 1)
        {
            throw new PictureException("The film would be larger than the 4 GiB that a WebP file can hold: make it shorter or smaller, or ask for an .mp4.");
        }

        into.Write(encoded.Span);
    }

    public void Finish()
    {
        Span<byte> length = stackalloc byte[4];
        BinaryPrimitives.WriteUInt32LittleEndian(length, (uint)(into.Length - RiffHeaderBytes));
        into.Position = 4;
        into.Write(length);
        into.Flush();
    }

    private static void CopyChanged(FrameBuffer frame, FrameBuffer? before, ChangedArea area, Span<uint> target)
    {
        for (var y = 0; y < area.Height; y++)
        {
            var now = frame.Row(area.Top + y).Slice(area.Left, area.Width);
            var row = target.Slice(y * area.Width, area.Width);
            if (before is null)
            {
                now.CopyTo(row);
                continue;
            }

            var then = before.Row(area.Top + y).Slice(area.Left, area.Width);
            for (var x = 0; x < row.Length; x++)
            {
                row[x] = now[x] == then[x] ? 0 : now[x] | Opaque;
            }
        }
    }

    private static void WriteUInt24(Span<byte> target, int value)
    {
        target[0] = (byte)value;
        target[1] = (byte)(value >> 8);
        target[2] = (byte)(value >> 16);
    }
}
