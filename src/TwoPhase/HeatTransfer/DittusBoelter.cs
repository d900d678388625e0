using TwoPhase.Flow;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

public static partial class SinglePhaseFilm
{
    /// <summary>Dittus and Boelter (1930), in McAdams' form for heating: turbulent flow in a smooth tube.</summary>
    /// <remarks>
    /// <para>Nu = 0.023 Re^0.8 Pr^0.4, h = Nu k/D.</para>
    /// <para>h film coefficient [W/(m²·K)], Re = G D/μ, Pr = μ cp/k, G mass flux, D bore, μ viscosity, k conductivity, cp heat capacity.</para>
    /// <para>Range: Re ≥ 10⁴, 0.7 ≤ Pr ≤ 160, L/D ≥ 10.</para>
    /// <para>Accuracy: about 25 %.</para>
    /// <para>Source: Dittus and Boelter, Univ. Calif. Publ. Eng. 2, 443-461 (1930); Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, section 8.5.</para>
    /// </remarks>
    /// <param name="state">Water or steam in the bulk, outside the dome.</param>
    /// <param name="massFlux">Mass flux G, greater than zero.</param>
    /// <param name="bore">Bore D, greater than zero.</param>
    /// <exception cref="ArgumentException"><paramref name="state"/> is wet steam.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="massFlux"/> or <paramref name="bore"/> is not greater than zero.</exception>
    public static HeatTransferCoefficient DittusBoelter(in SteamState state, MassFlux massFlux, Length bore) =>
        HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(DittusBoelterCore(Alone(state, massFlux, bore)));

    /// <summary>Whether Reynolds and Prandtl number lie inside the published range of <see cref="DittusBoelter"/>.</summary>
    /// <param name="state">Water or steam in the bulk, outside the dome.</param>
    /// <param name="massFlux">Mass flux G, greater than zero.</param>
    /// <param name="bore">Bore D, greater than zero.</param>
    /// <exception cref="ArgumentException"><paramref name="state"/> is wet steam.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="massFlux"/> or <paramref name="bore"/> is not greater than zero.</exception>
    public static Applicability CheckDittusBoelter(in SteamState state, MassFlux massFlux, Length bore)
    {
        SinglePhase phase = Alone(state, massFlux, bore);
        return Applicability.Inside
            .Check(ApplicabilityLimits.Reynolds, phase.Reynolds, 1e4, double.PositiveInfinity)
            .Check(ApplicabilityLimits.Prandtl, phase.Prandtl, 0.7, 160);
    }

    internal static double DittusBoelterCore(SinglePhase phase) =>
        0.023 * phase.Conductance * Math.Exp((0.8 * Math.Log(phase.Reynolds)) + (0.4 * Math.Log(phase.Prandtl)));
}
