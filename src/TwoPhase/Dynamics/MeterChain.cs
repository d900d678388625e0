using TwoPhase.Metering;

namespace TwoPhase.Dynamics;

/// <summary>The meter at the outlet and the instruments that its reading is made of.</summary>
internal sealed class MeterChain
{
    private readonly QualityMeter? _meter;
    private LaggedSignal _flow, _pressure, _differential;

    public MeterChain(QualityMeter? meter, SensorLags lags)
    {
        _meter = meter;
        (_flow, _pressure, _differential) = (new(lags.RawFeedFlow), new(lags.RawOutletPressure), new(lags.RawDifferential));
    }

    /// <summary>Δp that outlet flow and true quality make [Pa], and the quality that it implies with the feed flow; NaN where there is none.</summary>
    /// <param name="elapsed">Time since the last reading [s].</param>
    /// <param name="feedFlow">What the reading takes for the flow [kg/s].</param>
    /// <param name="outletFlow">What flows through the meter [kg/s].</param>
    /// <param name="pressure">Pressure at the meter [Pa].</param>
    /// <param name="quality">True quality there.</param>
    /// <param name="measuredPressure">Pressure that the reading is made with [Pa].</param>
    public (double Differential, double Quality) Read(double elapsed, double feedFlow, double outletFlow, double pressure, double quality, double measuredPressure)
    {
        // Below saturation the wet-steam models have no say; they continue above it.
        if (_meter is null || !(quality >= 0)) return (double.NaN, double.NaN);
        double differential = _meter.DifferentialOrNaN(outletFlow, pressure, quality);
        double flow = _flow.Follow(feedFlow, elapsed), still = _pressure.Follow(measuredPressure, elapsed), shown = _differential.Follow(differential, elapsed);
        return (differential, _meter.SampleCore(flow, still, shown, out _));
    }

    /// <summary>A first-order lag over a signal that goes straight from sample to sample.</summary>
    private struct LaggedSignal
    {
        private readonly double _lag;
        private double _input, _output;

        public LaggedSignal(double lag) => (_lag, _input, _output) = (lag, double.NaN, double.NaN);

        public double Follow(double input, double elapsed)
        {
            if (_lag == 0 || double.IsNaN(_output) || elapsed == 0)
            {
                _output = input;
            }
            else
            {
                // Behind a ramp the output trails by slope times lag; the rest dies away.
                double trail = (input - _input) / elapsed * _lag;
                _output = input - trail + ((_output - _input + trail) * Math.Exp(-elapsed / _lag));
            }

            _input = input;
            return _output;
        }
    }
}
