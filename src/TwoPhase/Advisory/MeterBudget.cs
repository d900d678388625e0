using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How uncertain a quality by the meter is that no transient can show, at a usual point of working.</summary>
internal static class MeterBudget
{
    // The share hardly depends on the point: a pass at 10 MPa, three quarters steam, the flow that makes 40 kPa.
    private const double Pressure = 10e6, Quality = 0.78, Differential = 40e3;

    /// <summary>As the relative standard uncertainty of a differential that would do the same to the quality.</summary>
    public static double LogDifferential(QualityMeter meter, EstimatorOptions options)
    {
        MassFlow flow = meter.TotalFlow(UnitsNet.Pressure.FromPascals(Pressure), MassFraction.FromDecimalFractions(Quality), UnitsNet.Pressure.FromPascals(Differential));
        MeteringUncertainty metering = options.Metering ?? new(Ratio.FromPercent(0.5), UnitsNet.Pressure.FromPascals(0.005 * Differential), UnitsNet.Pressure.FromKilopascals(20));
        double standard = meter.QualityWithUncertainty(flow, UnitsNet.Pressure.FromPascals(Pressure), UnitsNet.Pressure.FromPascals(Differential), metering).StandardUncertainty.DecimalFractions;
        const double step = 0.01;
        double slope = (meter.QualityOrNaN(flow.Si(), Pressure, Differential * (1 + step)) - meter.QualityOrNaN(flow.Si(), Pressure, Differential * (1 - step))) / (2 * step);
        return standard / slope;
    }
}
