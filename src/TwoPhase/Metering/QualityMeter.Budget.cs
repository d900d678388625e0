using TwoPhase.Uncertainty;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>The quality that a reading implies, with expanded uncertainty and a budget ordered by contribution.</summary>
    /// <remarks>
    /// <para>Homogeneous: dx = W (dlnΔp − 2 dlnṁ + 2 dln(C ε E A)), W = v/(vg − vl), v volume at x; any other model by central differences.</para>
    /// <para>Range: as the reading. Accuracy: of first order; <see cref="SimulateQuality"/> where the model bends within the uncertainty.</para>
    /// <para>Source: JCGM 100:2008, 5.1 and 5.2; ISO 5168:2005; ISO 5167-1:2003, 8.2.</para>
    /// </remarks>
    /// <param name="flow">ṁ, total mass flow through the meter.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="uncertainty">How well the inputs are known.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public UncertainQuality QualityWithUncertainty(MassFlow flow, Pressure pressure, Pressure differential, MeteringUncertainty uncertainty) =>
        new(Quality(flow, pressure, differential), QualityFunction(flow, pressure, differential, uncertainty).Propagate());

    /// <summary>The distribution of the quality by Monte Carlo, all inputs normal.</summary>
    /// <param name="flow">ṁ, total mass flow through the meter.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="uncertainty">How well the inputs are known.</param>
    /// <param name="trials">Number of draws.</param>
    /// <param name="seed">Start of the random streams.</param>
    public MonteCarloResult SimulateQuality(MassFlow flow, Pressure pressure, Pressure differential, MeteringUncertainty uncertainty, int trials = 100_000, int seed = 1) =>
        QualityFunction(flow, pressure, differential, uncertainty).Simulate(trials, seed, parallel: true);

    /// <summary>The quality as a function of uncertain inputs, for correlations and studies of one's own.</summary>
    /// <remarks>Inputs bear the names of <see cref="MeteringInput"/>: flow in kg/s, differential in kPa, pressure in MPa, everything else as a factor on its estimate.</remarks>
    /// <param name="flow">ṁ, total mass flow through the meter.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="uncertainty">How well the inputs are known.</param>
    public MeasurementFunction QualityFunction(MassFlow flow, Pressure pressure, Pressure differential, MeteringUncertainty uncertainty)
    {
        Require.NotNull(uncertainty, nameof(uncertainty));
        double m = CheckedFlow(flow, nameof(flow));
        double p = CheckedPressure(pressure, nameof(pressure));
        double dp = CheckedDifferential(differential, p, nameof(differential));

        List<UncertainInput> inputs =
        [
            new UncertainInput(nameof(MeteringInput.FeedFlow), m, m * Relative(MeteringInput.FeedFlow)).WithUnit("kg/s"),
            new UncertainInput(nameof(MeteringInput.Differential), dp * 1e-3, uncertainty.Standard(MeteringInput.Differential)!.Value * 1e-3).WithUnit("kPa"),
            new UncertainInput(nameof(MeteringInput.Pressure), p * 1e-6, uncertainty.Standard(MeteringInput.Pressure)!.Value * 1e-6).WithUnit("MPa"),
            new(nameof(MeteringInput.WetModel), 1, _modelUncertainty),
            new(nameof(MeteringInput.LiquidDensity), 1, Relative(MeteringInput.LiquidDensity)),
            new(nameof(MeteringInput.VapourDensity), 1, Relative(MeteringInput.VapourDensity)),
        ];
        if (Meter is PrimaryElement element)
        {
            var (coefficient, expansibility) = PublishedUncertainties(element, m, p, dp);
            inputs.Add(new(nameof(MeteringInput.DischargeCoefficient), 1, uncertainty.Standard(MeteringInput.DischargeCoefficient) ?? coefficient));
            inputs.Add(new(nameof(MeteringInput.Expansibility), 1, uncertainty.Standard(MeteringInput.Expansibility) ?? expansibility));
            inputs.Add(new(nameof(MeteringInput.PipeDiameter), 1, Relative(MeteringInput.PipeDiameter)));
            inputs.Add(new(nameof(MeteringInput.ThroatDiameter), 1, Relative(MeteringInput.ThroatDiameter)));
        }
        else
        {
            inputs.Add(new(nameof(MeteringInput.MeterConstant), 1, Relative(MeteringInput.MeterConstant)));
        }

        MeasurementFunction function = new(QualityOf, [.. inputs]);
        foreach (var (first, second, coefficient) in uncertainty.Correlations)
            function = function.WithCorrelation(first.ToString(), second.ToString(), coefficient);
        return function;

        double Relative(MeteringInput input) => uncertainty.Standard(input)!.Value;
    }

    // The standards print k = 2.
    private (double Coefficient, double Expansibility) PublishedUncertainties(PrimaryElement element, double flow, double pressure, double differential)
    {
        MeterSteam steam = MeterSteam.At(pressure, expansion: true, transport: true);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        double x = ReadCore(flow, pressure, differential).QualityCore;
        double reynolds = Reynolds(geometry, State(geometry, steam, flow, pressure, differential), x);
        Ratio expansibility = element.ExpansibilityUncertainty(Pressure.FromPascals(pressure), Pressure.FromPascals(differential), steam.IsentropicExponent);
        return (element.DischargeCoefficientUncertainty(reynolds).Si() / 2, expansibility.Si() / 2);
    }

    private double QualityOf(InputValues values)
    {
        double pressure = values[nameof(MeteringInput.Pressure)] * 1e6;
        MeterSteam steam = MeterSteam.At(pressure, Meter.HasGeometry, Model.NeedsTransport);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        double factor;   // on the root of the differential: C, ε and constant act together on flow
        if (Meter is PrimaryElement element)
        {
            geometry = new(geometry.PipeDiameter * values[nameof(MeteringInput.PipeDiameter)], geometry.ThroatDiameter * values[nameof(MeteringInput.ThroatDiameter)]);
            factor = element.CalibrationFactor * values[nameof(MeteringInput.DischargeCoefficient)] * values[nameof(MeteringInput.Expansibility)];
        }
        else
        {
            factor = values[nameof(MeteringInput.MeterConstant)];
        }

        MeterState state = State(geometry, steam, values[nameof(MeteringInput.FeedFlow)], pressure, values[nameof(MeteringInput.Differential)] * 1e3);
        return SolveQuality(geometry, state with
        {
            LiquidDensity = state.LiquidDensity * values[nameof(MeteringInput.LiquidDensity)],
            VapourDensity = state.VapourDensity * values[nameof(MeteringInput.VapourDensity)],
            Expansibility = state.Expansibility * factor * Math.Sqrt(values[nameof(MeteringInput.WetModel)]),
        }).Quality;
    }
}
