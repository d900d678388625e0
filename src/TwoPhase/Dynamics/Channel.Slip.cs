using TwoPhase.Flow;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// What flows out of a mixture that is held: slip enters the flux, and nothing else.
internal sealed partial class Channel<TFluid>
{
    private const int GreatestTries = 30;

    // What is left of the flowing quality after a step along a kept slope; and how far a slope is kept. Both relative to the rarer phase.
    private const double SmallChange = 1e-5, Kept = 0.02;

    /// <summary>Finds the flowing quality whose void fraction is that of the mixture held.</summary>
    /// <remarks>Newton's method, begun along the slope of the inner step before, so that a step costs one call of the slip model.</remarks>
    private void Part(ref Cell cell, double held)
    {
        SaturatedPair steam = cell.Steam;
        double mixture = (held * steam.VapourVolume) + ((1 - held) * steam.LiquidVolume), alpha = held * steam.VapourVolume / mixture;
        bool known = cell.VoidByQuality > 0;
        double x = known ? Inside(cell.FlowQuality, cell.FlowQuality + ((alpha - cell.VoidFraction) / cell.VoidByQuality)) : held;
        FlowState flow = FlowOf(cell);
        for (int i = 0; i < GreatestTries; i++)
        {
            double found = _models.Slip.VoidFractionCore(flow with { Quality = x }), rarer = Math.Min(x, 1 - x);
            bool keep = known && i == 0 && Math.Abs(x - cell.SlopeQuality) < Kept * rarer;
            if (!keep) (cell.VoidByQuality, cell.SlopeQuality) = (SlopeAt(flow, x, found), x);
            double next = Inside(x, x + ((alpha - found) / cell.VoidByQuality)), change = Math.Abs(next - x);
            x = next;
            if (change < (keep ? SmallChange * rarer : 1e-9)) break;
        }

        cell.FlowQuality = x;
        cell.VoidFraction = alpha;
        cell.FlowEnthalpy = steam.LiquidEnthalpy + (x * steam.LatentHeat);
        cell.WaveFactor = WaveFactorOf(steam, mixture, cell.VoidByQuality);
    }

    // Half way to the end that a step would overshoot.
    private static double Inside(double from, double to) => to <= 0 ? from / 2 : to >= 1 ? (1 + from) / 2 : to;

    private double SlopeAt(in FlowState flow, double x, double alpha)
    {
        double probe = 1e-5 * Math.Min(x, 1 - x);
        return (_models.Slip.VoidFractionCore(flow with { Quality = x + probe }) - alpha) / probe;
    }

    // ∂x/∂q = 1 / (∂α/∂x · ∂q/∂α), with ∂α/∂q = v′ v″ / v² of the mixture held.
    private static double WaveFactorOf(in SaturatedPair steam, double mixture, double voidByQuality) =>
        steam.LiquidVolume * steam.VapourVolume / (mixture * mixture * voidByQuality);
}
