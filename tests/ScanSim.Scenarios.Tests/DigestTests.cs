using System.Security.Cryptography;
using System.Text;

namespace ScanSim.Scenarios.Tests;

public sealed class DigestTests
{
    /// <summary>RFC 8785, section 3.2.2 (the example of the document; its numbers and its escapes).</summary>
    [Fact]
    public void The_example_of_RFC_8785_has_its_published_canonical_form()
    {
        const string Written = """
            {
              "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
              "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
              "literals": [null, true, false]
            }
            """;
        const string Canonical = """{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}""";
        Assert.Equal(Canonical, ScenarioDigest.Canonical(Written, "rfc"));
    }

    /// <summary>RFC 8785, section 3.2.3: names sort by UTF-16 code units.</summary>
    [Fact]
    public void Names_are_sorted_as_RFC_8785_sorts_them()
    {
        const string Written = """{"\u20ac":1,"\r":2,"\ufb33":3,"1":4,"\ud83d\ude00":5,"\u0080":6,"\u00f6":7}""";
        Assert.Equal("{\"\\r\":2,\"1\":4,\"\u0080\":6,\"ö\":7,\"€\":1,\"\U0001F600\":5,\"\uFB33\":3}", ScenarioDigest.Canonical(Written, "rfc"));
    }

    /// <summary>RFC 8785, appendix B: doubles and their texts.</summary>
    [Theory]
    [InlineData("-0", "0")]
    [InlineData("5e-324", "5e-324")]
    [InlineData("1.7976931348623157e308", "1.7976931348623157e+308")]
    [InlineData("9007199254740992", "9007199254740992")]
    [InlineData("295147905179352830000", "295147905179352830000")]
    [InlineData("9.999999999999997e22", "9.999999999999997e+22")]
    [InlineData("1e23", "1e+23")]
    [InlineData("1.0000000000000001e23", "1.0000000000000001e+23")]
    [InlineData("999999999999999700000.0", "999999999999999700000")]
    [InlineData("1e21", "1e+21")]
    [InlineData("9.999999999999997e-7", "9.999999999999997e-7")]
    [InlineData("0.000001", "0.000001")]
    [InlineData("333333333.33333325", "333333333.33333325")]
    [InlineData("1424953923781206.2", "1424953923781206.2")]
    [InlineData("1.0", "1")]
    [InlineData("-12.50", "-12.5")]
    public void Numbers_have_the_form_of_RFC_8785(string written, string canonical) => Assert.Equal(canonical, ScenarioDigest.Canonical(written, "rfc"));

    [Fact]
    public void Comments_white_space_and_key_order_do_not_change_the_digest()
    {
        var plain = ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File).Digest;
        var other = SmallScenario.Text.Replace("\n", " /* x */ \n\n", StringComparison.Ordinal)
            .Replace("\"noiseFigure\": \"3 dB\", \"lineLoss\": \"1 dB\"", "\"lineLoss\":\"1 dB\",\"noiseFigure\":\"3 dB\",", StringComparison.Ordinal);
        Assert.Equal(plain, ScenarioFile.Parse(other, "other.json").Digest);
        Assert.Equal(plain, ScenarioDigest.Of(other, "other.json"));
    }

    [Fact]
    public void The_digest_is_the_SHA_256_of_the_canonical_text()
    {
        var canonical = ScenarioDigest.Canonical(SmallScenario.Text, SmallScenario.File);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(canonical))), ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File).Digest);
    }

    [Theory]
    [InlineData("\"seed\": 7", "\"seed\": 8")]
    [InlineData("\"seed\": 7", "\"seed\": 18446744073709551615")]
    [InlineData("\"10 kW\"", "\"11 kW\"")]
    [InlineData("\"class\": \"boat\"", "\"class\": \"Boat\"")]
    public void Every_change_of_a_value_changes_the_digest(string right, string wrong) =>
        Assert.False(string.Equals(
            ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File).Digest,
            ScenarioFile.Parse(SmallScenario.With(right, wrong), SmallScenario.File).Digest,
            StringComparison.Ordinal));

    [Fact]
    public void Two_great_seeds_that_are_the_same_double_have_two_digests() =>
        Assert.False(string.Equals(ScenarioDigest.Of("18446744073709551615", "a"), ScenarioDigest.Of("18446744073709551614", "b"), StringComparison.Ordinal));

    [Fact]
    public void A_text_that_is_not_JSON_has_no_digest() =>
        Assert.Throws<ScenarioException>(() => ScenarioDigest.Of("{", "x"));
}
