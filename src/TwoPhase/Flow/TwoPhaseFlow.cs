using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Flow;

/// <summary>Saturated liquid and vapour flowing together in a tube: the argument of every slip, friction and film model.</summary>
public readonly partial record struct TwoPhaseFlow
{
    private readonly FlowState _state;

    /// <summary>Saturated steam in a tube.</summary>
    /// <param name="steam">Both phases, below critical pressure.</param>
    /// <param name="quality">x, flowing quality, 0 to 1.</param>
    /// <param name="massFlux">G, total mass flow over flow area, greater than zero.</param>
    /// <param name="bore">D, inside diameter of the tube, greater than zero.</param>
    /// <param name="inclination">θ, inclination of the flow direction against the horizontal, −90° (down) to 90° (up).</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside the limits given with it.</exception>
    public TwoPhaseFlow(Saturation steam, MassFraction quality, MassFlux massFlux, Length bore, Angle inclination) => _state = FlowStates.Of(
        Subcritical(steam),
        Require.Within(quality.Si(), 0, 1, "Quality x", Scale.None, nameof(quality)),
        Require.Positive(massFlux.Si(), "Mass flux G", Scale.KilogramsPerSquareMetreSecond, nameof(massFlux)),
        Require.Positive(bore.Si(), "Bore D", Scale.Millimetres, nameof(bore)),
        Require.Within(inclination.Si(), -Math.PI / 2, Math.PI / 2, "Inclination θ", Scale.Degrees, nameof(inclination)));

    internal TwoPhaseFlow(in FlowState state) => _state = state;

    /// <summary>The same flow in raw SI units, for models of your own.</summary>
    public FlowState State => _state;

    internal object ToDump() => ToString();

    /// <summary>The flow in engineering units, invariant culture.</summary>
    public override string ToString() =>
        $"x = {Scale.None.Text(_state.Quality)}, {Scale.KilogramsPerSquareMetreSecond.Text(_state.MassFlux)} at {Scale.Megapascals.Text(_state.Pressure)} "
        + $"in {Scale.Millimetres.Text(_state.Bore)} bore, inclined {Scale.Degrees.Text(_state.Inclination)}";

    private static SaturationCore Subcritical(in Saturation steam)
    {
        double pressure = steam.Core.Pressure;
        _ = Require.Positive(pressure, "Saturation pressure p", Scale.Megapascals, nameof(steam));
        _ = Require.Below(pressure, Water97.CriticalPressure, "Saturation pressure p", Scale.Megapascals, nameof(steam));
        return steam.Core;
    }
}
