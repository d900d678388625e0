using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The inside film coefficient of water or steam alone in a tube: <see cref="Gnielinski"/>, <see cref="DittusBoelter"/>.</summary>
public static partial class SinglePhaseFilm
{
    private static SinglePhase Checked(
        MassFlux massFlux, Length bore, DynamicViscosity viscosity, ThermalConductivity conductivity, SpecificEntropy heatCapacity) => new(
        Require.Positive(massFlux.Si(), "Mass flux G", Scale.KilogramsPerSquareMetreSecond, nameof(massFlux)),
        Require.Positive(bore.Si(), "Bore D", Scale.Millimetres, nameof(bore)),
        Require.Positive(viscosity.Si(), "Viscosity μ", Scale.PascalSeconds, nameof(viscosity)),
        Require.Positive(conductivity.Si(), "Conductivity k", Scale.WattsPerMetreKelvin, nameof(conductivity)),
        Require.Positive(heatCapacity.Si(), "Heat capacity cp", Scale.KilojoulesPerKilogramKelvin, nameof(heatCapacity)));
}
