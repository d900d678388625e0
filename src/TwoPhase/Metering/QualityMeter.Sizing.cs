using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>The throat that gives a wanted differential at a design point, in the pipe of this meter: of the cold element where it was measured cold.</summary>
    /// <param name="flow">ṁ, total mass flow at the design point, greater than zero.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="quality">x at the design point.</param>
    /// <param name="wanted">Δp wanted, greater than zero and below the pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits, or no throat between 5 % and 95 % of the pipe gives the differential.</exception>
    /// <exception cref="InvalidOperationException">The meter is known by its constant and has no throat.</exception>
    public Length ThroatFor(MassFlow flow, Pressure pressure, MassFraction quality, Pressure wanted)
    {
        if (Meter is not PrimaryElement element) throw new InvalidOperationException($"A {Meter.Name} has no throat to be sized.");
        double m = CheckedFlow(flow, nameof(flow));
        double p = CheckedPressure(pressure, nameof(pressure));
        double x = CheckedQuality(quality, nameof(quality));
        double dp = CheckedDifferential(wanted, p, nameof(wanted));
        double pipe = element.PipeDiameter.Meters;
        double Excess(double throat) => (new QualityMeter(element.WithThroat(throat), Model).TotalFlowCore(p, x, dp) / m) - 1;
        RootResult result = BracketedRoot.TryFind(new DelegateFunction(Excess), 0.05 * pipe, 0.95 * pipe, 1e-12 * pipe);
        return result.Converged
            ? Length.FromMeters(result.X)
            : throw Require.OutOfRange(dp, "Differential pressure", Scale.Kilopascals, nameof(wanted), $"is given by no throat between 5 % and 95 % of the pipe's {Scale.Millimetres.Text(pipe)} for {Scale.KilogramsPerSecond.Text(m)}");
    }

    /// <summary>The total flows that a transmitter covers at a quality.</summary>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="quality">x.</param>
    /// <param name="lowest">Lowest differential that is still to be believed, such as a tenth of the span.</param>
    /// <param name="highest">Highest differential, the upper end of the span.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public (MassFlow Lowest, MassFlow Highest) FlowRange(Pressure pressure, MassFraction quality, Pressure lowest, Pressure highest)
    {
        CheckOrder(lowest, highest);
        return (TotalFlow(pressure, quality, lowest), TotalFlow(pressure, quality, highest));
    }

    /// <summary>The qualities that a transmitter covers at a flow; outside 0..1, as the status says, where the span reaches beyond wet steam.</summary>
    /// <param name="flow">ṁ, total mass flow through the meter, greater than zero.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="lowest">Lowest differential that is still to be believed, such as a tenth of the span.</param>
    /// <param name="highest">Highest differential, the upper end of the span.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public (QualityReading Lowest, QualityReading Highest) QualityRange(MassFlow flow, Pressure pressure, Pressure lowest, Pressure highest)
    {
        CheckOrder(lowest, highest);
        return (Quality(flow, pressure, lowest), Quality(flow, pressure, highest));
    }

    private static void CheckOrder(Pressure lowest, Pressure highest) =>
        Require.Below(lowest.Si(), highest.Si(), "Lowest differential pressure", Scale.Kilopascals, nameof(lowest));

    private readonly struct DelegateFunction(Func<double, double> function) : IScalarFunction
    {
        public double Value(double x) => function(x);
    }
}
