using System.Security.Cryptography;
using System.Text;
using ScanSim.Scenarios.Json;

namespace ScanSim.Scenarios;

/// <summary>The identity of a scenario: SHA-256 of its canonical JSON, so that comments, white space and key order do not count.</summary>
public static class ScenarioDigest
{
    /// <summary>Lower-case hex digest of a JSON text.</summary>
    /// <exception cref="ScenarioException">The text is not JSON.</exception>
    public static string Of(string text, string fileName)
    {
        try
        {
            return Of(JsonTree.Read(Encoding.UTF8.GetBytes(text)));
        }
        catch (JsonTextException fault)
        {
            throw new ScenarioException([new ScenarioFault(fileName, fault.Line, fault.Column, "$", fault.Message, "JSON")]);
        }
    }

    /// <summary>The canonical JSON itself (RFC 8785, except that whole numbers beyond 2^53 keep their digits).</summary>
    /// <exception cref="ScenarioException">The text is not JSON.</exception>
    public static string Canonical(string text, string fileName)
    {
        try
        {
            return CanonicalJson.Write(JsonTree.Read(Encoding.UTF8.GetBytes(text)));
        }
        catch (JsonTextException fault)
        {
            throw new ScenarioException([new ScenarioFault(fileName, fault.Line, fault.Column, "$", fault.Message, "JSON")]);
        }
    }

    internal static string Of(JsonValue root) =>
        Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(CanonicalJson.Write(root))));
}
