using TwoPhase.Numerics;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// Everything that the next step builds on, so that a run goes on from a saved state as if nothing had been.
internal sealed partial class Channel<TFluid>
{
    public void Save(StateWriter to)
    {
        to.Add(_cells.Length);
        foreach (double number in (double[])[Heat, FeedEnthalpy, HeadLag, Time, OutletPressure, CourantRate, Stagnant, _feedFlow, _heat, _beyond, _lastFeed, EndPressure, TimeShut, AbsorbedHeat, _gas, _refractory, _shift, _lastHeat, _lastStep, _outletRate, _lastJump, _stores, MeteredFlow, MeteredEnthalpy]) to.Add(number);
        foreach (double number in (double[])[_massIn, _massOut, _energyIn, _energyOut, _startMass, _startEnergy]) to.Add(number);
        foreach (ref readonly Cell cell in _cells.AsSpan()) Save(cell, to);
    }

    public void Load(StateReader from)
    {
        if (from.Next() != _cells.Length) throw new FormatException($"A saved state is of another pass or of another number of cells than {_cells.Length}.");
        (Heat, FeedEnthalpy, HeadLag, Time, OutletPressure) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (CourantRate, Stagnant, _feedFlow, _heat, _beyond) = (from.Next(), (int)from.Next(), from.Next(), from.Next(), from.Next());
        (_lastFeed, EndPressure, TimeShut, AbsorbedHeat, _gas, _refractory, _shift) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (_lastHeat, _lastStep, _outletRate, _lastJump, _stores, MeteredFlow, MeteredEnthalpy) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (_massIn, _massOut, _energyIn, _energyOut, _startMass, _startEnergy) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        foreach (ref Cell cell in _cells.AsSpan()) Load(ref cell, from);
    }

    private static void Save(in Cell cell, StateWriter to)
    {
        double[] numbers =
        [
            cell.Mass, cell.Energy, cell.Wall, cell.FilmResistance, cell.PhaseEnthalpy, cell.Phase.Viscosity, cell.Phase.Conductivity, cell.Phase.HeatCapacity, cell.NextPhase.Viscosity, cell.NextPhase.Conductivity, cell.NextPhase.HeatCapacity,
            cell.Head, cell.HeadTarget, cell.PressureRate, cell.Drop, cell.DropFlow, cell.Resistance, cell.HalfLoss, cell.Store, cell.Swelling, cell.Thrust, cell.MetalStore, cell.WarmsBy, cell.HeatShare, cell.Spread, cell.Steam.Pressure, cell.HeldEnthalpy, cell.FlowEnthalpy, cell.Slope, cell.FlowQuality, cell.VoidFraction, cell.QualityByVoid, cell.SlopeQuality,
            cell.WaveFactor, (double)cell.Boundary, cell.Profile.Spread, cell.Profile.Below, cell.Profile.Above, cell.Ahead, cell.Behind, cell.MixtureMass, cell.MixtureFills,
            cell.Temperature, cell.SinglePhaseExpansion, cell.Outflow, cell.OutEnthalpy, cell.HeatToWater,
        ];
        foreach (double number in numbers) to.Add(number);
    }

    private void Load(ref Cell cell, StateReader from)
    {
        (cell.Mass, cell.Energy, cell.Wall, cell.FilmResistance, cell.PhaseEnthalpy) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        cell.PerMass = 1 / cell.Mass;
        cell.Phase = new(from.Next(), from.Next(), from.Next());
        cell.NextPhase = new(from.Next(), from.Next(), from.Next());
        (cell.Head, cell.HeadTarget, cell.PressureRate, cell.Drop, cell.DropFlow, cell.Resistance, cell.HalfLoss) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (cell.Store, cell.Swelling, cell.Thrust, cell.MetalStore, cell.WarmsBy) = (from.Next(), from.Next(), from.Next(), from.Next(), from.Next());
        (cell.HeatShare, cell.Spread, cell.Steam) = (from.Next(), from.Next(), _fluid.Saturated(from.Next()));
        (cell.HeldEnthalpy, cell.FlowEnthalpy, cell.Slope) = (from.Next(), from.Next(), from.Next());
        (cell.FlowQuality, cell.VoidFraction, cell.QualityByVoid, cell.SlopeQuality) = (from.Next(), from.Next(), from.Next(), from.Next());
        (cell.WaveFactor, cell.Boundary) = (from.Next(), (Boundary)from.Next());
        cell.Profile = new() { Spread = from.Next(), Below = from.Next(), Above = from.Next() };
        (cell.Ahead, cell.Behind, cell.MixtureMass, cell.MixtureFills) = (from.Next(), from.Next(), from.Next(), from.Next());
        (cell.Temperature, cell.SinglePhaseExpansion) = (from.Next(), from.Next());
        (cell.Outflow, cell.OutEnthalpy, cell.HeatToWater) = (from.Next(), from.Next(), from.Next());
    }
}
