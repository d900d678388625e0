using TwoPhase.Limits;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>Which pass to move next, by how much, and how long to wait: one pass at a time, towards a target quality at equal margin.</summary>
/// <remarks>
/// <para>x_set = min(target, x_limit − z·u) of each pass, u its absolute uncertainty; ṁ′/ṁ = (h(x) − hf)/(h(x_set) − hf), h the outlet's and hf the feed's enthalpy, and the firing by the inverse.</para>
/// <para>x_limit is the strictest of the site's outlet quality and solids limits. A pass above its set-point comes before all below theirs, then the furthest first.</para>
/// <para>Source: heat balance of a pass at rest; the margin by JCGM 106:2012.</para>
/// <para>Advisory only: no control, no safety function. Trips, tube-skin thermocouples and the plant's procedures come first, and a licensed operator decides.</para>
/// </remarks>
public sealed class GeneratorAdvice
{
    // Nearer to the set-point than this no move is worth its waiting.
    private const double Near = 0.003, Settled = 60;

    private GeneratorAdvice(IReadOnlyList<PassAdvice> passes) => Passes = passes;

    /// <summary>The passes in the order of the generator.</summary>
    public IReadOnlyList<PassAdvice> Passes { get; }

    /// <summary>The pass to move now; null for none.</summary>
    public PassAdvice? Next => Passes.FirstOrDefault(pass => pass.Reason == AdviceReason.Move);

    /// <summary>The advice for a generator as its estimator has it after the last reading.</summary>
    /// <param name="estimator">The estimator.</param>
    /// <param name="target">Quality wanted, greater than 0, below 1.</param>
    /// <param name="site">The site's limits; <see cref="SiteLimits.Default"/> where none are given.</param>
    /// <exception cref="ArgumentOutOfRangeException">The target is outside its limits.</exception>
    public static GeneratorAdvice Of(GeneratorEstimator estimator, MassFraction target, SiteLimits? site = null)
    {
        Require.NotNull(estimator, nameof(estimator));
        double wanted = Require.Below(Require.Positive(target.Si(), "Target quality", Scale.None, nameof(target)), 1, "Target quality", Scale.None, nameof(target));
        site ??= SiteLimits.Default;
        Standing[] passes = [.. estimator.Estimators.Select((pass, i) => Standing.Of(pass, estimator.Estimates[i], wanted, site))];
        bool settles = passes.Any(pass => pass.Reason == AdviceReason.Settling);
        int next = settles ? -1 : Furthest(passes);
        return new([.. passes.Select((pass, i) => pass.Advised(i == next, settles, site))]);
    }

    private static int Furthest(Standing[] passes)
    {
        int next = -1;
        for (int i = 0; i < passes.Length; i++)
        {
            if (passes[i].Reason == AdviceReason.Move && (next < 0 || passes[i].Urgency > passes[next].Urgency)) next = i;
        }

        return next;
    }

    /// <summary>A pass by itself, before it is known whose turn it is.</summary>
    private readonly record struct Standing(QualityEstimator Estimator, AdviceReason Reason, double SetPoint, double Above)
    {
        // Any pass above its set-point before any below.
        public double Urgency => Above > 0 ? 1 + Above : -Above;

        public static Standing Of(QualityEstimator estimator, in QualityEstimate estimate, double wanted, SiteLimits site)
        {
            if (estimate.State is not (OperatingState.Running or OperatingState.Unknown)) return new(estimator, AdviceReason.NotRunning, double.NaN, double.NaN);
            if (estimate.Trust is Trust.Settling or Trust.ReadsHigh or Trust.ReadsLow) return new(estimator, AdviceReason.Settling, double.NaN, double.NaN);
            if (estimate.Trust != Trust.Believable || estimate.Absolute is not { } uncertainty) return new(estimator, AdviceReason.NotBelievable, double.NaN, double.NaN);
            double limit = site.Solids.Aggregate(site.OutletQuality.Si(), static (strictest, solids) => Math.Min(strictest, solids.RawGreatestQuality));
            double setPoint = limit <= 0 ? limit : Math.Min(wanted, GuardBand.Below(MassFraction.FromDecimalFractions(limit), uncertainty, GuardBand.UsualConfidence).Si());
            if (setPoint <= 0) return new(estimator, AdviceReason.NoRoom, double.NaN, double.NaN);
            double above = estimate.RawQuality - setPoint;
            return new(estimator, Math.Abs(above) <= Math.Max(Near, 2 * estimate.RawMotion) ? AdviceReason.AtSetPoint : AdviceReason.Move, setPoint, above);
        }

        public PassAdvice Advised(bool isNext, bool settles, SiteLimits site)
        {
            AdviceReason reason = Reason != AdviceReason.Move || isNext ? Reason : settles ? AdviceReason.Settling : AdviceReason.AnotherFirst;
            double flow = double.IsNaN(SetPoint) ? 0 : Estimator.FlowFor(SetPoint) - 1;
            return new(Estimator.Pass.Name, reason, SetPoint, flow, Estimator.Residence + Settled, LimitsOf(site));
        }

        // A state that the steady solver cannot have is none to give limits of.
        private PassLimits? LimitsOf(SiteLimits site)
        {
            try
            {
                return Estimator.Conditions is { } conditions ? PassLimits.Of(SteadyState.Solve(Estimator.Pass, conditions, Estimator.Options.Models), site) : null;
            }
            catch (ConvergenceException)
            {
                return null;
            }
        }
    }
}
