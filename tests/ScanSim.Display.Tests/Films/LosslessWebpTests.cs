using System.Buffers.Binary;
using ScanSim.Display.Films;
using SkiaSharp;

namespace ScanSim.Display.Tests.Films;

public sealed class LosslessWebpTests
{
    [Theory]
    [InlineData(1, 1)]
    [InlineData(2, 1)]
    [InlineData(1, 7)]
    [InlineData(3, 3)]
    [InlineData(640, 400)]
    public void One_colour_comes_back(int width, int height)
    {
        foreach (var colour in (uint[])[0xFF00_0000, 0xFFFF_FFFF, 0x80FF_0102, 0])
        {
            AssertComesBack([.. Enumerable.Repeat(colour, width * height)], width);
        }
    }

    [Fact]
    public void Noise_of_all_colours_comes_back()
    {
        var draws = new Random(7);
        AssertComesBack(Pixels(173 * 91, _ => 0xFF00_0000 | (uint)draws.Next(1 << 24)), 173);
    }

    [Fact]
    public void Alphabets_of_any_number_of_symbols_come_back()
    {
        var draws = new Random(8);
        for (var colours = 1; colours <= 40; colours++)
        {
            var palette = Pixels(colours, _ => 0xFF00_0000 | (uint)draws.Next(1 << 24));
            AssertComesBack(Pixels(61 * 37, _ => palette[draws.Next(colours)]), 61);
        }
    }

    [Fact]
    public void Colours_of_very_unequal_frequency_come_back()
    {
        // Counts that double with each symbol make the longest codes: unlimited they would have 20 bits.
        var draws = new Random(9);
        var pixels = new List<uint>();
        for (var level = 0; level < 20; level++)
        {
            for (var n = 0; n < 1 << level; n++)
            {
                // Other channels noisy, so that neither the cache nor a copy takes them.
                pixels.Add(0xFF00_0000 | (uint)draws.Next(256) << 16 | (uint)(level * 9) << 8 | (uint)draws.Next(256));
            }
        }

        pixels.RemoveRange(pixels.Count / 1000 * 1000, pixels.Count % 1000);
        var shuffled = pixels.ToArray();
        draws.Shuffle(shuffled);
        AssertComesBack(shuffled, 1000);
    }

    [Fact]
    public void Strokes_on_a_transparent_ground_come_back_and_take_little()
    {
        var draws = new Random(10);
        for (var repeat = 0; repeat < 40; repeat++)
        {
            var (width, height) = (draws.Next(1, 700), draws.Next(1, 500));
            var pixels = new uint[width * height];
            for (var stroke = draws.Next(12); stroke > 0; stroke--)
            {
                var colour = 0xFF00_0000 | (uint)draws.Next(1 << 24);
                var (at, step) = (draws.Next(pixels.Length), draws.Next(3) switch { 0 => 1, 1 => width, _ => width + 1 });
                for (var n = draws.Next(200); n > 0 && at < pixels.Length; n--, at += step)
                {
                    pixels[at] = colour;
                }
            }

            var bytes = AssertComesBack(pixels, width);
            Assert.True(bytes < 12 * 200 * 5 + 1200, $"{bytes} bytes");
        }
    }

    [Fact]
    public void Repeated_patterns_come_back_and_are_found()
    {
        var draws = new Random(11);
        var tile = Pixels(64 * 64, _ => 0xFF00_0000 | (uint)draws.Next(1 << 24));
        var pixels = Pixels(512 * 512, i => tile[i / 512 % 64 * 64 + i % 512 % 64]);
        // The tile itself cannot be made small; the 63 others are copies.
        Assert.True(AssertComesBack(pixels, 512) < 4 * 64 * 64 * 3 / 2);
    }

    [Fact]
    public void Length_of_codes_never_passes_the_limit_and_fills_the_code_space()
    {
        var draws = new Random(12);
        for (var repeat = 0; repeat < 200; repeat++)
        {
            var counts = Enumerable.Range(0, draws.Next(2, 19)).Select(i => draws.Next(4) == 0 && i > 1 ? 0 : 1 + (int)Math.Pow(2, draws.Next(30))).ToArray();
            var lengths = HuffmanLengths.Of(counts, 7);
            Assert.All(lengths.Zip(counts), pair => Assert.Equal(pair.Second > 0, pair.First is >= 1 and <= 7));
            Assert.Equal(1, lengths.Where(l => l > 0).Sum(l => Math.Pow(2, -l)));
        }
    }

    [Fact]
    public void Lengths_are_those_of_the_textbook()
    {
        // T. Cormen et al., Introduction to Algorithms, 3rd edition, figure 16.3: a 45, b 13, c 12, d 16, e 9, f 5.
        Assert.Equal([1, 3, 3, 3, 4, 4], HuffmanLengths.Of([45, 13, 12, 16, 9, 5], 15));
    }

    private static uint[] Pixels(int count, Func<int, uint> pixel) => [.. Enumerable.Range(0, count).Select(pixel)];

    private static int AssertComesBack(uint[] pixels, int width)
    {
        var image = LosslessWebp.Encode(pixels, width);
        var file = new byte[20 + image.Length + (image.Length & 1)];
        "RIFF"u8.CopyTo(file);
        BinaryPrimitives.WriteInt32LittleEndian(file.AsSpan(4), file.Length - 8);
        "WEBPVP8L"u8.CopyTo(file.AsSpan(8));
        BinaryPrimitives.WriteInt32LittleEndian(file.AsSpan(16), image.Length);
        image.CopyTo(file, 20);
        var info = new SKImageInfo(width, pixels.Length / width, SKColorType.Rgba8888, SKAlphaType.Unpremul);
        using var data = SKData.CreateCopy(file);
        using var codec = SKCodec.Create(data);
        Assert.NotNull(codec);
        Assert.Equal((info.Width, info.Height), (codec.Info.Width, codec.Info.Height));
        var read = new uint[pixels.Length];
        using var bitmap = new SKBitmap(info);
        Assert.Equal(SKCodecResult.Success, codec.GetPixels(info, bitmap.GetPixels()));
        System.Runtime.InteropServices.MemoryMarshal.Cast<byte, uint>(bitmap.GetPixelSpan()).CopyTo(read);
        Assert.Equal(pixels, read);
        return image.Length;
    }
}
