using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests.Replay;

/// <summary>Whether pieces of text keep clear of one another.</summary>
internal static class Overlaps
{
    public static void None(IReadOnlyList<DrawnText> texts, float width, float height)
    {
        for (var i = 0; i < texts.Count; i++)
        {
            var box = SKRect.Inflate(texts[i].Box, -0.5f, -1.5f);
            Assert.True(new SKRect(0, 0, width, height).Contains(box), $"'{texts[i].Text}' leaves the window: {box}");
            for (var j = i + 1; j < texts.Count; j++)
            {
                var other = SKRect.Inflate(texts[j].Box, -0.5f, -1.5f);
                Assert.False(box.IntersectsWith(other), $"'{texts[i].Text}' and '{texts[j].Text}' overlap: {box} and {other}");
            }
        }
    }
}
