namespace ScanSim.Display.Replay;

/// <summary>Four strengths of a mark by its signal-to-noise ratio: the quarters of what the recording holds.</summary>
internal sealed record SnrShades(float LowDb, float MiddleDb, float HighDb)
{
    public const int Count = 4;

    /// <summary>Every mark counts up to this many; beyond, every second, third and so on.</summary>
    private const int Sample = 20_000;

    public static SnrShades Of(Scene scene)
    {
        var all = scene.Targets.Sum(target => target.Looks.Length);
        var step = Math.Max(1, all / Sample);
        var found = new List<float>();
        var at = 0;
        foreach (var target in scene.Targets)
        {
            for (; at < target.Looks.Length; at += step)
            {
                if (float.IsFinite(target.Looks[at].SnrDb))
                {
                    found.Add(target.Looks[at].SnrDb);
                }
            }

            at -= target.Looks.Length;
        }

        found.Sort();
        return found.Count == 0 ? new SnrShades(0, 0, 0) : new SnrShades(found[found.Count / 4], found[found.Count / 2], found[3 * found.Count / 4]);
    }

    /// <summary>0 for the weakest quarter to 3 for the strongest; 3 where no ratio was recorded.</summary>
    public int Of(float snrDb) => snrDb < LowDb ? 0 : snrDb < MiddleDb ? 1 : snrDb < HighDb ? 2 : 3;

    public static byte Alpha(int shade) => (byte)(255 * (0.52 + 0.16 * shade));
}
