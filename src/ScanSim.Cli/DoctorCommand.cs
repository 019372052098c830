using System.CommandLine;
using System.Globalization;
using ScanSim.Display.Films;

namespace ScanSim.Cli;

/// <summary>scansim doctor</summary>
internal static class DoctorCommand
{
    /// <summary>Paths and messages of the system may be longer than a table has room for.</summary>
    private const int LongestFound = 75;

    public static (Command Command, string Example) Create()
    {
        var command = new Command("doctor", "Check what this system lacks for which command. A missing part is no error: the other commands work without it.");
        command.SetAction(_ =>
        {
            SystemPart[] parts =
            [
                SystemParts.Runtime(), SystemParts.Cores(), SystemParts.TemporaryFolder(), SystemParts.Skia(),
                SystemParts.Ffmpeg(Display.Films.Ffmpeg.Find()), SystemParts.Sdl(), SystemParts.Screen(),
            ];
            TextTable.Write(Console.Out, ["part", "needed by", "state", "found", "what to do"], parts.Select(Row));
            var missing = parts.Count(p => !p.IsThere);
            Console.Error.WriteLine(missing == 0 ? "Nothing is missing." : string.Create(CultureInfo.InvariantCulture, $"{missing} of {parts.Length} parts missing."));
            return ExitCode.Done;
        });
        return (command, "scansim doctor");
    }

    private static string[] Row(SystemPart part) =>
        [part.Name, part.NeededBy, part.IsThere ? "there" : "missing", Shortened(part.Found), part.IsThere ? "" : part.WhatToDo];

    private static string Shortened(string text) => text.Length <= LongestFound ? text : text[..(LongestFound - 1)] + "…";
}
