using TwoPhase.Numerics;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>Steps in which the quality of a model of unknown trend is searched for every crossing.</summary>
    private const int SearchSteps = 64;

    /// <summary>Steps after which the usual reading has long converged.</summary>
    private const int ShortSteps = 9;

    /// <summary>Residual from which the next step is the last: where the formula bends at once, its slope is a per cent wrong, and 1e-12 is left.</summary>
    private const double LastResidual = 1e-10;

    /// <summary>Solves 1/(ρe C²) = 2 Δp (ε E A/ṁ)², whose right side the reading gives, for the quality.</summary>
    private QualitySolution SolveQuality(in MeterGeometry geometry, in MeterState state)
    {
        double perFlow = state.Expansibility * geometry.FlowArea / state.TotalMassFlow;
        double target = 2 * state.Differential * perFlow * perFlow;
        if (Model.HasClosedInverse && !Meter.CoefficientDependsOnReynolds)
        {
            double c = state.DischargeCoefficient;
            return new QualitySolution(Model.QualityFromVolume(state, target * c * c));
        }

        if (Model is WetSteamModel.ExponentModel sloped && TryNewton(sloped, geometry, state, target, out double newton)) return new QualitySolution(newton);
        var reduced = new ReducedVolume(this, geometry, state, target);
        if (Model.Trend != DifferentialTrend.Unknown && TryChords(reduced, out double chords)) return new QualitySolution(chords);
        double low = Model.LowestQuality, atLow = reduced.Value(low), atDry = reduced.Value(1);
        return Model.Trend == DifferentialTrend.Unknown ? SearchEverywhere(reduced, low, atLow, atDry)
            : atLow >= 0 ? Continued(geometry, state, target, low)
            : atDry > (Model.Trend == DifferentialTrend.RisingThenFalling ? Residual : 0) ? Between(reduced, low, atLow, 1, atDry)
            : Model.Trend == DifferentialTrend.RisingThenFalling ? SearchBelowPeak(geometry, state, target, reduced, low, atLow, atDry)
            : Continued(geometry, state, target, 1);
    }

    /// <summary>
    /// The short way for the usual reading: from the homogeneous quality along the chord to dry steam, then on the parabola through the last three points,
    /// until what is left is round-off. Only a root inside the formula's range counts, and only where it is the only one; everything else is left to
    /// the search between brackets.
    /// </summary>
    private bool TryChords(in ReducedVolume reduced, out double quality)
    {
        double dry = reduced.Value(1), last = 1, lowest = Model.LowestQuality;
        double before = Fast.Clamp(reduced.HomogeneousQuality, lowest + 0.05, 0.95), atBefore = reduced.Value(before), slope = (dry - atBefore) / (1 - before);
        quality = before - (atBefore / slope);
        for (int i = 0; i < ShortSteps && quality > lowest && quality < 1; i++)
        {
            // The reciprocals wait for nothing that the evaluation yields.
            double perLast = 1 / (quality - last), perBefore = 1 / (quality - before), here = reduced.Value(quality);
            double chord = (here - atBefore) * perBefore, curvature = (chord - slope) * perLast;
            (last, before, atBefore, slope, quality) = (before, quality, here, chord, quality - (here / (chord + (curvature * (quality - before)))));
            if (Math.Abs(here) <= LastResidual) return quality > lowest && quality < 1 && (Model.Trend == DifferentialTrend.Rising || dry > Residual);
        }

        return false;
    }

    /// <summary>Outside the range of the formula: the homogeneous slope from its nearer end, with C as at that end.</summary>
    private QualitySolution Continued(in MeterGeometry geometry, in MeterState state, double target, double end)
    {
        MeterState atEnd = WithCoefficient(geometry, state, end);
        double c = Model.DischargeCoefficientCore(atEnd, end);
        double volume = Model.EffectiveVolume(atEnd, end), slope = (1 / state.VapourDensity) - (1 / state.LiquidDensity);
        return new QualitySolution(end + (((target * c * c) - volume) / slope));
    }

    private static QualitySolution Between(in ReducedVolume reduced, double low, double atLow, double high, double atHigh, double other = double.NaN)
    {
        RootResult result = BracketedRoot.TryFind(reduced, low, atLow, high, atHigh, 1e-16);
        return Accepted(result) ? new QualitySolution(result.X, other) : new QualitySolution(double.NaN);
    }

    /// <summary>A reading at or above that of dry steam, by a model that peaks before: below the peak, beyond it too, or above every quality.</summary>
    private QualitySolution SearchBelowPeak(in MeterGeometry geometry, in MeterState state, double target, in ReducedVolume reduced, double low, double atLow, double atDry)
    {
        double peak = Peak(reduced, low, 1), atPeak = reduced.Value(peak);
        if (!(atPeak > Residual)) return atDry > 0 ? Between(reduced, low, atLow, 1, atDry) : Continued(geometry, state, target, 1);
        double other = atDry < 0 ? BracketedRoot.TryFind(reduced, peak, atPeak, 1, atDry, 1e-15).X : 1;
        return Between(reduced, low, atLow, peak, atPeak, other);
    }

    /// <summary>Every crossing on a grid, for a model that does not state its trend: the lowest is the answer, the next is told.</summary>
    private QualitySolution SearchEverywhere(in ReducedVolume reduced, double low, double atLow, double atDry)
    {
        double first = double.NaN, second = double.NaN, left = low, atLeft = atLow;
        for (int step = 1; step <= SearchSteps && double.IsNaN(second); step++)
        {
            double right = low + ((1 - low) * step / SearchSteps), atRight = reduced.Value(right);
            if (atLeft == 0 || atLeft * atRight < 0)
            {
                double crossing = Between(reduced, left, atLeft, right, atRight).Quality;
                if (double.IsNaN(first)) first = crossing;
                else second = crossing;
            }

            (left, atLeft) = (right, atRight);
        }

        if (!double.IsNaN(first)) return new QualitySolution(first, second);
        return atLow > 0 ? Continued(reduced.Geometry, reduced.State, reduced.Target, low)
            : atDry <= 0 ? Continued(reduced.Geometry, reduced.State, reduced.Target, 1)
            : new QualitySolution(double.NaN);
    }

    /// <summary>Golden-section search for the highest value of a function with one peak, to half the digits, which is all that its flat top gives.</summary>
    private static double Peak(in ReducedVolume reduced, double low, double high)
    {
        const double golden = 0.6180339887498949;
        double a = high - (golden * (high - low)), b = low + (golden * (high - low));
        double atA = reduced.Value(a), atB = reduced.Value(b);
        while (high - low > 1e-9)
        {
            if (atA > atB)
            {
                (high, b, atB) = (b, a, atA);
                a = high - (golden * (high - low));
                atA = reduced.Value(a);
            }
            else
            {
                (low, a, atA) = (a, b, atB);
                b = low + (golden * (high - low));
                atB = reduced.Value(b);
            }
        }

        return (low + high) / 2;
    }

    private readonly struct QualitySolution(double quality, double other = double.NaN)
    {
        public double Quality { get; } = quality;

        /// <summary>A second quality that fits, above the first; NaN where there is none.</summary>
        public double Other { get; } = other;

        public ReadingStatus Status => StatusOf(Quality);
    }

    /// <summary>√(1/(ρe C²)) over that of its target, less one: zero at the quality sought, and for most models nearly a straight line.</summary>
    private readonly struct ReducedVolume(QualityMeter owner, in MeterGeometry geometry, in MeterState state, double target) : IScalarFunction
    {
        private readonly MeterGeometry _geometry = geometry;
        private readonly MeterState _state = state;
        private readonly CoefficientLaw _law = owner.Meter.LawOf(geometry);
        private readonly double _perRoot = 1 / Fast.Sqrt(target);

        public MeterGeometry Geometry => _geometry;

        public MeterState State => _state;

        public double Target { get; } = target;

        /// <summary>The quality of the homogeneous model, with C in the limit where it depends on the flow.</summary>
        public double HomogeneousQuality
        {
            get
            {
                double liquid = 1 / _state.LiquidDensity, vapour = 1 / _state.VapourDensity;
                return ((Target * _law.Limit * _law.Limit) - liquid) / (vapour - liquid);
            }
        }

        public double Value(double x) => _law.IsConstant ? Value(_state, x) : Value(owner.WithCoefficient(_geometry, _law, _state, x), x);

        private double Value(in MeterState at, double x) =>
            (_perRoot / (owner.Model.DischargeCoefficientCore(at, x) * Fast.Sqrt(owner.Model.EffectiveDensityCore(at, x)))) - 1;
    }
}
