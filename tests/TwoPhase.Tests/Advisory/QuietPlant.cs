using MathNet.Numerics.Distributions;
using TwoPhase.Metering;
using TwoPhase.Steam;
using UnitsNet;
using static TwoPhase.Tests.Advisory.Plants;

namespace TwoPhase.Tests.Advisory;

/// <summary>A pass that moves so slowly that it is always at rest: heat balance and meter, with noise that is white or lasts, handed on by exception or not.</summary>
internal sealed class QuietPlant(int seed, double interval, double shortNoise = 0, double longNoise = 0, double deadBand = 0, double firingWander = 0, double silence = 600)
{
    // Spans are invented: flow 6 kg/s, temperature 200 K, firing 100 %, pressure 14 MPa, differential 60 kPa.
    public static readonly double[] Spans = [6, 200, 100, 14, 60];
    private readonly Normal _normal = new(0, 1, new Random(seed));
    private readonly double[] _last = new double[5], _at = [double.NegativeInfinity, double.NegativeInfinity, double.NegativeInfinity, double.NegativeInfinity, double.NegativeInfinity];
    private double _minute, _hour, _minuteOfFlow, _hourOfFlow;

    public double Time { get; private set; }

    public double Truth { get; private set; }

    /// <summary>What the meter, the flow and the pressure are off by; the differential is off at once.</summary>
    public (double Differential, double Flow, double Pressure) Bias { get; set; }

    public PassReading Next()
    {
        double firing = 1 + (firingWander * Math.Sin((2 * Math.PI * Time / 86400) + seed)), flow = Start.RawFeedFlow, pressure = Start.RawOutletPressure;
        Saturation steam = Saturation.FromPressure(Start.OutletPressure);
        double feed = SteamState.FromPressureTemperature(Start.OutletPressure, Start.FeedTemperature!.Value).SpecificEnthalpy.JoulesPerKilogram, liquid = steam.Liquid.SpecificEnthalpy.JoulesPerKilogram;
        Truth = (feed + (firing * Start.RawAbsorbedHeat / flow) - liquid) / steam.LatentHeat.JoulesPerKilogram;
        double differential = Meter.Differential(Start.FeedFlow, Start.OutletPressure, MassFraction.FromDecimalFractions(Truth)).Kilopascals;
        Lasting(ref _minute, 60, shortNoise);
        Lasting(ref _hour, 3600, longNoise);
        Lasting(ref _minuteOfFlow, 60, shortNoise / 2);
        Lasting(ref _hourOfFlow, 3600, longNoise / 2);
        double[] values =
        [
            flow * (1 + Bias.Flow + _minuteOfFlow + _hourOfFlow + (0.003 * _normal.Sample())),
            Start.RawFeedTemperature - 273.15 + (0.1 * _normal.Sample()),
            100 * firing,
            (pressure * 1e-6) + Bias.Pressure + (0.003 * _normal.Sample()),
            differential * (1 + Bias.Differential + _minute + _hour + (0.005 * _normal.Sample())),
        ];
        for (int i = 0; i < values.Length; i++)
        {
            if (Math.Abs(values[i] - _last[i]) > deadBand * Spans[i] || Time - _at[i] >= silence || deadBand == 0) (_last[i], _at[i]) = (values[i], Time);
        }

        PassReading reading = Format.Read(Midnight.AddSeconds(Time), _last[0], _last[1], _last[2], _last[3], _last[4]);
        Time += interval;
        return reading;
    }

    private void Lasting(ref double value, double time, double size)
    {
        double kept = Math.Exp(-interval / time);
        value = (kept * value) + (size * Math.Sqrt(1 - (kept * kept)) * _normal.Sample());
    }
}
