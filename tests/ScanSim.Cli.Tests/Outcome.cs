namespace ScanSim.Cli.Tests;

/// <summary>What a process gave back.</summary>
internal sealed record Outcome(int ExitCode, string Output, string Error)
{
    /// <summary>Bad input: exit code 2, a message that holds all of these, nothing on stdout, no stack trace.</summary>
    public void AssertRefused(params string[] words)
    {
        Assert.True(ExitCode == 2, $"exit code {ExitCode}\n{Error}\n{Output}");
        Assert.Equal("", Output);
        Assert.All(words, word => Assert.Contains(word, Error, StringComparison.Ordinal));
        Assert.DoesNotContain("   at ", Error, StringComparison.Ordinal);
        Assert.DoesNotContain("Unhandled", Error, StringComparison.Ordinal);
    }

    public Outcome AssertDone()
    {
        Assert.True(ExitCode == 0, $"exit code {ExitCode}\n{Error}\n{Output}");
        return this;
    }
}
