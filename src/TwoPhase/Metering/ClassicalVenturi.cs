using TwoPhase.Flow;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>Classical Venturi tube to ISO 5167-4: conical convergent, cylindrical throat, conical divergent.</summary>
/// <remarks>
/// <para>C = 0.984 as cast, 0.995 machined, 0.985 rough-welded [-]; the expansibility is that of isentropic flow to the throat.</para>
/// <para>Range: as cast 100 mm ≤ D ≤ 800 mm, 0.3 ≤ β ≤ 0.75; machined 50 mm ≤ D ≤ 250 mm, 0.4 ≤ β ≤ 0.75; rough-welded 200 mm ≤ D ≤ 1200 mm,
/// 0.4 ≤ β ≤ 0.7; 2·10⁵ ≤ Re ≤ 2·10⁶, machined up to 1·10⁶; p2/p1 ≥ 0.75.</para>
/// <para>Accuracy: with k = 2, C 0.7 % as cast, 1 % machined, 1.5 % rough-welded; ε (4 + 100 β⁸) Δp/p1 %. Outside its Reynolds range the standard's informative
/// annex B gives other mean values (machined: 1.000 from 1 to 2·10⁶, 1.010 above; 0.977 at 1·10⁵), so C is kept as it is and its uncertainty widened:
/// 2 % to 2·10⁶ and 3 % beyond for a machined tube, which is where the wet steam of a pass outlet runs; 3 % for every finish where the annex has no value.</para>
/// <para>Source: ISO 5167-4:2003, 5.2 to 5.7 and annex B (the mean values also in the open-source library fluids 1.3; the widened uncertainties from memory).</para>
/// </remarks>
public sealed class ClassicalVenturi : PrimaryElement
{
    private readonly FinishData _data;

    /// <summary>A classical Venturi tube.</summary>
    /// <param name="pipe">D, bore of the pipe, greater than zero.</param>
    /// <param name="throat">d, diameter of the throat, greater than zero and below the bore.</param>
    /// <param name="finish">How the convergent section was made.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter is outside its limits, or the finish is none of the three.</exception>
    public ClassicalVenturi(Length pipe, Length throat, ConvergentFinish finish)
        : base(pipe, throat, "Throat diameter", nameof(throat))
    {
        _data = FinishData.Of(finish);
        Finish = finish;
    }

    /// <inheritdoc/>
    public override string Name => "classical Venturi tube";

    /// <summary>How the convergent section was made.</summary>
    public ConvergentFinish Finish { get; }

    internal override CoefficientLaw LawOf(in MeterGeometry geometry) => CoefficientLaw.Constant(_data.Coefficient);

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) =>
        Metering.Expansibility.Nozzle(geometry.DiameterRatio, pressure, differential, isentropicExponent);

    private protected override double CoefficientUncertaintyCore(double reynolds) =>
        reynolds >= FinishData.LowestReynolds && reynolds <= _data.HighestReynolds ? _data.Uncertainty
        : Finish == ConvergentFinish.Machined && reynolds > _data.HighestReynolds && reynolds <= 2e6 ? 0.02
        : 0.03;

    private protected override double ExpansibilityUncertaintyCore(double differentialRatio, double isentropicExponent) =>
        (4 + (100 * Math.Pow(DiameterRatio, 8))) / 100 * differentialRatio;

    // Loss of the dry tube in ISO/TR 11583:2012, 6.4.5; it lies inside the 5 % to 20 % of ISO 5167-4:2003, 5.9.
    private protected override double LossRatioCore(double reynolds) => 0.0896 + (0.48 * Math.Pow(DiameterRatio, 9));

    private protected override Applicability LimitsCore(in MeterGeometry geometry, double reynolds) => Applicability.Inside
        .Check(ApplicabilityLimits.Reynolds, reynolds, FinishData.LowestReynolds, _data.HighestReynolds)
        .Check(ApplicabilityLimits.DiameterRatio, geometry.DiameterRatio, _data.LowestRatio, _data.HighestRatio)
        .Check(ApplicabilityLimits.Bore, geometry.PipeDiameter, _data.SmallestPipe, _data.LargestPipe);

    private sealed class FinishData(double coefficient, double uncertainty, double smallestPipe, double largestPipe, double lowestRatio, double highestRatio, double highestReynolds)
    {
        public const double LowestReynolds = 2e5;

        private static readonly FinishData AsCast = new(0.984, 0.007, 0.100, 0.800, 0.30, 0.75, 2e6);
        private static readonly FinishData Machined = new(0.995, 0.010, 0.050, 0.250, 0.40, 0.75, 1e6);
        private static readonly FinishData RoughWelded = new(0.985, 0.015, 0.200, 1.200, 0.40, 0.70, 2e6);

        public double Coefficient => coefficient;

        public double Uncertainty => uncertainty;

        public double SmallestPipe => smallestPipe;

        public double LargestPipe => largestPipe;

        public double LowestRatio => lowestRatio;

        public double HighestRatio => highestRatio;

        public double HighestReynolds => highestReynolds;

        public static FinishData Of(ConvergentFinish finish) => finish switch
        {
            ConvergentFinish.AsCast => AsCast,
            ConvergentFinish.Machined => Machined,
            ConvergentFinish.RoughWelded => RoughWelded,
            _ => throw new ArgumentOutOfRangeException(nameof(finish), finish, "The finish must be one of the three of ISO 5167-4."),
        };
    }
}
