using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// The pressure along the pass: quasi-steady losses, which the cells then follow through a lag.
internal sealed partial class Channel<TFluid>
{
    // Share of the pressure over which a difference stands for the slope along saturation.
    private const double Probe = 1e-4;

    // Losses of the moment, from the outlet up, and how they and the store of each cell answer to a change.
    private void AimPressure(double outletPressure)
    {
        double head = 0;
        PassNode after = default;
        for (int i = _cells.Length - 1; i >= 0; i--)
        {
            ref Cell cell = ref _cells[i];
            PassNode node = LocalFlow.At(_fluid, _models.Slip, _models.Friction, _ducts[cell.Duct], cell.MassFlux, outletPressure + cell.Head, cell.FlowEnthalpy);
            cell.HalfLoss = node.Loss * cell.Length / 2;
            cell.Drop = i == _cells.Length - 1 ? cell.HalfLoss : cell.HalfLoss + _cells[i + 1].HalfLoss + MomentumRise(node, after);
            cell.Resistance = (node.Friction + node.Fittings) * cell.Length / cell.Outflow;
            cell.DropFlow = cell.Outflow;
            cell.HeadTarget = head += cell.Drop;
            after = node;
        }
    }

    private void FindStores()
    {
        double inEnthalpy = FeedEnthalpy;
        foreach (ref Cell cell in _cells.AsSpan())
        {
            (cell.Store, cell.Swelling) = StoreOf(cell, inEnthalpy);
            inEnthalpy = cell.OutEnthalpy;
        }
    }

    // Pressure and flow push each other: a rising pressure condenses, so less flows out, so less is lost. They are foreseen together over an
    // inner step, to first order in the change w of each outflow since the losses were found; one after the other they would swing wherever
    // boiling water lets go more mass for a pressure than flows within the lag. With T the head aimed at and H the head that is:
    //   w(i) = w before(i) + g (w(i−1) − w before(i−1)) − K (ṗ − ṗ before),  ṗ = ṗ outlet + s (T(i) − H(i))/Δt,
    //   T(i−1) = T(i) + drop(i−1) + r(i−1) w(i−1) + r(i) w(i);
    // s share of the way that the lag leaves open, K store, g swelling, r resistance. Eliminated downstream as w = a − b T, solved upstream.
    private void ForeseePressure(double step, double feedFlow, double outletRate)
    {
        double reach = HeadLag > 0 ? 1 - Math.Exp(-step / HeadLag) : 1, a = feedFlow - _lastFeed, b = 0, drop = 0, resistance = 0, before = 0;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            double pull = cell.Store * reach / step, r = cell.Resistance, now = cell.Outflow - cell.DropFlow;
            double q = cell.Swelling / (1 + (b * resistance)), scale = 1 / (1 + (q * b * r));
            a = ((q * (a - (b * drop))) - (cell.Swelling * before) + now + (pull * cell.Head) + (cell.Store * (cell.PressureRate - outletRate))) * scale;
            b = ((q * b) + pull) * scale;
            (cell.Follow, cell.FollowHead) = (a, b);
            (drop, resistance, before) = (cell.Drop, r, now);
        }

        double head = 0, push = 0;
        for (int i = _cells.Length - 1; i >= 0; i--)
        {
            ref Cell cell = ref _cells[i];
            head = (head + cell.Drop + push + (cell.Resistance * cell.Follow)) / (1 + (cell.Resistance * cell.FollowHead));
            push = cell.Resistance * (cell.Follow - (cell.FollowHead * head));
            cell.HeadChange = reach * (head - cell.Head);
        }
    }

    // Where both phases are: mass that a cell lets go for each pascal that its pressure falls, and what swells out of it for each kilogram that comes in.
    private (double Store, double Swelling) StoreOf(in Cell cell, double inEnthalpy)
    {
        SaturatedPair steam = cell.Steam;
        double outVolume = FlowingVolume(steam, cell.OutEnthalpy), swelling = FlowingVolume(steam, inEnthalpy) / outVolume, share = ShareThatBoils(cell);
        if (share <= 0) return (0, swelling);
        double rise = Probe * steam.Pressure, held = cell.HeldEnthalpy;
        if (cell.Boundary == Boundary.Boiling) held = steam.LiquidEnthalpy + (cell.Profile.Over(held - steam.LiquidEnthalpy, out _) / share);
        if (cell.Boundary == Boundary.Dew) held = Math.Min(held, steam.VapourEnthalpy);
        double change = WetVolume(_fluid.Saturated(steam.Pressure + rise), held + (rise * cell.Volume / cell.Mass)) - WetVolume(steam, held);
        return (-cell.Mass * share * change / (rise * outVolume), swelling);
    }

    private static double FlowingVolume(in SaturatedPair steam, double enthalpy) =>
        WetVolume(steam, Math.Min(Math.Max(enthalpy, steam.LiquidEnthalpy), steam.VapourEnthalpy));

    private static double WetVolume(in SaturatedPair steam, double enthalpy) => steam.LiquidVolume + (steam.Quality(enthalpy) * (steam.VapourVolume - steam.LiquidVolume));

    // Within one bore G² vM rises by what the flow gains; across a step of the bore p + G² v / 2 is kept.
    private static double MomentumRise(in PassNode node, in PassNode after)
    {
        double before = node.Flow.MassFlux * node.Flow.MassFlux, behind = after.Flow.MassFlux * after.Flow.MassFlux;
        return node.Flow.Bore == after.Flow.Bore
            ? (behind * after.MomentumVolume) - (before * node.MomentumVolume)
            : ((behind * after.HomogeneousVolume) - (before * node.HomogeneousVolume)) / 2;
    }
}
