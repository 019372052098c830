using ScanSim.Physics.Draws;

namespace ScanSim.Physics.Tests.Draws;

public sealed class DrawStreamTests
{
    private static readonly DrawAddress Address = new(0xAB, 0xDEADBEEF, 7, 123_456);

    /// <summary>The layout is format: recordings of old runs are only reproduced while it stays.</summary>
    [Fact]
    public void Words_are_the_blocks_of_the_documented_counter_in_order()
    {
        var stream = new DrawStream(0x0123456789ABCDEF, Address);
        for (uint block = 0; block < 9; block++)
        {
            PhiloxBlock expected = Philox.Block(0xAB000000 + block, 0xDEADBEEF, 7, 123_456, 0x89ABCDEF, 0x01234567);
            Assert.Equal(expected, new PhiloxBlock(stream.NextUInt32(), stream.NextUInt32(), stream.NextUInt32(), stream.NextUInt32()));
        }
    }

    [Fact]
    public void Uniform_numbers_are_midpoints_made_of_the_next_two_words()
    {
        foreach (int skipped in new[] { 0, 1, 7 })
        {
            var words = new DrawStream(42, Address);
            var uniforms = new DrawStream(42, Address);
            for (int i = 0; i < skipped; i++)
            {
                Assert.Equal(words.NextUInt32(), uniforms.NextUInt32());
            }

            for (int i = 0; i < 40; i++)
            {
                ulong bits = ((ulong)words.NextUInt32() << 32) | words.NextUInt32();
                Assert.Equal(((bits >> 12) + 0.5) / 4503599627370496.0, uniforms.NextUniform());
            }
        }
    }

    [Fact]
    public void The_same_address_repeats_and_any_other_differs()
    {
        DrawAddress[] others =
        [
            Address with { Purpose = 0xAC },
            Address with { Entity = 1 },
            Address with { Run = 8 },
            Address with { Index = 123_457 },
        ];
        Assert.Equal(First(1, Address), First(1, Address));
        Assert.NotEqual(First(1, Address), First(2, Address));
        Assert.NotEqual(First(1, Address), First(1UL << 32, Address));
        Assert.All(others, other => Assert.NotEqual(First(1, Address), First(1, other)));
        Assert.Equal(First(0, default), default(DrawStream).NextUInt32());
    }

    [Fact]
    public void A_copy_repeats_what_follows()
    {
        var stream = new DrawStream(3, Address);
        stream.NextNormal();
        DrawStream copy = stream;
        Assert.Equal(stream.NextNormal(), copy.NextNormal());
        Assert.Equal(stream.NextGamma(7.5), copy.NextGamma(7.5));
        Assert.Equal(stream.NextPoisson(33.0), copy.NextPoisson(33.0));
    }

    [Fact]
    public void Shapes_and_means_at_the_edges()
    {
        var stream = new DrawStream(3, Address);
        Assert.Equal(0.0, stream.NextGamma(0.0));
        Assert.Equal(0, stream.NextPoisson(0.0));
        Assert.True(stream.NextGamma(1e-300) >= 0.0);
        Assert.Equal(0, stream.NextPoisson(1e-300));
    }

    [Theory]
    [InlineData(-1e-9)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Impossible_shapes_and_means_are_refused(double value)
    {
        var stream = new DrawStream(3, Address);
        Assert.Throws<ArgumentOutOfRangeException>(() => stream.NextGamma(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => stream.NextPoisson(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => stream.NextPoisson(2e9));
    }

    [Fact(Explicit = true)]
    [Trait("Category", "Long")]
    public void A_used_up_address_says_so_instead_of_running_into_another_purpose()
    {
        var stream = new DrawStream(3, Address);
        for (int i = 0; i < 1 << 26; i++)
        {
            stream.NextUInt32();
        }

        Assert.Contains("all are used", Assert.Throws<InvalidOperationException>(() => stream.NextUInt32()).Message, StringComparison.Ordinal);
    }

    private static uint First(ulong seed, DrawAddress address) => new DrawStream(seed, address).NextUInt32();
}
