using TwoPhase.Units;

namespace TwoPhase.Passes;

public sealed partial class PassProfile
{
    // One row of tubes before a wall that reflects takes about twice the mean on its hot side; more than this is a mistyped number.
    private const double GreatestFluxPeak = 4;

    /// <summary>Film, wall temperatures, critical quality and flow pattern at a row, by the models of the profile.</summary>
    /// <remarks>
    /// <para>Boiling flow: <see cref="PassModels.Film"/>. Liquid and dry steam: <see cref="HeatTransfer.SinglePhaseFilm.Gnielinski"/>. Subcooled liquid on a
    /// wall hot enough to boil: the lower of the wall temperatures of liquid alone and of boiling at x = 0, so that the wall does not jump where boiling begins.</para>
    /// <para>Range: that of the models. Accuracy: that of the models; the lower-of-both rule leaves out partial boiling and is good to a kelvin or two.</para>
    /// <para>Source: Collier and Thome, Convective Boiling and Condensation, 3rd ed. (1994), section 5.3 (intersection of the two lines).</para>
    /// </remarks>
    /// <param name="index">0 at the inlet.</param>
    /// <param name="fluxPeak">
    /// Heat flux on the side that faces the flame over the mean around the tube, 1 to 4: in radiant sections 1.5 to 2 (common practice, no source).
    /// It acts in sections of <see cref="HeatZone.Radiant"/> only. Conduction round the tube is left out, which overstates the hot side.
    /// </param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="fluxPeak"/> is outside its limits, or there is no such row.</exception>
    public PassWall WallAt(int index, double fluxPeak = 1) => WallSolver.At(this, _nodes[index], CheckedFluxPeak(fluxPeak));

    internal static double CheckedFluxPeak(double fluxPeak) => Require.Within(fluxPeak, 1, GreatestFluxPeak, "Flux peak", Scale.None, nameof(fluxPeak));
}
