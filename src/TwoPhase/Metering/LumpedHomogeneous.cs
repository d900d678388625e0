using System.Runtime.CompilerServices;
using TwoPhase.Numerics;
using TwoPhase.Steam;

namespace TwoPhase.Metering;

/// <summary>Homogeneous wet steam over a meter of known constant: the closed form by itself, for live loops and for years of history. Raw SI.</summary>
/// <remarks>
/// <para>x = (k² Δp/ṁ² − v′)/(v″ − v′), from ṁ = k √(Δp ρe) with 1/ρe = v′ + x (v″ − v′).</para>
/// <para>1/(v″ − v′) and v′/(v″ − v′) are curves of pressure over the range of <see cref="SaturationTable"/>, within 1e-11 in quality of the formulation, and
/// leave one division. Built on first use, 128 KiB.</para>
/// </remarks>
internal static partial class LumpedHomogeneous
{
    /// <summary>Samples that stand side by side in a register.</summary>
    public const int Lanes = 4;

    /// <summary>The quality of one sample.</summary>
    /// <param name="square">k² [m⁴].</param>
    /// <param name="flow">ṁ [kg/s].</param>
    /// <param name="pressure">p [Pa], inside the range of <see cref="SaturationTable"/>.</param>
    /// <param name="differential">Δp [Pa].</param>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static double Quality(double square, double flow, double pressure, double differential)
    {
        Lever.Curves.At(pressure, out double perVolume, out double atZero);
        return Fast.MultiplyAdd(square * differential / (flow * flow), perVolume, -atZero);
    }

    private static class Lever
    {
        public static readonly TwoCurves Curves = new(SaturationTable.LowestPressure, SaturationTable.HighestPressure, static pressure =>
        {
            SaturatedPhases steam = SaturationTable.Continued(pressure);
            double difference = steam.VapourVolume - steam.LiquidVolume;
            return (1 / difference, steam.LiquidVolume / difference);
        });
    }
}
