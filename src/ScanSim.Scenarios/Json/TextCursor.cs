using System.Text;

namespace ScanSim.Scenarios.Json;

/// <summary>Turns byte offsets into lines and columns (from 1, in UTF-16 characters as editors count); moves forward only.</summary>
/// <remarks>default and new are the same: the text's beginning.</remarks>
internal struct TextCursor
{
    private int offset;
    private int lineIndex;
    private int columnIndex;

    public readonly int Line => lineIndex + 1;

    public readonly int Column => columnIndex + 1;

    public void MoveTo(ReadOnlySpan<byte> utf8, int target)
    {
        var passed = utf8[offset..Math.Clamp(target, offset, utf8.Length)];
        offset += passed.Length;
        var lines = passed.Count((byte)'\n');
        if (lines > 0)
        {
            lineIndex += lines;
            columnIndex = 0;
            passed = passed[(passed.LastIndexOf((byte)'\n') + 1)..];
        }

        columnIndex += Encoding.UTF8.GetCharCount(passed);
    }

    /// <summary>From the beginning to a line (from 0) and a byte in it.</summary>
    public void MoveToLine(ReadOnlySpan<byte> utf8, long line, long byteInLine)
    {
        var start = 0;
        for (var i = 0L; i < line; i++)
        {
            var length = utf8[start..].IndexOf((byte)'\n');
            if (length < 0)
            {
                break;
            }

            start += length + 1;
        }

        MoveTo(utf8, (int)Math.Min(utf8.Length, start + byteInLine));
    }
}
