using TwoPhase.Flow;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A meter of which only its constant is known, as a site has fitted it or a data sheet states it: ṁ = k √(Δp ρ).</summary>
/// <remarks>
/// <para>k [m²] lumps C ε E A √2; Δp [Pa], ρ [kg/m³], ṁ [kg/s]. Without geometry there is no Reynolds number, no expansibility and no published limit.</para>
/// <para>Source: the flow equation of ISO 5167-1:2003, 5.1, with its factors lumped.</para>
/// </remarks>
public sealed class SiteConstantMeter : DifferentialPressureMeter
{
    private readonly MeterGeometry _geometry;

    /// <summary>A meter of known constant.</summary>
    /// <param name="k">k, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="k"/> is not greater than zero.</exception>
    public SiteConstantMeter(Area k)
        : this(Require.Positive(k.Si(), "Meter constant k", Scale.SquareMillimetres, nameof(k)))
    {
    }

    private SiteConstantMeter(double k)
    {
        K = Area.FromSquareMeters(k);
        _geometry = MeterGeometry.FromFlowArea(k / Math.Sqrt(2));
    }

    /// <inheritdoc/>
    public override string Name => "meter of known constant";

    /// <summary>k in ṁ = k √(Δp ρ).</summary>
    public Area K { get; }

    internal override bool HasGeometry => false;

    internal override double LargestDifferentialRatio => 1;

    /// <summary>The meter that passes a known flow of known density at a known differential, such as the full-scale point of a data sheet.</summary>
    /// <param name="flow">ṁ at the reference point, greater than zero.</param>
    /// <param name="density">ρ at the reference point, greater than zero.</param>
    /// <param name="differential">Δp at the reference point, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not greater than zero.</exception>
    public static SiteConstantMeter FromReference(MassFlow flow, Density density, Pressure differential)
    {
        double m = Require.Positive(flow.Si(), "Mass flow", Scale.KilogramsPerSecond, nameof(flow));
        double rho = Require.Positive(density.Si(), "Density", Scale.KilogramsPerCubicMetre, nameof(density));
        double dp = Require.Positive(differential.Si(), "Differential pressure", Scale.Kilopascals, nameof(differential));
        return new SiteConstantMeter(m / Math.Sqrt(dp * rho));
    }

    internal override MeterGeometry GeometryAt(double temperature) => _geometry;

    internal override MeterGeometry SinglePhaseGeometry(Temperature? temperature) => _geometry;

    internal override CoefficientLaw LawOf(in MeterGeometry geometry) => CoefficientLaw.Constant(1);

    internal override double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent) => 1;

    internal override Applicability CheckCore(in MeterGeometry geometry, double reynolds, double pressureRatio) => Applicability.Inside;
}
