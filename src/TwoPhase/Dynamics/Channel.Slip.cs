using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.Numerics;
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
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Part(ref Cell cell)
    {
        ref readonly SaturatedPair steam = ref cell.Steam;
        double latent = steam.LatentHeat, excess = steam.VapourVolume - steam.LiquidVolume, above = cell.HeldEnthalpy - steam.LiquidEnthalpy;
        // α = q v″ / (v′ + q (v″ − v′)). One division for two: each costs as much as many products.
        double sum = (steam.LiquidVolume * latent) + (above * excess), perBoth = 1 / (sum * latent), perSum = perBoth * latent, alpha = above * steam.VapourVolume * perSum;
        bool known = cell.QualityByVoid > 0;
        double x = known ? Inside(cell.FlowQuality, cell.FlowQuality + ((alpha - cell.VoidFraction) * cell.QualityByVoid)) : above / latent;
        double found = _models.Slip.VoidFractionCore(FlowOf(cell, x)), rarer = Fast.Min(x, 1 - x), next = x + ((alpha - found) * cell.QualityByVoid);
        bool near = known && Math.Abs(x - cell.SlopeQuality) < Kept * rarer && Math.Abs(next - x) < SmallChange * rarer;
        x = near ? next : Search(ref cell, alpha, x);
        cell.Temperature = steam.Temperature;
        cell.FlowQuality = x;
        cell.VoidFraction = alpha;
        cell.FlowEnthalpy = steam.LiquidEnthalpy + (x * latent);
        cell.WaveFactor = WaveFactorOf(steam, latent * perSum, cell.QualityByVoid);
        cell.VolumeByEnthalpy = excess * sum * perBoth;
        cell.VolumeByMass = steam.LiquidVolume - (cell.VolumeByEnthalpy * steam.LiquidEnthalpy);
    }

    private double Search(ref Cell cell, double alpha, double x)
    {
        for (int i = 0; i < GreatestTries; i++)
        {
            FlowState flow = FlowOf(cell, x);
            double found = _models.Slip.VoidFractionCore(flow);
            (cell.QualityByVoid, cell.SlopeQuality) = (QualityByVoidAt(flow, x, found), x);
            double next = Inside(x, x + ((alpha - found) * cell.QualityByVoid)), change = Math.Abs(next - x);
            x = next;
            if (change < 1e-9) break;
        }

        return x;
    }

    // Half way to the end that a step would overshoot.
    private static double Inside(double from, double to) => to <= 0 ? from / 2 : to >= 1 ? (1 + from) / 2 : to;

    private double QualityByVoidAt(in FlowState flow, double x, double alpha)
    {
        double probe = 1e-5 * Math.Min(x, 1 - x);
        return probe / (_models.Slip.VoidFractionCore(flow with { Quality = x + probe }) - alpha);
    }

    // ∂x/∂q = ∂x/∂α · ∂α/∂q, with ∂α/∂q = v′ v″ / v² of the mixture held.
    private static double WaveFactorOf(in SaturatedPair steam, double perMixture, double qualityByVoid) =>
        steam.LiquidVolume * steam.VapourVolume * perMixture * perMixture * qualityByVoid;
}
