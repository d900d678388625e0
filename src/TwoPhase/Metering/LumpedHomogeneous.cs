using TwoPhase.Steam;

namespace TwoPhase.Metering;

/// <summary>Homogeneous wet steam over a meter of known constant: the closed form by itself, for live loops and for years of history. Raw SI.</summary>
/// <remarks>x = (k² Δp/ṁ² − v′)/(v″ − v′), from ṁ = k √(Δp ρe) with 1/ρe = v′ + x (v″ − v′).</remarks>
internal static partial class LumpedHomogeneous
{
    /// <summary>The quality of one sample that has passed the range checks.</summary>
    /// <param name="square">k² [m⁴].</param>
    /// <param name="flow">ṁ [kg/s].</param>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="differential">Δp [Pa].</param>
    public static double Quality(double square, double flow, double pressure, double differential)
    {
        SaturatedPhases steam = SaturationTable.Phases(pressure);
        return ((square * differential / (flow * flow)) - steam.LiquidVolume) / (steam.VapourVolume - steam.LiquidVolume);
    }
}
