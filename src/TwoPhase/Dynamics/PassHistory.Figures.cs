using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

public sealed partial class PassHistory
{
    /// <summary>The figures that matter, integrals by the trapezoidal rule over the rows.</summary>
    /// <param name="tolerance">How far the reading may be from the truth and still serve, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The tolerance is not greater than zero.</exception>
    public TransientFigures Figures(MassFraction tolerance)
    {
        double allowed = Require.Positive(tolerance.Si(), "Tolerance", Scale.None, nameof(tolerance));
        PassInstant peak = _rows.OrderByDescending(static row => Math.Abs(Error(row))).First();
        double held = _rows[0].RawHoldup, pushed = held - _rows[^1].RawHoldup;
        return new()
        {
            RawPeakError = Error(peak),
            RawTimeOfPeak = peak.RawTime,
            RawTimeFalse = Integral(row => Math.Abs(Error(row)) > allowed ? 1 : 0),
            RawSettled = Settled(allowed),
            RawPushedOut = pushed,
            RawMostPushedOut = held - _rows.Min(static row => row.RawHoldup),
            RawPeakOutletFlow = _rows.Max(static row => row.RawOutletFlow),
            PeakOutletRatio = _rows.Max(static row => row.RawOutletFlow) / _rows[^1].RawFeedFlow,
            RawLowest = _rows.Min(static row => row.RawTrueQuality),
            RawHighest = _rows.Max(static row => row.RawTrueQuality),
            AreaUnderError = Integral(Error),
            AreaByOutletFlow = Integral(static row => Weight(row) * (Square(row.RawOutletFlow / row.RawFeedFlow) - 1)),
            AreaByHoldup = 2 * pushed * _rows.Average(Weight) / _rows.Average(static row => row.RawFeedFlow),
        };
    }

    private static double Error(PassInstant row) => row.RawIndicatedQuality - row.RawTrueQuality;

    // W = v/(v″ − v′) at the outlet, homogeneous: by how much the reading moves for a relative error of the flow squared.
    private static double Weight(PassInstant row)
    {
        SaturatedPhases phases = SaturationTable.Phases(row.RawOutletPressure);
        return row.RawTrueQuality + (phases.LiquidVolume / (phases.VapourVolume - phases.LiquidVolume));
    }

    private static double Square(double x) => x * x;

    private double Settled(double allowed)
    {
        int last = Array.FindLastIndex(_rows, row => !(Math.Abs(Error(row)) <= allowed));
        return last == _rows.Length - 1 ? double.NaN : last < 0 ? _rows[0].RawTime : _rows[last + 1].RawTime;
    }

    private double Integral(Func<PassInstant, double> of)
    {
        double sum = 0, before = of(_rows[0]);
        for (int i = 1; i < _rows.Length; i++)
        {
            double now = of(_rows[i]);
            sum += (_rows[i].RawTime - _rows[i - 1].RawTime) * (before + now) / 2;
            before = now;
        }

        return sum;
    }
}
