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
        FindFaces(step, feedFlow);
        var stream = new Stream(feedFlow, FeedEnthalpy, 0);
        Portion mixture = default;
        for (int i = 0; i < _cells.Length && Stagnant < 0; i++)
        {
            if (mixture.Mass == 0) i = RunAlike(i, step, ref stream);
            if (i < _cells.Length && Stagnant < 0) RunInParts(i, step, ref stream, ref mixture);
        }

        if (Stagnant >= 0) return;
        _beyond += Math.Min(1, step * Outlet.Outflow / Outlet.Mass) * (Outlet.OutEnthalpy - _beyond);
        CourantRate = stream.Rate;
    }

    // The enthalpy that leaves over each outlet face, as a line in the flow that comes in, so that each cell waits little for the one before.
    [MethodImpl(MethodImplOptions.NoInlining)]
    private void FindFaces(double step, double feedFlow)
    {
        Span<Cell> cells = _cells;
        double perStep = 1 / step, halfStep = step / 2, rise = cells[0].HeatToWater / feedFlow, deviation = (2 * (cells[0].FlowEnthalpy - FeedEnthalpy)) - rise;
        for (int i = 0; i < cells.Length; i++)
        {
            ref Cell cell = ref cells[i];
            double half = halfStep * cell.WaveFactor * cell.PerMass, slope = cell.Slope = SlopeOf(cells, i, perStep, half, ref rise, ref deviation);

            // Hancock's half step: what the balance makes of the mean within half a step moves the face along with it; at rest it is zero.
            double rest = slope / 2, ahead = cell.FlowEnthalpy - cell.HeldEnthalpy;
            cell.Lead = half * (rest - ahead);
            cell.Still = cell.FlowEnthalpy + rest + (half * (cell.HeatToWater - (cell.Outflow * (rest + ahead))));
        }
    }

    // From a cell on to the next one in which a boundary stands; returns its index. Apart from that one, so that the flow goes from cell to cell in a register.
    [MethodImpl(MethodImplOptions.NoInlining)]
    private int RunAlike(int i, double step, ref Stream stream)
    {
        Span<Cell> cells = _cells;
        double perStep = 1 / step;
        (double inflow, double inEnthalpy, double rate) = stream;
        for (; i < cells.Length; i++)
        {
            ref Cell cell = ref cells[i];
            if (cell.Boundary != Boundary.None) break;
            double heated = cell.Energy + (step * cell.HeatToWater), mass = cell.Mass + (step * inflow), energy = heated + (step * inflow * inEnthalpy);
            double outflow = OutflowOf(cell, perStep, heated, inflow, inEnthalpy, cell.Still, cell.Lead);
            if (!(outflow > 0 && step * outflow < mass))
            {
                Stagnant = i;
                break;
            }

            inEnthalpy = cell.Still - (cell.Lead * inflow);
            inflow = outflow;
            Leave(ref cell, step, mass, energy, outflow, inEnthalpy);
            rate = Fast.Max(rate, cell.WaveFactor * outflow * cell.PerMass);
        }

        stream = new(inflow, inEnthalpy, rate);
        return i;
    }

    // A cell in which a boundary stands, or which mixture breaks into.
    private void RunInParts(int i, double step, ref Stream stream, ref Portion mixture)
    {
        ref Cell cell = ref _cells[i];
        double mass = cell.Mass + (step * stream.Flow), heated = cell.Energy + (step * cell.HeatToWater), energy = heated + (step * stream.Flow * stream.Enthalpy);
        double outEnthalpy = cell.Still - (cell.Lead * stream.Flow), content = energy + (cell.Steam.Pressure * cell.Volume), outflow;
        if (cell.Boundary == Boundary.Collapse) (mixture, outEnthalpy) = (new(step * stream.Flow, stream.Enthalpy), WaterLeaving(i));
        if (mixture.Mass > 0 && !HoldsSteam(cell))
        {
            outflow = Sweep(i, step, mass, content, ref mixture, ref outEnthalpy);
        }
        else
        {
            mixture = default;
            outflow = cell.Boundary == Boundary.None
                ? OutflowOf(cell, 1 / step, heated, stream.Flow, stream.Enthalpy, cell.Still, cell.Lead)
                : ClosureOf(cell).Outflow(cell.Volume, step, mass, content, outEnthalpy, cell.Outflow);
        }

        if (!(outflow > 0 && step * outflow < mass))
        {
            Stagnant = i;
            return;
        }

        Leave(ref cell, step, mass, energy, outflow, outEnthalpy);
        stream = new(outflow, outEnthalpy, Math.Max(stream.Rate, cell.WaveFactor * outflow * cell.PerMass));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Leave(ref Cell cell, double step, double mass, double energy, double outflow, double outEnthalpy)
    {
        double left = mass - (step * outflow);
        (cell.Mass, cell.PerMass) = (left, 1 / left);
        cell.Energy = energy - (step * outflow * outEnthalpy);
        (cell.Outflow, cell.OutEnthalpy) = (outflow, outEnthalpy);
    }

    // What flows is reconstructed as the rise that the heat of the moment gives it from face to face, plus the limited slope of what
    // deviates from that. At rest nothing deviates, so rest is exact whatever the heat profile, and only true fronts meet the limiter.
    // Rises go by the flow that comes in: with what goes out, the volume of a cell that begins to boil would hang on its own outflow, and swing.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private double SlopeOf(ReadOnlySpan<Cell> cells, int i, double perStep, double half, ref double rise, ref double deviation)
    {
        ref readonly Cell cell = ref cells[i];
        double own = rise, before = deviation, perOutflow = 1 / cell.Outflow, volume = cell.Volume, ahead = _beyond - (own / 2), behind = volume;
        if (i + 1 < cells.Length)
        {
            ref readonly Cell next = ref cells[i + 1];
            rise = next.HeatToWater * perOutflow;
            ahead = next.FlowEnthalpy - ((own + rise) / 2);
            behind = next.Volume;
        }

        double after = (ahead - cell.FlowEnthalpy) * cell.PerSpacing;
        deviation = after * behind;
        double slope = own + Limited(before, after * volume, cell, perOutflow * perStep, 2 * half * cell.Outflow);

        // Boiling water over cold metal loses heat faster than it flows; what leaves is still boiling.
        return cell.Boundary == Boundary.None && cell.FlowQuality > 0 ? Fast.Max(slope, cell.Steam.LiquidEnthalpy - cell.FlowEnthalpy) : slope;
    }

    // Where both phases flow every wave grows on its way, and a limiter that sharpens makes stairs of it: the upwind slope of third order in place and time
    // (Leonard, Comput. Methods Appl. Mech. Eng. 19, 59-98 (1979), from memory), monotonised.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static double Limited(double left, double right, in Cell cell, double perOutflowAndStep, double courant)
    {
        // Counted in the direction of the left one, a right one the other way is negative, and so is the least that is made of it: no slope.
        double sign = Fast.Sign(left), a = sign * left, b = sign * right, bound = 2 * cell.Mass * perOutflowAndStep;
        double size = cell.Boundary != Boundary.None ? Mixed(a, b, bound, courant, ShareThatBoils(cell)) : cell.FlowQuality > 0 && cell.FlowQuality < 1 ? Third(a, b, courant) : Sharp(a, b, bound);
        return sign * Fast.Max(0, size);
    }

    private static double Mixed(double left, double right, double bound, double courant, double boils) => (boils * Third(left, right, courant)) + ((1 - boils) * Sharp(left, right, bound));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static double Third(double left, double right, double courant) =>
        Fast.Min((left + (2 * right) + (courant * (left - right))) * (1.0 / 3), 2 * Fast.Min(left, right));

    // A single phase carries its enthalpy along unchanged: superbee, sharpened as far as the Courant number allows without overshoot.
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static double Sharp(double left, double right, double bound) =>
        Fast.Max(Fast.Min(Fast.Min(Sharpest, bound) * left, right), Fast.Min(left, 2 * right));

    private void WarmMetal(double step)
    {
        double halfStep = step / 2, perStep = 1 / step;
        foreach (ref Cell cell in _cells.AsSpan()) Warm(ref cell, halfStep, perStep);
    }

    // Over a step with the water at one temperature, that of its middle: Tw → T + Q R + (Tw − T − Q R) exp(−t/(R C)).
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Warm(ref Cell cell, double halfStep, double perStep) =>
        (cell.HeatToWater, cell.Wall) = HeatFrom(cell, cell.Temperature - (halfStep * cell.PressureRate * cell.WarmsBy), perStep);

    // Heat to water of a temperature, mean over a step [W], and the metal at the end of it [K].
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private (double Heat, double Wall) HeatFrom(in Cell cell, double water, double perStep)
    {
        double fire = AbsorbedHeat * cell.HeatShare, end = water + (fire * cell.FilmResistance);
        if (!MetalStores || cell.Capacity <= 0) return (fire, end);
        double change = (end - cell.Wall) * cell.Decay;
        return (fire - (cell.Capacity * change * perStep), cell.Wall + change);
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

    /// <summary>What flows from cell to cell [kg/s] with its enthalpy [J/kg], and the highest Courant number per second of step so far [1/s].</summary>
    private readonly record struct Stream(double Flow, double Enthalpy, double Rate);
}
