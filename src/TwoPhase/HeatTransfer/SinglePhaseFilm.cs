using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The inside film coefficient of water or steam alone in a tube: <see cref="Gnielinski"/>, <see cref="DittusBoelter"/>.</summary>
public static partial class SinglePhaseFilm
{
    private static SinglePhase Alone(in SteamState state, MassFlux massFlux, Length bore)
    {
        if (state.Region == 0 || state.Core.IsWet) throw new ArgumentException($"A single-phase film needs liquid water or dry steam; the state is {state}.", nameof(state));
        return new(
            Require.Positive(massFlux.Si(), "Mass flux G", Scale.KilogramsPerSquareMetreSecond, nameof(massFlux)),
            Require.Positive(bore.Si(), "Bore D", Scale.Millimetres, nameof(bore)),
            Transport.Viscosity(state.Core.Density, state.Core.Temperature),
            Transport.Conductivity(state.Core.Phase),
            state.Core.Phase.IsobaricHeatCapacity);
    }
}
