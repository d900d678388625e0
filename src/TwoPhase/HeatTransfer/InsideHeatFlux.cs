using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.HeatTransfer;

/// <summary>The door of every heat flux of this namespace: q at the inside surface, positive into the flow, SI behind it.</summary>
internal static class InsideHeatFlux
{
    public static double NotNegative(HeatFlux heatFlux, string parameter) =>
        Require.NotNegative(heatFlux.Si(), "Heat flux q", Scale.KilowattsPerSquareMetre, parameter);

    public static double Positive(HeatFlux heatFlux, string parameter) =>
        Require.Positive(heatFlux.Si(), "Heat flux q", Scale.KilowattsPerSquareMetre, parameter);
}
