using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Slip;

public abstract partial class VoidFractionModel
{
    /// <summary>The flowing quality at which this model gives a void fraction: the inverse of <see cref="VoidFraction"/>.</summary>
    /// <param name="flow">Steam, mass flux, bore and inclination; its quality plays no part.</param>
    /// <param name="voidFraction">α, 0 to 1, and no more than the model gives at x = 1.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="voidFraction"/> is outside its limits.</exception>
    /// <exception cref="ConvergenceException">The model is not continuous in x.</exception>
    public MassFraction Quality(in TwoPhaseFlow flow, Ratio voidFraction)
    {
        FlowState state = flow.State;
        double alpha = Require.Within(voidFraction.Si(), 0, 1, "Void fraction", Scale.None, nameof(voidFraction));
        double dry = VoidFractionCore(state with { Quality = 1 });
        if (alpha > dry) throw Require.OutOfRange(alpha, "Void fraction", Scale.None, nameof(voidFraction), $"must not exceed {Scale.None.Text(dry)}, which {Name} gives for dry steam");

        return MassFraction.FromDecimalFractions(QualityCore(state, alpha));
    }

    /// <summary>x [kg/kg] for a raw flow and a void fraction that the model can reach.</summary>
    internal double QualityCore(in FlowState flow, double voidFraction)
    {
        RootResult root = BracketedRoot.TryFind(new VoidExcess(this, flow, voidFraction), 0, 1, 1e-17);
        return root.Converged ? root.X : throw new ConvergenceException($"{Name} has no quality for a void fraction of {Scale.None.Text(voidFraction)}: last x = {Scale.None.Text(root.X)}, residual {Scale.None.Text(root.Residual)} after {root.Evaluations} evaluations.");
    }

    private readonly struct VoidExcess(VoidFractionModel model, FlowState flow, double voidFraction) : IScalarFunction
    {
        public double Value(double x) => model.VoidFractionCore(flow with { Quality = x }) - voidFraction;
    }
}
