using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

public static partial class SinglePhaseFilm
{
    /// <summary>Gnielinski (1976, 2013): turbulent, transitional and laminar flow in a smooth tube.</summary>
    /// <remarks>
    /// <para>Re ≥ 4000: Nu = (f/8)(Re − 1000) Pr / (1 + 12.7 √(f/8) (Pr^(2/3) − 1)), f = (1.82 lg Re − 1.64)^−2. Re ≤ 2300: Nu =
    /// 48/11, fully developed laminar flow at uniform heat flux. Between: linear in Re from one to the other. h = Nu k/D.</para>
    /// <para>h film coefficient [W/(m²·K)], f Darcy friction factor, Re = G D/μ, Pr = μ cp/k, G mass flux, D bore, μ viscosity, k
    /// conductivity, cp heat capacity. The corrections for short tubes and for properties at the wall are left out.</para>
    /// <para>Range: 4000 ≤ Re ≤ 5·10⁶, 0.5 ≤ Pr ≤ 2000, fully developed flow. The transition is flagged as outside.</para>
    /// <para>Accuracy: about 10 % for Re ≥ 10⁴.</para>
    /// <para>Source: Gnielinski, Int. Chem. Eng. 16(2), 359-368 (1976); transition: Gnielinski, Int. J. Heat Mass Transfer 63, 134-140 (2013).</para>
    /// </remarks>
    /// <param name="state">Water or steam in the bulk, outside the dome.</param>
    /// <param name="massFlux">Mass flux G, greater than zero.</param>
    /// <param name="bore">Bore D, greater than zero.</param>
    /// <exception cref="ArgumentException"><paramref name="state"/> is wet steam.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="massFlux"/> or <paramref name="bore"/> is not greater than zero.</exception>
    public static HeatTransferCoefficient Gnielinski(in SteamState state, MassFlux massFlux, Length bore) =>
        HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(GnielinskiCore(Alone(state, massFlux, bore)));

    /// <summary>Whether Reynolds and Prandtl number lie inside the published range of <see cref="Gnielinski"/>.</summary>
    /// <param name="state">Water or steam in the bulk, outside the dome.</param>
    /// <param name="massFlux">Mass flux G, greater than zero.</param>
    /// <param name="bore">Bore D, greater than zero.</param>
    /// <exception cref="ArgumentException"><paramref name="state"/> is wet steam.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="massFlux"/> or <paramref name="bore"/> is not greater than zero.</exception>
    public static Applicability CheckGnielinski(in SteamState state, MassFlux massFlux, Length bore)
    {
        SinglePhase phase = Alone(state, massFlux, bore);
        return Applicability.Inside
            .Check(ApplicabilityLimits.Reynolds, phase.Reynolds, TurbulentFrom, 5e6)
            .Check(ApplicabilityLimits.Prandtl, phase.Prandtl, 0.5, 2000);
    }

    private const double LaminarUpTo = 2300, TurbulentFrom = 4000, LaminarNusselt = 48.0 / 11, Ln10 = 2.302585092994046;

    internal static double GnielinskiCore(SinglePhase phase) => phase.Conductance * GnielinskiNusselt(phase.Reynolds, phase.Prandtl);

    internal static double GnielinskiNusselt(double reynolds, double prandtl)
    {
        double turbulent = TurbulentNusselt(Math.Max(reynolds, TurbulentFrom), prandtl);
        double share = Fast.Clamp((reynolds - LaminarUpTo) / (TurbulentFrom - LaminarUpTo), 0, 1);
        return LaminarNusselt + (share * (turbulent - LaminarNusselt));
    }

    private static double TurbulentNusselt(double reynolds, double prandtl)
    {
        double root = Math.Sqrt(1.0 / 8) / ((1.82 / Ln10 * Math.Log(reynolds)) - 1.64);   // √(f/8); log to base e, which is twice as fast
        double prandtlTwoThirds = Math.Exp(2.0 / 3 * Math.Log(prandtl));
        return root * root * (reynolds - 1000) * prandtl / (1 + (12.7 * root * (prandtlTwoThirds - 1)));
    }
}
