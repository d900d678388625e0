using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>A meter that infers flow from a pressure difference: ṁ = K √(2 ρ Δp).</summary>
/// <remarks>
/// <para>ṁ mass flow [kg/s], K an area [m²], ρ density at the upstream tapping [kg/m³], Δp differential pressure [Pa].</para>
/// <para>For a primary element K = C ε E A: discharge coefficient, expansibility factor, velocity-of-approach factor 1/√(1 − β⁴) and
/// throat area. For a <see cref="SiteConstantMeter"/> K is what the site has fitted.</para>
/// </remarks>
public abstract class DifferentialPressureMeter
{
    private protected DifferentialPressureMeter()
    {
    }

    /// <summary>What the meter is, as the trade calls it.</summary>
    public abstract string Name { get; }

    /// <summary>Whether C depends on the Reynolds number.</summary>
    internal virtual bool CoefficientDependsOnReynolds => false;

    /// <summary>Whether the meter has a geometry, so a Reynolds number and an expansibility.</summary>
    internal virtual bool HasGeometry => true;

    /// <summary>
    /// Highest Δp/p at which a differential is sought. ε²Δp, and the flow with it, peaks at 0.32 or more for every element with β up to
    /// 0.85 and κ from 1.05 (nozzle formula; orifice 0.46): up to there one flow has one differential.
    /// </summary>
    internal virtual double LargestDifferentialRatio => 0.32;

    /// <summary>Single-phase flow of a liquid at a differential; the Reynolds number is iterated as ISO 5167-1 describes.</summary>
    /// <param name="density">ρ, density of the liquid, greater than zero.</param>
    /// <param name="viscosity">μ, dynamic viscosity of the liquid, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero.</param>
    /// <param name="temperature">Working temperature; needed when the element was measured cold, else without effect.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not greater than zero.</exception>
    /// <exception cref="ArgumentException">The element was measured cold and no temperature is given.</exception>
    public MassFlow LiquidFlow(Density density, DynamicViscosity viscosity, Pressure differential, Temperature? temperature = null)
    {
        double dp = Require.Positive(differential.Si(), "Differential pressure", Scale.Kilopascals, nameof(differential));
        return SinglePhaseFlow(density, viscosity, dp, 1, temperature);
    }

    /// <summary>Single-phase flow of a gas or of dry steam at a differential; the Reynolds number is iterated as ISO 5167-1 describes.</summary>
    /// <param name="density">ρ, density at the upstream tapping, greater than zero.</param>
    /// <param name="viscosity">μ, dynamic viscosity, greater than zero.</param>
    /// <param name="pressure">p, absolute pressure at the upstream tapping, greater than zero.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="isentropicExponent">κ, above 1: w²/(p v) for steam, never cp/cv.</param>
    /// <param name="temperature">Working temperature; needed when the element was measured cold, else without effect.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    /// <exception cref="ArgumentException">The element was measured cold and no temperature is given.</exception>
    public MassFlow GasFlow(Density density, DynamicViscosity viscosity, Pressure pressure, Pressure differential, double isentropicExponent, Temperature? temperature = null)
    {
        (double p, double dp) = MeterArguments.Pressures(pressure, differential);
        double kappa = MeterArguments.IsentropicExponent(isentropicExponent, nameof(isentropicExponent));
        double epsilon = ExpansibilityCore(SinglePhaseGeometry(temperature), p, dp, kappa);
        return SinglePhaseFlow(density, viscosity, dp, epsilon, temperature);
    }

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    /// <summary>Geometry at the temperature of the fluid [K].</summary>
    internal abstract MeterGeometry GeometryAt(double temperature);

    /// <summary>Geometry for single-phase flow: a meter that grows with temperature must be told the temperature.</summary>
    internal abstract MeterGeometry SinglePhaseGeometry(Temperature? temperature);

    /// <summary>C [-] over the pipe Reynolds number.</summary>
    internal abstract CoefficientLaw LawOf(in MeterGeometry geometry);

    /// <summary>ε [-]; arguments trusted.</summary>
    internal abstract double ExpansibilityCore(in MeterGeometry geometry, double pressure, double differential, double isentropicExponent);

    /// <summary>Limits of use at a Reynolds number and a ratio of pressures p2/p1.</summary>
    internal abstract Applicability CheckCore(in MeterGeometry geometry, double reynolds, double pressureRatio);

    private MassFlow SinglePhaseFlow(Density density, DynamicViscosity viscosity, double dp, double epsilon, Temperature? temperature)
    {
        double rho = Require.Positive(density.Si(), "Density", Scale.KilogramsPerCubicMetre, nameof(density));
        double mu = Require.Positive(viscosity.Si(), "Dynamic viscosity", MeterArguments.PascalSeconds, nameof(viscosity));
        MeterGeometry geometry = SinglePhaseGeometry(temperature);
        return MassFlow.FromKilogramsPerSecond(IterateReynolds(geometry, mu, epsilon * geometry.FlowArea * Fast.Sqrt(2 * rho * dp)));
    }

    // C changes by a few per cent over a decade of Reynolds number, so each round gains more than a digit.
    private double IterateReynolds(in MeterGeometry geometry, double viscosity, double flowAtUnitCoefficient)
    {
        const int maximumRounds = 100;
        CoefficientLaw law = LawOf(geometry);
        double c = law.Limit, last = double.NaN;
        for (int round = 0; round < maximumRounds; round++)
        {
            double flow = c * flowAtUnitCoefficient;
            if (Math.Abs(flow - last) <= 1e-15 * flow) return flow;
            last = flow;
            c = law.At(Reynolds(geometry, flow, viscosity));
        }

        throw new ConvergenceException($"The discharge coefficient of the {Name} did not settle in {maximumRounds} rounds; last flow {Scale.KilogramsPerSecond.Text(last)}.");
    }

    /// <summary>Pipe Reynolds number 4 ṁ/(π D μ) [-].</summary>
    internal static double Reynolds(in MeterGeometry geometry, double flow, double viscosity) => 4 * flow / (Math.PI * geometry.PipeDiameter * viscosity);
}
