using TwoPhase.Flow;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>
    /// The one form into which Butterworth, Int. J. Multiphase Flow 1(4), 553-560 (1975), cast the early correlations:
    /// α = 1 / {1 + A [(1 − x)/x]^p (ρg/ρl)^q (μl/μg)^s}.
    /// </summary>
    private sealed class ButterworthCorrelation(string name, double a, double p, double q, double s) : VoidFractionModel
    {
        public override string Name => name;

        protected internal override double VoidFractionCore(in FlowState flow) =>
            1 / (1 + (Properties(flow) * Math.Pow((1 - flow.Quality) / flow.Quality, p)));

        // The liquid-to-vapour ratio (1 − x)/x is infinite at x = 0: the slip ratio then has its limit 0 (p below 1) or a constant (p = 1).
        protected internal override double SlipRatioCore(in FlowState flow) =>
            Properties(flow) * Math.Pow((1 - flow.Quality) / flow.Quality, p - 1) * (flow.LiquidDensity / flow.VapourDensity);

        private double Properties(in FlowState flow) =>
            a * Math.Pow(flow.VapourDensity / flow.LiquidDensity, q) * Math.Pow(flow.LiquidViscosity / flow.VapourViscosity, s);
    }
}
