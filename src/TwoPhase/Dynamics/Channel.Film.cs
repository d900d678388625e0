using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// The films between metal and water.
internal sealed partial class Channel<TFluid>
{
    // Viscosity and conductivity of a phase are found at enthalpies so far apart [J/kg], one kelvin, and are straight in between. Kept as they were
    // found until the next are, they would jump, in one cell after the other as a front passes, and the metal let go heat each time.
    private const double Apart = 5e3;

    private void RenewFilms()
    {
        foreach (ref Cell cell in _cells.AsSpan())
        {
            if (cell.Surface > 0) cell.FilmResistance = Resistance(ref cell) / cell.Surface;
        }

        _decayStep = double.NaN;
    }

    // Between metal and water [m²·K/W]. Resistances, not films, are what a cell that boils in part has the mean of: it lets go its metal's heat evenly as the boundary walks.
    private double Resistance(ref Cell cell)
    {
        double boils = ShareThatBoils(cell), flux = Math.Max(0, cell.HeatToWater / cell.Surface);
        if (boils >= 1) return Boiling(cell, cell.FlowEnthalpy, flux);
        double saturated = cell.BoundaryEnthalpy, away = cell.FlowEnthalpy - saturated, half = Math.Abs(cell.Boundary == Boundary.None ? cell.Slope : cell.Profile.Spread) / 2;
        double below = saturated + ((away - half) / 2), above = saturated + ((away + half) / 2);
        return cell.Boundary switch
        {
            Boundary.Collapse => (cell.MixtureFills * Boiling(cell, Math.Max(cell.Behind, saturated), flux)) + ((1 - cell.MixtureFills) * Alone(cell, PhaseAt(ref cell, cell.Ahead))),
            Boundary.Dew => (boils * Boiling(cell, below, flux)) + ((1 - boils) * Alone(cell, PhaseAt(ref cell, above))),
            Boundary.Boiling => (boils * Boiling(cell, above, flux)) + ((1 - boils) * Subcooled(cell, PhaseAt(ref cell, below), flux, 0, half - away)),
            _ when cell.FlowQuality > 0 => Alone(cell, PhaseAt(ref cell, cell.FlowEnthalpy)),
            _ => Subcooled(cell, PhaseAt(ref cell, cell.FlowEnthalpy), flux, Math.Max(0, -away - half), half - away),
        };
    }

    private double Boiling(in Cell cell, double enthalpy, double flux) =>
        1 / _fluid.Film(FlowOf(cell, cell.Steam.Quality(enthalpy)), _models.Film, flux);

    private double Alone(in Cell cell, in PhaseTransport phase) => 1 / _fluid.Film(phase, cell.MassFlux, _ducts[cell.Duct].Bore);

    // Water that lacks from "least" to "most" to boil [J/kg]. Where its metal would be hotter than under boiling water, that boils it beforehand, and is no
    // hotter: as in a steady profile. So its temperature does not jump where boiling begins, and its heat comes out along the way and not at one place.
    private double Subcooled(in Cell cell, in PhaseTransport phase, double flux, double least, double most)
    {
        double alone = Alone(cell, phase), over = flux * alone, nearest = least / phase.HeatCapacity, farthest = most / phase.HeatCapacity;
        if (!(over > nearest)) return alone;
        double boiling = Boiling(cell, cell.Steam.LiquidEnthalpy, flux), reach = over - (flux * boiling);
        return reach > nearest ? boiling + (MeanOfLesser(reach, nearest, farthest) / flux) : alone;
    }

    // Mean of the lesser of a value and all from low to high; the value is above the low one.
    private static double MeanOfLesser(double value, double low, double high) =>
        value >= high ? (low + high) / 2 : value - ((value - low) * (value - low) / (2 * (high - low)));

    private PhaseTransport PhaseAt(ref Cell cell, double enthalpy)
    {
        double below = Apart * Math.Floor(enthalpy / Apart);
        if (below != cell.PhaseEnthalpy) RenewPhase(ref cell, below);
        return PhaseTransport.Between(cell.Phase, cell.NextPhase, (enthalpy - below) / Apart);
    }

    // A cell that warms or cools walks from one pair to the next, and finds one of them anew.
    private void RenewPhase(ref Cell cell, double below)
    {
        PhaseTransport low = below == cell.PhaseEnthalpy + Apart ? cell.NextPhase : _fluid.Transport(cell.Steam.Pressure, below);
        PhaseTransport high = below == cell.PhaseEnthalpy - Apart ? cell.Phase : _fluid.Transport(cell.Steam.Pressure, below + Apart);

        // At the edge of the formulation there is but one.
        (cell.Phase, cell.NextPhase, cell.PhaseEnthalpy) = (low.Viscosity > 0 ? low : high, high.Viscosity > 0 ? high : low, below);
    }
}
