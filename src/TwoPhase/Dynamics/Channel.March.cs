using TwoPhase.Numerics;

namespace TwoPhase.Dynamics;

// One inner step: slopes, then mass, energy and metal from inlet to outlet.
internal sealed partial class Channel<TFluid>
{
    // 2 would be superbee. With 5 a front is some 2.4 cells wide, from a tenth to nine tenths, at the small Courant numbers of liquid.
    private const double Sharpest = 5;

    // Enthalpy in an unheated cell like the last one, thought behind it, so that its slope has something to be limited by [J/kg].
    private double _beyond;

    // What flows is reconstructed as the rise that the heat of the moment gives it from face to face, plus the limited slope of what
    // deviates from that. At rest nothing deviates, so rest is exact whatever the heat profile, and only true fronts meet the limiter.
    private void Reconstruct(double step, double feedFlow)
    {
        double rise = Rise(_cells[0], feedFlow), before = (2 * (_cells[0].FlowEnthalpy - FeedEnthalpy)) - rise;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            double own = rise, after = before, volume = cell.Volume;
            if (i + 1 < _cells.Length)
            {
                ref readonly Cell next = ref _cells[i + 1];
                rise = Rise(next, cell.Outflow);
                after = (next.FlowEnthalpy - cell.FlowEnthalpy - ((own + rise) / 2)) / ((volume + next.Volume) / 2);
            }
            else
            {
                after = (_beyond - cell.FlowEnthalpy - (own / 2)) / volume;
            }

            cell.Slope = own + Limited(before, after * volume, cell, step);
            before = after * (i + 1 < _cells.Length ? _cells[i + 1].Volume : volume);
        }
    }

    // By the flow that comes in: with what goes out, the volume of a cell that begins to boil would hang on its own outflow, and swing.
    private static double Rise(in Cell cell, double inflow) => cell.HeatToWater / inflow;

    // Where both phases flow every wave grows on its way, and a limiter that sharpens makes stairs of it: monotonised central difference.
    private static double Limited(double left, double right, in Cell cell, double step)
    {
        if (!(left * right > 0)) return 0;
        double a = Math.Abs(left), b = Math.Abs(right), boils = ShareThatBoils(cell), size = 0;
        if (boils > 0) size = boils * Math.Min((a + b) / 2, 2 * Math.Min(a, b));
        if (boils < 1) size += (1 - boils) * Sharp(a, b, 2 * cell.Mass / (cell.Outflow * step));
        return left > 0 ? size : -size;
    }

    // A single phase carries its enthalpy along unchanged: superbee, sharpened as far as the Courant number allows without overshoot.
    private static double Sharp(double left, double right, double bound) =>
        Math.Max(Math.Min(Math.Min(Sharpest, bound) * left, right), Math.Min(left, 2 * right));

    // Ends at a cell whose outflow stagnates, reverses or would empty it; what follows is outside the model.
    private void March(double step, double feedFlow)
    {
        double inflow = feedFlow, inEnthalpy = FeedEnthalpy, rate = 0;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            // Hancock's half step: what the balance makes of the mean within half a step moves the face along with it; at rest it is zero.
            double half = step / 2 * cell.WaveFactor / cell.Mass;
            double gain = cell.HeatToWater - (cell.Slope * (inflow + cell.Outflow) / 2) + ((inflow - cell.Outflow) * (cell.FlowEnthalpy - cell.HeldEnthalpy));
            double outEnthalpy = cell.FlowEnthalpy + (cell.Slope / 2) + (half * gain);
            double mass = cell.Mass + (step * inflow);
            double energy = cell.Energy + (step * ((inflow * inEnthalpy) + cell.HeatToWater));
            double outflow = ClosureOf(cell).Outflow(cell.Volume, step, mass, energy + (cell.Steam.Pressure * cell.Volume), outEnthalpy, cell.Outflow);
            if (!(outflow > 0 && step * outflow < mass))
            {
                Stagnant = i;
                return;
            }

            cell.Mass = mass - (step * outflow);
            cell.Energy = energy - (step * outflow * outEnthalpy);
            cell.Outflow = inflow = outflow;
            cell.OutEnthalpy = inEnthalpy = outEnthalpy;
            rate = Math.Max(rate, cell.WaveFactor * outflow / cell.Mass);
        }

        _beyond += Math.Min(1, step * Outlet.Outflow / Outlet.Mass) * (Outlet.OutEnthalpy - _beyond);
        CourantRate = rate;
    }

    // Over a step with the water at one temperature: Tw → T + Q/UA + (Tw − T − Q/UA) exp(−UA t/C).
    private void Warm(ref Cell cell, double step)
    {
        double fire = AbsorbedHeat * cell.HeatShare, end = cell.RestingWall(fire);
        if (!MetalStores || cell.Capacity <= 0)
        {
            cell.HeatToWater = fire;
            cell.Wall = end;
            return;
        }

        double change = (end - cell.Wall) * -Expm1(-cell.Conductance * step / cell.Capacity);
        cell.Wall += change;
        cell.HeatToWater = fire - (cell.Capacity * change / step);
    }

    private static double Expm1(double x) => Math.Abs(x) < 1e-3 ? x * (1 + (x / 2 * (1 + (x / 3)))) : Math.Exp(x) - 1;
}
