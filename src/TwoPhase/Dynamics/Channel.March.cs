using System.Runtime.CompilerServices;
using TwoPhase.Numerics;

namespace TwoPhase.Dynamics;

// One inner step: slopes, then mass, energy and metal from inlet to outlet.
internal sealed partial class Channel<TFluid>
{
    // 2 would be superbee. With 5 a front is some 2.4 cells wide, from a tenth to nine tenths, at the small Courant numbers of liquid.
    private const double Sharpest = 5;

    // Enthalpy in an unheated cell like the last one, thought behind it, so that its slope has something to be limited by [J/kg].
    private double _beyond;

    private double _decayStep = double.NaN;

    // Ends at a cell whose outflow stagnates, reverses or would empty it; what follows is outside the model.
    private void March(double step, double feedFlow)
    {
        double perStep = 1 / step, rise = _cells[0].HeatToWater / feedFlow, deviation = (2 * (_cells[0].FlowEnthalpy - FeedEnthalpy)) - rise;
        double inflow = feedFlow, inEnthalpy = FeedEnthalpy, speed = 0, held = 1;
        Portion mixture = default;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            double slope = cell.Slope = SlopeOf(i, perStep, ref rise, ref deviation);
            // Hancock's half step: what the balance makes of the mean within half a step moves the face along with it; at rest it is zero.
            // Written as a line in the inflow, so that each cell waits little for the one before.
            double half = step / 2 * cell.WaveFactor * cell.PerMass, lead = half * ((slope / 2) - (cell.FlowEnthalpy - cell.HeldEnthalpy));
            double still = cell.FlowEnthalpy + (slope / 2) + (half * (cell.HeatToWater - (slope * cell.Outflow))) + (lead * cell.Outflow);
            double heated = cell.Energy + (step * cell.HeatToWater), mass = cell.Mass + (step * inflow), energy = heated + (step * inflow * inEnthalpy);
            double outEnthalpy = still - (lead * inflow);
            if (cell.Boundary == Boundary.Collapse) (mixture, outEnthalpy) = (new(step * inflow, inEnthalpy), WaterLeaving(i));
            bool swept = mixture.Mass > 0 && !HoldsSteam(cell);
            if (mixture.Mass > 0 && !swept) mixture = default;
            double outflow = swept
                ? Sweep(i, step, mass, energy + (cell.Steam.Pressure * cell.Volume), ref mixture, ref outEnthalpy)
                : cell.Boundary == Boundary.None ? OutflowOf(cell, perStep, heated, inflow, inEnthalpy, still, lead)
                : ClosureOf(cell).Outflow(cell.Volume, step, mass, energy + (cell.Steam.Pressure * cell.Volume), outEnthalpy, cell.Outflow);
            if (!(outflow > 0 && step * outflow < mass))
            {
                Stagnant = i;
                return;
            }

            cell.Mass = mass - (step * outflow);
            cell.Energy = energy - (step * outflow * outEnthalpy);
            cell.Outflow = inflow = outflow;
            cell.OutEnthalpy = inEnthalpy = outEnthalpy;
            double wave = cell.WaveFactor * outflow;
            if (wave * held > speed * cell.Mass) (speed, held) = (wave, cell.Mass);
        }

        _beyond += Math.Min(1, step * Outlet.Outflow / Outlet.Mass) * (Outlet.OutEnthalpy - _beyond);
        CourantRate = speed / held;
    }

    // What flows is reconstructed as the rise that the heat of the moment gives it from face to face, plus the limited slope of what
    // deviates from that. At rest nothing deviates, so rest is exact whatever the heat profile, and only true fronts meet the limiter.
    // Rises go by the flow that comes in: with what goes out, the volume of a cell that begins to boil would hang on its own outflow, and swing.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private double SlopeOf(int i, double perStep, ref double rise, ref double deviation)
    {
        ref readonly Cell cell = ref _cells[i];
        double own = rise, before = deviation, perOutflow = 1 / cell.Outflow, volume = cell.Volume, ahead = _beyond - (own / 2), behind = volume;
        if (i + 1 < _cells.Length)
        {
            ref readonly Cell next = ref _cells[i + 1];
            rise = next.HeatToWater * perOutflow;
            ahead = next.FlowEnthalpy - ((own + rise) / 2);
            behind = next.Volume;
        }

        double after = (ahead - cell.FlowEnthalpy) * cell.PerSpacing;
        deviation = after * behind;
        double slope = own + Limited(before, after * volume, cell, perOutflow * perStep);

        // Boiling water over cold metal loses heat faster than it flows; what leaves is still boiling.
        return cell.Boundary == Boundary.None && cell.FlowQuality > 0 ? Math.Max(slope, cell.Steam.LiquidEnthalpy - cell.FlowEnthalpy) : slope;
    }

    // Where both phases flow every wave grows on its way, and a limiter that sharpens makes stairs of it: monotonised central difference.
    private static double Limited(double left, double right, in Cell cell, double perOutflowAndStep)
    {
        // Counted in the direction of the left one, a right one the other way is negative, and so is the least that is made of it: no slope.
        double sign = Fast.Sign(left), a = sign * left, b = sign * right, boils = ShareThatBoils(cell), size = 0;
        if (boils > 0) size = boils * Fast.Min((a + b) / 2, 2 * Fast.Min(a, b));
        if (boils < 1) size += (1 - boils) * Sharp(a, b, 2 * cell.Mass * perOutflowAndStep);
        return sign * Fast.Max(0, size);
    }

    // A single phase carries its enthalpy along unchanged: superbee, sharpened as far as the Courant number allows without overshoot.
    private static double Sharp(double left, double right, double bound) =>
        Fast.Max(Fast.Min(Fast.Min(Sharpest, bound) * left, right), Fast.Min(left, 2 * right));

    // Over a step with the water at one temperature: Tw → T + Q R + (Tw − T − Q R) exp(−t/(R C)).
    private void Warm(ref Cell cell, double perStep)
    {
        double fire = AbsorbedHeat * cell.HeatShare, end = cell.RestingWall(fire);
        if (!MetalStores || cell.Capacity <= 0)
        {
            cell.HeatToWater = fire;
            cell.Wall = end;
            return;
        }

        double change = (end - cell.Wall) * cell.Decay;
        cell.Wall += change;
        cell.HeatToWater = fire - (cell.Capacity * change * perStep);
    }

    // The exponential of each cell holds for as long as its film and the step do; steps of one second are equal but for round-off.
    private void RenewDecay(double step)
    {
        if (!MetalStores || Math.Abs(step - _decayStep) <= 1e-12 * step) return;
        _decayStep = step;
        foreach (ref Cell cell in _cells.AsSpan())
        {
            if (cell.Capacity > 0) cell.Decay = cell.FilmResistance > 0 ? -Expm1(-step / (cell.FilmResistance * cell.Capacity)) : 0;
        }
    }

    private static double Expm1(double x) => Math.Abs(x) < 1e-3 ? x * (1 + (x / 2 * (1 + (x / 3)))) : Math.Exp(x) - 1;
}
