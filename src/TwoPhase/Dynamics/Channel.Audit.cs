namespace TwoPhase.Dynamics;

// What has come in, gone out and stayed.
internal sealed partial class Channel<TFluid>
{
    private double _massIn, _massOut, _energyIn, _energyOut, _startMass, _startEnergy;

    /// <summary>Mass in the pass [kg].</summary>
    public double Mass => Sum(static (in Cell cell) => cell.Mass);

    /// <summary>Internal energy of the water [J] and, where it stores any, heat in the metal above 0 K.</summary>
    public double Energy => Sum(static (in Cell cell) => cell.Energy) + (MetalStores ? Sum(static (in Cell cell) => cell.Capacity * cell.Wall) : 0);

    /// <summary>In minus out minus what has been added since the state of rest, over what is held; round-off.</summary>
    public double MassResidual => (_massIn - _massOut - (Mass - _startMass)) / _startMass;

    /// <summary>The same of energy: enthalpy of feed and outflow, heat of the fire, water and metal, over what came in.</summary>
    public double EnergyResidual => (_energyIn - _energyOut - (Energy - _startEnergy)) / Math.Max(Math.Abs(_startEnergy), Math.Abs(_energyIn));

    private void OpenBooks()
    {
        (_massIn, _massOut, _energyIn, _energyOut) = (0, 0, 0, 0);
        (_startMass, _startEnergy) = (Mass, Energy);
    }

    private void Book(double step, double feedFlow)
    {
        _massIn += step * feedFlow;
        _energyIn += step * ((feedFlow * FeedEnthalpy) + AbsorbedHeat);
        _massOut += step * Outlet.Outflow;
        _energyOut += step * Outlet.Outflow * Outlet.OutEnthalpy;
    }

    private delegate double Of(in Cell cell);

    private double Sum(Of value)
    {
        double sum = 0;
        foreach (ref readonly Cell cell in _cells.AsSpan()) sum += value(cell);
        return sum;
    }
}
