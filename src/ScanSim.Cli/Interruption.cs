using System.Runtime.InteropServices;

namespace ScanSim.Cli;

/// <summary>Turns Ctrl-C and SIGTERM into a cancellation, so that files are closed before the process ends.</summary>
internal sealed class Interruption : IDisposable
{
    private readonly CancellationTokenSource source = new();
    private readonly PosixSignalRegistration[] registrations;

    public Interruption() => registrations =
    [
        PosixSignalRegistration.Create(PosixSignal.SIGINT, context => Cancel(context, Cli.ExitCode.Interrupted)),
        PosixSignalRegistration.Create(PosixSignal.SIGTERM, context => Cancel(context, Cli.ExitCode.Terminated)),
    ];

    public CancellationToken Token => source.Token;

    /// <summary>Exit code of the signal that came; meaningful once <see cref="Token"/> is cancelled.</summary>
    public int ExitCode { get; private set; } = Cli.ExitCode.Interrupted;

    public void Dispose()
    {
        foreach (var registration in registrations)
        {
            registration.Dispose();
        }

        source.Dispose();
    }

    private void Cancel(PosixSignalContext context, int exitCode)
    {
        // A second signal ends the process at once, as if nothing caught it.
        context.Cancel = !source.IsCancellationRequested;
        ExitCode = exitCode;
        source.Cancel();
    }
}
