using TwoPhase.Numerics;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>
    /// The short way for a model that knows its slopes: Newton's method on V/(2 Δp) (ṁ/(ε E A))² − C² from the homogeneous quality, bent by the change of
    /// the slope over the last step. False where it does not settle on the only quality inside the formula's range.
    /// </summary>
    private bool TryNewton(WetSteamModel.ExponentModel model, in MeterGeometry geometry, in MeterState state, double target, out double quality)
    {
        CoefficientLaw law = Meter.LawOf(geometry);
        var terms = new StateTerms(state);
        double perTarget = 1 / target, liquid = 1 / state.LiquidDensity, vapour = 1 / state.VapourDensity, first = law.Limit;
        double reynolds = Reynolds(geometry, state, 0), reynoldsSlope = Reynolds(geometry, state, 1) - reynolds;
        quality = Fast.Clamp(((target * first * first) - liquid) / (vapour - liquid), 0.05, 0.95);
        double before = quality, lastSlope = double.NaN;
        for (int i = 0; i < ShortSteps && quality > 0 && quality < 1; i++)
        {
            Sloped volume = model.Volume(state, terms, quality), c = model.Coefficient(state, terms, law.Over(quality, reynolds, reynoldsSlope), quality);
            double here = (volume.Value * perTarget) - (c.Value * c.Value), slope = (volume.Slope * perTarget) - (2 * c.Value * c.Slope);
            double perSlope = 1 / slope, step = -here * perSlope;
            double bend = i == 0 ? 0 : (slope - lastSlope) / (quality - before) / 2 * step * perSlope;
            (before, lastSlope, quality) = (quality, slope, quality + (step * (1 - bend + (2 * bend * bend))));
            if (Math.Abs(here) <= LastResidual) return quality > 0 && quality < 1 && (model.Trend == DifferentialTrend.Rising || IsBelowDry(model, state, terms, perTarget));
        }

        return false;
    }

    private static bool IsBelowDry(WetSteamModel.ExponentModel model, in MeterState state, in StateTerms terms, double perTarget)
    {
        double c = model.Coefficient(state, terms, new(state.DischargeCoefficient, 0), 1).Value;
        return (perTarget / state.VapourDensity) - (c * c) > 2 * Residual;
    }
}
