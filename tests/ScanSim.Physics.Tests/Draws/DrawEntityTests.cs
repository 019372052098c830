using ScanSim.Physics.Draws;

namespace ScanSim.Physics.Tests.Draws;

public sealed class DrawEntityTests
{
    /// <summary>Test vectors of draft-eastlake-fnv, appendix (from memory).</summary>
    [Theory]
    [InlineData("", 0x811C9DC5)]
    [InlineData("a", 0xE40C292C)]
    [InlineData("foobar", 0xBF9CF968)]
    public void Names_have_their_published_hash(string id, uint hash) => Assert.Equal(hash, DrawEntity.Of(id));

    [Fact]
    public void Names_beyond_ASCII_are_hashed_as_UTF_8()
    {
        // "é" is C3 A9.
        uint hash = unchecked((((2166136261u ^ 0xC3u) * 16777619u) ^ 0xA9u) * 16777619u);
        Assert.Equal(hash, DrawEntity.Of("é"));
    }

    /// <summary>The name's hash is 0 (found by trying all names of eight small letters).</summary>
    [Fact]
    public void No_name_gets_the_number_of_the_radar() => Assert.Equal(1u, DrawEntity.Of("akguxgwa"));
}
