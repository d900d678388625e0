using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// The pressure along the pass: quasi-steady losses, which the cells then follow through a lag.
internal sealed partial class Channel<TFluid>
{
    // Share of the pressure over which a difference stands for the slope along saturation.
    private const double Probe = 1e-4;

    // A common divisor that has grown beyond this is divided out.
    private const double Huge = 1e100;

    // Mass that the whole pass lets go per pressure [kg/Pa].
    private double _stores;

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
        _stores = 0;
        foreach (ref Cell cell in _cells.AsSpan())
        {
            FindStore(ref cell, inEnthalpy);
            _stores += cell.Store;
            inEnthalpy = cell.OutEnthalpy;
        }
    }

    // Pressure and flow push each other: a rising pressure condenses, so less flows out, so less is lost. They are foreseen together over an
    // inner step, to first order in the change w of each outflow since the losses were found; one after the other they would swing wherever
    // boiling water lets go more mass for a pressure than flows within the lag. With T the head aimed at and H the head that is:
    //   w(i) = w before(i) + g (w(i−1) − w before(i−1)) − K (ṗ − ṗ before) − Km ṗ + t (Q − Q before),  ṗ = ṗ outlet + s (T(i) − H(i))/Δt,
    //   T(i−1) = T(i) + drop(i−1) + r(i−1) w(i−1) + r(i) w(i);
    // s share of the way that the lag leaves open, K store of water and Km of metal, g swelling, t thrust, Q heat to water that stays as warm as it is, r resistance. Eliminated downstream as w = (a − b T)/over, which spares each
    // cell the wait for a division of the one before; solved upstream.
    private void ForeseeFlow(double step, double feedFlow, double outletRate)
    {
        double perStep = 1 / step, reachPerStep = Reach(step) * perStep, a = feedFlow - _lastFeed, b = 0, over = 1, drop = 0, resistance = 0, before = 0;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            double metal = cell.MetalStore * cell.Decay, pull = (cell.Store + metal) * reachPerStep, g = cell.Swelling, r = cell.Resistance, now = cell.Outflow - cell.DropFlow;
            double heat = HeatFrom(cell, cell.Temperature, perStep).Heat - cell.HeatToWater;
            double own = now - (g * before) + (cell.Thrust * heat) + (pull * cell.Head) + (cell.Store * (cell.PressureRate - outletRate)) - (metal * outletRate);
            double less = over + (b * resistance);
            a = (g * (a - (b * drop))) + (own * less);
            over = less + (g * r * b);
            b = (g * b) + (pull * less);
            (cell.Follow, cell.FollowHead, cell.FollowOver) = (a, b, over);
            (drop, resistance, before) = (cell.Drop, r, now);
            if (over > Huge) (a, b, over) = (a / over, b / over, 1);
        }
    }

    // The heads that belong to it, upstream; and what each cell is and holds at its new pressure.
    private void MovePressure(double step, double outletPressure)
    {
        double reach = Reach(step), perStep = 1 / step, head = 0, passed = 0;
        for (int i = _cells.Length - 1; i >= 0; i--)
        {
            ref Cell cell = ref _cells[i];
            // One division for two.
            double r = cell.Resistance, over = cell.FollowOver, sum = over + (r * cell.FollowHead), perBoth = 1 / (over * sum), perOver = perBoth * sum;
            double lost = r * cell.Follow * perOver, lostByHead = r * cell.FollowHead * perOver;
            head = (passed + (cell.Drop + lost)) * (perBoth * over * over);
            passed = lost + ((1 - lostByHead) * head);
            cell.Head += reach * (head - cell.Head);
            double pressure = outletPressure + cell.Head;
            cell.PressureRate = (pressure - cell.Steam.Pressure) * perStep;
            _fluid.Saturated(pressure, out cell.Steam);
            cell.HeldEnthalpy = (cell.Energy + (pressure * cell.Volume)) * cell.PerMass;
        }
    }

    private double Reach(double step) => HeadLag > 0 ? 1 - Math.Exp(-step / HeadLag) : 1;

    // Where both phases are: mass that a cell and its metal let go for each pascal that its pressure falls, and what swells out of it for each kilogram and each joule that come in.
    private void FindStore(ref Cell cell, double inEnthalpy)
    {
        SaturatedPair steam = cell.Steam;
        double outVolume = FlowingVolume(steam, cell.OutEnthalpy), share = ShareThatBoils(cell);
        (cell.Swelling, cell.Store, cell.Thrust, cell.MetalStore, cell.WarmsBy) = (FlowingVolume(steam, inEnthalpy) / outVolume, 0, 0, 0, 0);
        if (share <= 0) return;
        double rise = Probe * steam.Pressure, held = cell.HeldEnthalpy;
        if (cell.Boundary == Boundary.Boiling) held = steam.LiquidEnthalpy + (cell.Profile.Over(held - steam.LiquidEnthalpy, out _) / share);
        if (cell.Boundary == Boundary.Collapse) held = cell.Behind;
        if (cell.Boundary == Boundary.Dew) held = Math.Min(held, steam.VapourEnthalpy);
        SaturatedPair higher = _fluid.Saturated(steam.Pressure + rise);
        double change = WetVolume(higher, held + (rise * cell.Volume / cell.Mass)) - WetVolume(steam, held);
        cell.Store = -cell.Mass * share * change / (rise * outVolume);
        cell.Thrust = share * (steam.VapourVolume - steam.LiquidVolume) / (steam.LatentHeat * outVolume);
        cell.WarmsBy = share * (higher.Temperature - steam.Temperature) / rise;

        // Half, since the water warms evenly over the step.
        if (MetalStores) cell.MetalStore = cell.Thrust * cell.Capacity * cell.WarmsBy / 2;
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
