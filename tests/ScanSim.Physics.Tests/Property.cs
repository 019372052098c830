using CsCheck;

namespace ScanSim.Physics.Tests;

/// <summary>Holds a property against generated values, the same ones in each run.</summary>
/// <remarks>CsCheck's own Sample takes its seed for the first value only and draws the others anew each time.</remarks>
internal static class Property
{
    public static void Holds<T>(Gen<T> values, int count, Func<T, bool> property)
    {
        var generator = new PCG(1, 20_260_401);
        for (int i = 0; i < count; i++)
        {
            T value = values.Generate(generator, null, out _);
            Assert.True(property(value), $"value {i}: {value}");
        }
    }
}
