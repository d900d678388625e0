using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>Viscosity, thermal conductivity and surface tension, raw SI.</summary>
internal static partial class Transport
{
    /// <summary>σ [N/m] between liquid and vapour at a temperature up to critical.</summary>
    /// <remarks>
    /// <para>σ = B τ^μ (1 + b τ), τ = 1 − T/Tc.</para>
    /// <para>Range: triple point to critical point; reasonable down to 248.15 K.</para>
    /// <para>Accuracy: the release's Table 1 gives 0.1 to 0.4 mN/m with temperature.</para>
    /// <para>Source: IAPWS R1-76(2014), equation (1).</para>
    /// </remarks>
    public static double SurfaceTension(double temperature)
    {
        double tau = 1 - (temperature / CriticalTemperature);
        return tau > 0 ? 235.8e-3 * Math.Pow(tau, 1.256) * (1 - (0.625 * tau)) : 0;
    }
}
