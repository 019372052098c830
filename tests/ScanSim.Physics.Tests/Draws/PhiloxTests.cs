using System.Globalization;
using ScanSim.Physics.Draws;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Draws;

public sealed class PhiloxTests
{
    [Fact]
    public void The_published_answers_come_out_bit_for_bit()
    {
        var table = ReferenceTable.Load("philox_known_answers.csv");
        var comparison = new Comparison("Philox 4x32-10 known answers", table.Source, 0.0, 0.0);
        foreach (string[] row in table.Rows)
        {
            uint Hex(string column) => uint.Parse(table.Text(row, column), NumberStyles.HexNumber, CultureInfo.InvariantCulture);
            PhiloxBlock block = Philox.Block(Hex("c0"), Hex("c1"), Hex("c2"), Hex("c3"), Hex("k0"), Hex("k1"));
            uint[] words = [block.Word0, block.Word1, block.Word2, block.Word3];
            for (int i = 0; i < words.Length; i++)
            {
                comparison.Add($"counter {table.Text(row, "c0")}, word {i}", Hex($"r{i}"), words[i]);
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void A_changed_bit_of_counter_or_key_changes_about_half_of_the_answer()
    {
        PhiloxBlock first = Philox.Block(1, 2, 3, 4, 5, 6);
        for (int bit = 0; bit < 192; bit++)
        {
            uint[] w = [1, 2, 3, 4, 5, 6];
            w[bit / 32] ^= 1u << (bit % 32);
            PhiloxBlock other = Philox.Block(w[0], w[1], w[2], w[3], w[4], w[5]);
            int changed = System.Numerics.BitOperations.PopCount(first.Word0 ^ other.Word0) + System.Numerics.BitOperations.PopCount(first.Word1 ^ other.Word1)
                + System.Numerics.BitOperations.PopCount(first.Word2 ^ other.Word2) + System.Numerics.BitOperations.PopCount(first.Word3 ^ other.Word3);

            // Binomial(128, 1/2): 64 ± 5.3 standard deviations of 5.66; chance below 1e-7 a bit.
            Assert.InRange(changed, 34, 94);
        }
    }
}
