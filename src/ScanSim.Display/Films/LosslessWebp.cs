using System.Numerics;

namespace ScanSim.Display.Films;

/// <summary>Pixels as a lossless WebP bit stream, made for frames of which little changed: long runs of one colour cost next to nothing.</summary>
/// <remarks>
/// Source of the format: RFC 9649, WebP Image Format (2024), section 3. Used of it: the subtract-green transform, the colour cache and
/// backward references. Skia's own encoder is set to its quickest method, which took 130 kB in place of 7 for such a frame (docs/film.md).
/// </remarks>
internal sealed class LosslessWebp
{
    private const int CacheBits = 10;
    private const int LengthCodes = 24;
    private const int DistanceCodes = 40;
    private const int FirstCacheSymbol = 256 + LengthCodes;

    /// <summary>Longest copy that one reference may name.</summary>
    private const int LongestCopy = 4096;

    /// <summary>Shorter copies cost more than their pixels out of the colour cache.</summary>
    private const int ShortestCopy = 3;

    /// <summary>Codes of distances up to this are for neighbours in the plane; a distance along the scan line is added to it.</summary>
    private const int PlaneCodes = 120;

    private const int PlaneCodeAbove = 1;
    private const int PlaneCodeLeft = 2;

    private const int HashBits = 14;

    private readonly uint[] pixels;
    private readonly int width;
    private readonly List<Token> tokens = [];
    private readonly uint[] cache = new uint[1 << CacheBits];
    private readonly int[] lastSeen = new int[1 << HashBits];
    private readonly int[] green = new int[FirstCacheSymbol + (1 << CacheBits)];
    private readonly int[] red = new int[256];
    private readonly int[] blue = new int[256];
    private readonly int[] alpha = new int[256];
    private readonly int[] distance = new int[DistanceCodes];

    private LosslessWebp(ReadOnlySpan<uint> rgba, int width)
    {
        this.width = width;
        pixels = new uint[rgba.Length];
        for (var i = 0; i < pixels.Length; i++)
        {
            pixels[i] = WithoutGreen(rgba[i]);
        }

        Array.Fill(lastSeen, -1);
    }

    /// <summary>The contents of a VP8L chunk.</summary>
    /// <param name="rgba">Row by row, red in the lowest byte, not multiplied by alpha.</param>
    /// <param name="width">1 to 16384; the number of pixels must be a multiple of it.</param>
    public static byte[] Encode(ReadOnlySpan<uint> rgba, int width)
    {
        var image = new LosslessWebp(rgba, width);
        image.FindTokens();
        return image.ToBytes();
    }

    private void FindTokens()
    {
        // The first pixel as it is, so that each alphabet has a symbol.
        AddLiteral(pixels[0]);
        Remember(0, 1);
        for (var at = 1; at < pixels.Length;)
        {
            var (length, planeCode) = LongestMatch(at);
            if (length >= ShortestCopy)
            {
                AddCopy(length, planeCode);
            }
            else
            {
                length = 1;
                AddPixel(pixels[at]);
            }

            Remember(at, length);
            at += length;
        }
    }

    /// <summary>Tries the pixel to the left, the one above, and where these three pixels were last seen.</summary>
    private (int Length, int PlaneCode) LongestMatch(int at)
    {
        var best = (Length: MatchLength(at, 1), PlaneCode: PlaneCodeLeft);
        if (at >= width && best.Length < LongestCopy)
        {
            Improve(ref best, at, width, PlaneCodeAbove);
        }

        if (at + ShortestCopy <= pixels.Length && lastSeen[Hash(at)] is >= 0 and var seen && best.Length < LongestCopy)
        {
            Improve(ref best, at, at - seen, PlaneCodes + at - seen);
        }

        return best;
    }

    private void Improve(ref (int Length, int PlaneCode) best, int at, int distanceBack, int planeCode)
    {
        var length = MatchLength(at, distanceBack);
        if (length > best.Length)
        {
            best = (length, planeCode);
        }
    }

    private int MatchLength(int at, int distanceBack)
    {
        var most = Math.Min(LongestCopy, pixels.Length - at);
        return pixels.AsSpan(at, most).CommonPrefixLength(pixels.AsSpan(at - distanceBack, most));
    }

    private void Remember(int from, int length)
    {
        for (var at = from; at < from + length; at++)
        {
            cache[CacheSlot(pixels[at])] = pixels[at];
            if (at + ShortestCopy <= pixels.Length)
            {
                lastSeen[Hash(at)] = at;
            }
        }
    }

    private void AddPixel(uint argb)
    {
        var slot = CacheSlot(argb);
        if (cache[slot] == argb)
        {
            green[FirstCacheSymbol + slot]++;
            tokens.Add(new Token(TokenKind.Cached, (uint)slot, 0));
        }
        else
        {
            AddLiteral(argb);
        }
    }

    private void AddLiteral(uint argb)
    {
        green[argb >> 8 & 0xFF]++;
        red[argb >> 16 & 0xFF]++;
        blue[argb & 0xFF]++;
        alpha[argb >> 24]++;
        tokens.Add(new Token(TokenKind.Literal, argb, 0));
    }

    private void AddCopy(int length, int planeCode)
    {
        green[256 + Prefix.Of(length).Symbol]++;
        distance[Prefix.Of(planeCode).Symbol]++;
        tokens.Add(new Token(TokenKind.Copy, (uint)length, planeCode));
    }

    private byte[] ToBytes()
    {
        var bits = new BitWriter();
        bits.Write(0x2F, 8);
        bits.Write((uint)width - 1, 14);
        bits.Write((uint)(pixels.Length / width) - 1, 14);
        // Alpha is used; version 0.
        bits.Write(1, 1);
        bits.Write(0, 3);
        // One transform, subtract green (2), and no more.
        bits.Write(1, 1);
        bits.Write(2, 2);
        bits.Write(0, 1);
        // A colour cache, and one group of prefix codes for the whole picture.
        bits.Write(1, 1);
        bits.Write(CacheBits, 4);
        bits.Write(0, 1);
        PrefixCode[] codes = [new(green), new(red), new(blue), new(alpha), new(distance)];
        foreach (var code in codes)
        {
            code.WriteTo(bits);
        }

        foreach (var token in tokens)
        {
            Write(token, codes, bits);
        }

        return bits.ToBytes();
    }

    private static void Write(Token token, PrefixCode[] codes, BitWriter bits)
    {
        switch (token.Kind)
        {
            case TokenKind.Literal:
                codes[0].Emit((int)(token.Value >> 8 & 0xFF), bits);
                codes[1].Emit((int)(token.Value >> 16 & 0xFF), bits);
                codes[2].Emit((int)(token.Value & 0xFF), bits);
                codes[3].Emit((int)(token.Value >> 24), bits);
                break;
            case TokenKind.Cached:
                codes[0].Emit(FirstCacheSymbol + (int)token.Value, bits);
                break;
            default:
                var length = Prefix.Of((int)token.Value);
                codes[0].Emit(256 + length.Symbol, bits);
                bits.Write((uint)length.Extra, length.ExtraBits);
                var back = Prefix.Of(token.PlaneCode);
                codes[4].Emit(back.Symbol, bits);
                bits.Write((uint)back.Extra, back.ExtraBits);
                break;
        }
    }

    /// <summary>From red-lowest to alpha, red, green, blue; red and blue less green.</summary>
    private static uint WithoutGreen(uint rgba)
    {
        var g = rgba >> 8 & 0xFF;
        var r = (rgba - g) & 0xFF;
        var b = ((rgba >> 16) - g) & 0xFF;
        return (rgba & 0xFF00_0000) | r << 16 | g << 8 | b;
    }

    private static int CacheSlot(uint argb) => (int)(0x1E35_A7BDu * argb >> (32 - CacheBits));

    private int Hash(int at)
    {
        // Any odd multipliers without pattern go: the golden ratio's (Knuth, vol. 3, section 6.4) and the colour cache's.
        var mixed = pixels[at] * 2654435769u + pixels[at + 1] * 0x1E35_A7BDu + BitOperations.RotateLeft(pixels[at + 2] * 2654435769u, 15);
        return (int)(mixed >> (32 - HashBits));
    }

    private enum TokenKind
    {
        Literal = 0,
        Cached = 1,
        Copy = 2,
    }

    private readonly record struct Token(TokenKind Kind, uint Value, int PlaneCode);

    /// <summary>A length or distance from 1 on as a symbol and the bits that follow it.</summary>
    private readonly record struct Prefix(int Symbol, int Extra, int ExtraBits)
    {
        public static Prefix Of(int value)
        {
            var v = value - 1;
            if (v < 4)
            {
                return new Prefix(v, 0, 0);
            }

            var highest = BitOperations.Log2((uint)v);
            var extraBits = highest - 1;
            return new Prefix(2 * highest + (v >> extraBits & 1), v & ((1 << extraBits) - 1), extraBits);
        }
    }
}
