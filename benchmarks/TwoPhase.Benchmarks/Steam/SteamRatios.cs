using TwoPhase.Benchmarks.Ratios;
using TwoPhase.Steam;
using TwoPhase.Steam.Backward;
using TwoPhase.Units;
using UnitsNet.Units;

namespace TwoPhase.Benchmarks.Steam;

/// <summary>The numbers that the steam room has to reach, and those that the rooms above build on.</summary>
internal sealed class SteamRatios : IRatioSuite
{
    private const int ColumnLength = 262_144;

    public string Name => "steam";

    public IEnumerable<RatioCase> Cases() =>
    [
        Of("region 1: Gibbs energy and five derivatives", 5, (States.Pressure1, States.Temperature1), (p, t) => Region1.At(p, t).BulkModulus),
        Of("region 2: Gibbs energy and five derivatives", 7.5, (States.Pressure2, States.Temperature2), (p, t) => Region2.At(p, t).BulkModulus),
        Of("region 1 by Math.Pow, two to a term", null, (States.Pressure1, States.Temperature1), PlainSums.Region1),
        Of("region 2 by Math.Pow, two to a term", null, (States.Pressure2, States.Temperature2), PlainSums.Region2),
        Of("h′, h″, v′, v″ from p, formulation", 12, (States.SaturationPressure, States.SaturationPressure), (p, _) =>
        {
            SaturationCore both = SaturationLine.AtPressure(p);
            return both.Liquid.Enthalpy + both.Vapour.Enthalpy + both.Liquid.SpecificVolume + both.Vapour.SpecificVolume;
        }),
        Of("h′, h″, v′, v″ from p, table", null, (States.SaturationPressure, States.SaturationPressure), (p, _) =>
        {
            SaturatedPhases both = SaturationTable.Phases(p);
            return both.LiquidEnthalpy + both.VapourEnthalpy + both.LiquidVolume + both.VapourVolume;
        }),
        Surface("surface: T, v, x, both density derivatives, random states", 2.3, States.RandomPressure, States.RandomEnthalpy),
        Surface("surface: the same, states in order along a pass", 1.5, States.OrderedPressure, States.OrderedEnthalpy),
        new("saturation over a column: Ts, h′, h″, v′, v″, per pressure", ColumnLength, Sum(MakeColumnCall())) { Yardstick = Yardsticks.P },
        Of("the same five from the formulation", null, (States.RandomPressure, States.RandomEnthalpy), (p, h) => Water.AtPressureEnthalpy(p, h).VolumeByPressure),
        Of("region 1: T(p,h), backward equation", null, (States.Pressure1, States.Enthalpy1), Backward1.TemperatureFromEnthalpy),
        Of("region 3: T(p,h), backward equation", null, (States.Pressure3, States.Enthalpy3), Backward3.TemperatureFromEnthalpy),
    ];

    /// <inheritdoc/>
    public (string What, Action Call)? Cold => ("column call of 262,144 pressures in a fresh process", MakeColumnCall());

    private static Action MakeColumnCall()
    {
        const int count = ColumnLength;
        double[] pressure = Yardsticks.Fill(count, 0.5, 16, 20), ts = new double[count], hl = new double[count], hg = new double[count], vl = new double[count], vg = new double[count];
        var status = new SaturationStatus[count];

        // Touched once, so that no call is charged with the operating system's first pages.
        foreach (double[] results in new[] { ts, hl, hg, vl, vg }) Array.Fill(results, double.NaN);
        Array.Fill(status, SaturationStatus.Missing);
        return () => Saturation.FromPressure(
            Column.Of(pressure, PressureUnit.Megapascal),
            Column.Into(ts, TemperatureUnit.DegreeCelsius),
            Column.Into(hl, SpecificEnergyUnit.KilojoulePerKilogram),
            Column.Into(hg, SpecificEnergyUnit.KilojoulePerKilogram),
            Column.Into(vl, SpecificVolumeUnit.CubicMeterPerKilogram),
            Column.Into(vg, SpecificVolumeUnit.CubicMeterPerKilogram),
            status);
    }

    private static Func<double> Sum(Action call) => () =>
    {
        call();
        return 0;
    };

    private static RatioCase Surface(string what, double target, double[] pressure, double[] enthalpy)
    {
        SteamSurface surface = SteamSurface.Default;
        return Of(what, target, (pressure, enthalpy), (p, h) =>
        {
            SurfacePoint point = surface.Evaluate(p, h);
            return point.Temperature + point.SpecificVolume + point.Quality + point.DensityByEnthalpy + point.DensityByPressure;
        });
    }

    private static RatioCase Of(string what, double? target, (double[] A, double[] B) inputs, Func<double, double, double> function) =>
        new(what, inputs.A.Length, () =>
        {
            (double[] a, double[] b) = inputs;
            double sum = 0;
            for (int i = 0; i < a.Length; i++) sum += function(a[i], b[i]);
            return sum;
        })
        {
            Yardstick = Yardsticks.P,
            Target = target,
        };
}
