using ScanSim.Display;
using ScanSim.Display.Overlays;
using ScanSim.Display.Windowing;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>Turns what went wrong into a message on stderr and an exit code; no stack trace reaches the user for an error of input or system.</summary>
internal static class UserErrors
{
    public static int Report(Func<int> action, Interruption interruption)
    {
        try
        {
            return action();
        }
        catch (OperationCanceledException) when (interruption.Token.IsCancellationRequested)
        {
            Console.Error.WriteLine("scansim: interrupted");
            return interruption.ExitCode;
        }
        catch (AggregateException several) when (several.InnerExceptions.All(IsTheUsers))
        {
            return Tell(several.InnerExceptions[0]);
        }
        catch (Exception error) when (IsTheUsers(error))
        {
            return Tell(error);
        }
    }

    private static bool IsTheUsers(Exception error) =>
        error is ScenarioException or RecordingException or PictureException or OverlayException or WindowException or InputException or IOException or UnauthorizedAccessException;

    private static int Tell(Exception error)
    {
        foreach (var line in error.Message.Split('\n'))
        {
            Console.Error.WriteLine("scansim: " + line);
        }

        return ExitCode.BadInput;
    }
}
