using System.Text;

namespace ScanSim.Scenarios;

/// <summary>Reads a file's text; what goes wrong becomes a fault of the file as a whole.</summary>
internal static class ScenarioText
{
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    public static string Read(string path, int largestBytes)
    {
        if (Directory.Exists(path))
        {
            throw Fault(path, "a folder");
        }

        try
        {
            return Text(path, Bytes(path, largestBytes));
        }
        catch (Exception fault) when (fault is FileNotFoundException or DirectoryNotFoundException or ArgumentException)
        {
            throw Fault(path, "no such file");
        }
        catch (Exception fault) when (fault is UnauthorizedAccessException or IOException or NotSupportedException)
        {
            throw Fault(path, $"a file that cannot be read ({fault.Message})");
        }
    }

    private static byte[] Bytes(string path, int largestBytes)
    {
        using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.ReadWrite);
        var bytes = new MemoryStream();
        var block = new byte[64 * 1024];
        while (stream.Read(block) is > 0 and var count)
        {
            bytes.Write(block, 0, count);
            if (bytes.Length > largestBytes)
            {
                throw Fault(path, $"a file of more than {largestBytes / (1024 * 1024)} MB");
            }
        }

        return bytes.ToArray();
    }

    private static string Text(string path, byte[] bytes)
    {
        if (bytes.AsSpan().StartsWith<byte>([0xFF, 0xFE]) || bytes.AsSpan().StartsWith<byte>([0xFE, 0xFF]))
        {
            throw Fault(path, "a file in UTF-16");
        }

        ReadOnlySpan<byte> mark = [0xEF, 0xBB, 0xBF];
        var content = bytes.AsSpan().StartsWith(mark) ? bytes.AsSpan(mark.Length) : bytes.AsSpan();
        try
        {
            return Strict.GetString(content);
        }
        catch (DecoderFallbackException fault)
        {
            throw Fault(path, $"a byte that is not UTF-8 (0x{fault.BytesUnknown?.FirstOrDefault():X2} at byte {fault.Index})");
        }
    }

    private static ScenarioException Fault(string path, string read) =>
        new([new ScenarioFault(path, 0, 0, "$", read, "a scenario file: JSON text in UTF-8")]);
}
