namespace TwoPhase.Dynamics;

// The films between metal and water.
internal sealed partial class Channel<TFluid>
{
    // Nearer than this to where its viscosity and conductivity were found [J/kg], a phase keeps them: one kelvin.
    private const double Near = 5e3;

    private void RenewFilms()
    {
        foreach (ref Cell cell in _cells.AsSpan())
        {
            if (cell.Surface > 0) cell.FilmResistance = 1 / (cell.Surface * Film(ref cell));
        }

        _decayStep = double.NaN;
    }

    // Resistances, not films, are what a cell that boils in part has the mean of: it lets go its metal's heat evenly as the boundary walks.
    private double Film(ref Cell cell)
    {
        double boils = ShareThatBoils(cell), flux = Math.Max(0, cell.HeatToWater / cell.Surface);
        if (boils >= 1) return BoilingFilm(cell, cell.FlowEnthalpy, flux);
        if (boils <= 0) return SinglePhaseFilm(ref cell, cell.FlowEnthalpy);
        if (cell.Boundary == Boundary.Collapse) return 1 / ((cell.MixtureFills / BoilingFilm(cell, Math.Max(cell.Behind, cell.Steam.LiquidEnthalpy), flux)) + ((1 - cell.MixtureFills) / SinglePhaseFilm(ref cell, cell.Ahead)));
        double saturated = cell.BoundaryEnthalpy, half = cell.Profile.Spread / 2, away = cell.FlowEnthalpy - saturated, below = saturated + ((away - half) / 2), above = saturated + ((away + half) / 2);
        (double wet, double single) = cell.Boundary == Boundary.Boiling ? (above, below) : (below, above);
        return 1 / ((boils / BoilingFilm(cell, wet, flux)) + ((1 - boils) / SinglePhaseFilm(ref cell, single)));
    }

    private double BoilingFilm(in Cell cell, double enthalpy, double flux) =>
        _fluid.Film(FlowOf(cell, cell.Steam.Quality(enthalpy)), _models.Film, flux);

    private double SinglePhaseFilm(ref Cell cell, double enthalpy)
    {
        if (!(Math.Abs(enthalpy - cell.PhaseEnthalpy) < Near)) (cell.Phase, cell.PhaseEnthalpy) = (_fluid.Transport(cell.Steam.Pressure, enthalpy), enthalpy);
        return _fluid.Film(cell.Phase, cell.MassFlux, _ducts[cell.Duct].Bore);
    }
}
