using System.Text;

namespace ScanSim.Scenarios.Tests;

public sealed class LoadTests : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("scansim-scenarios-");

    public void Dispose() => folder.Delete(recursive: true);

    [Fact]
    public void A_file_with_a_byte_order_mark_is_read()
    {
        var scenario = ScenarioFile.Load(Write([0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(SmallScenario.Text)]));
        Assert.Equal("Small", scenario.Name);
        Assert.Equal(SmallScenario.Text, scenario.SourceText);
    }

    [Fact]
    public void A_missing_file_is_told() => Expect(Path.Combine(folder.FullName, "none.json"), "no such file");

    [Fact]
    public void A_missing_folder_is_told() => Expect(Path.Combine(folder.FullName, "none", "none.json"), "no such file");

    [Fact]
    public void A_folder_in_place_of_a_file_is_told() => Expect(folder.FullName, "a folder");

    [Fact]
    public void An_empty_path_is_told() => Expect("", "no such file");

    [Fact]
    public void A_path_that_no_system_allows_is_told() => Expect("a\0b", "no such file");

    [Fact]
    public void A_file_in_UTF_16_is_told() => Expect(Write([0xFF, 0xFE, .. Encoding.Unicode.GetBytes(SmallScenario.Text)]), "a file in UTF-16");

    [Fact]
    public void A_byte_that_is_not_UTF_8_is_told_with_its_place() => Expect(Write([0x7B, 0x22, 0xE9, 0x22]), "a byte that is not UTF-8 (0xE9 at byte 2)");

    [Fact]
    public void A_file_beyond_all_measure_is_told()
    {
        var path = Path.Combine(folder.FullName, "great.json");
        using (var stream = File.Create(path))
        {
            stream.SetLength((64L << 20) + 1);
        }

        Expect(path, "a file of more than 64 MB");
    }

    private static void Expect(string path, string read)
    {
        var fault = Assert.Single(Assert.Throws<ScenarioException>(() => ScenarioFile.Load(path)).Faults);
        Assert.Equal(read, fault.Read);
        Assert.Equal(path, fault.File);
        Assert.Equal($"{path}: read {read}, expected a scenario file: JSON text in UTF-8", fault.ToString());
    }

    private string Write(byte[] bytes)
    {
        var path = Path.Combine(folder.FullName, "file.json");
        File.WriteAllBytes(path, bytes);
        return path;
    }
}
