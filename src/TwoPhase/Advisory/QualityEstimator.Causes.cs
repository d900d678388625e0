using TwoPhase.Numerics;

namespace TwoPhase.Advisory;

// What each cause of a shift would mean by itself.
public sealed partial class QualityEstimator
{
    // How far a flow may be off and still be sought, as a factor.
    private const double LowestFlow = 0.4, HighestFlow = 1.35;

    /// <summary>Whether something is known and nothing moves.</summary>
    internal bool IsAtRest => _shadow.Runs && _trust is Trust.Believable or Trust.Disagreement;

    /// <summary>exp(a), heat per firing over that of the calibration.</summary>
    internal double HeatFactor => Math.Exp(_heat.Factor);

    /// <summary>Heat at full firing by the calibration [W].</summary>
    internal double CalibratedHeat => _learntHeat;

    /// <summary>ln Δp and ln ṁ, smoothed.</summary>
    internal (double Differential, double Flow) Smoothed => (_differential.Level, _flow.Level);

    /// <summary>∂ln Δp/∂ln ṁ at the same heat.</summary>
    internal double DifferentialByFlow => 2 - DifferentialByHeat;

    /// <summary>Quality, outlet flow and heat that explain the measured differential, for each cause; NaN where it cannot.</summary>
    internal (ShiftCause Cause, double Quality, double Flow, double Heat)[] Explanations()
    {
        double flow = Math.Exp(_flow.Level), heatNow = Firing * _learntHeat * Math.Exp(_heat.Factor), heatBefore = Firing * _learntHeat * Math.Exp(_heat.Base);
        var answer = new MeterAnswer(this, heatBefore, _differential.Level - _meterFactor);
        RootResult root = BracketedRoot.TryFind(answer, LowestFlow * flow, HighestFlow * flow, 1e-9 * flow);
        double other = root.Converged ? root.X : double.NaN;
        return
        [
            (ShiftCause.Heat, Resting(heatNow, flow), flow, heatNow),
            (ShiftCause.Meter, Resting(heatBefore, flow), flow, heatBefore),
            (ShiftCause.FeedFlow, Resting(heatBefore, other), other, heatBefore),
            (ShiftCause.Leak, Resting(heatBefore, other), other < flow ? other : double.NaN, heatBefore),
        ];
    }

    private double Resting(double heat, double flow) => _shadow.RestingQuality(heat, flow, _temperature.Level, _pressure.Level);

    /// <summary>By how much the meter's answer to a flow is above what was measured, in ln Δp.</summary>
    private readonly struct MeterAnswer(QualityEstimator owner, double heat, double measured) : IScalarFunction
    {
        public double Value(double flow) => Math.Log(owner.Meter.DifferentialOrNaN(flow, owner._pressure.Level, owner.Resting(heat, flow))) - measured;
    }
}
