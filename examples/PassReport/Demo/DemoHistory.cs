using System.Globalization;
using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;

namespace PassReport.Demo;

/// <summary>
/// Writes the invented day of the invented generator: 24 hours of six passes every ten seconds, always the same numbers. A clock change
/// lies in it, firing, feed temperature, header pressure and one pass's flow move, one meter drifts, and some samples are bad. The plant
/// behind it is the library's simulator with another slip model and another heat split than the generator's file knows.
/// </summary>
internal static class DemoHistory
{
    private const int Seed = 20310309, StepSeconds = 10, Steps = 24 * 3600 / StepSeconds;
    private const double Atmosphere = 93e3, SpanPascals = 75e3, MeterDriftStartHour = 14, MeterDriftPerHour = -0.007;

    private static readonly Schedule Firing = new((4.0, 0.92), (4.1, 0.95), (10.5, 0.95), (10.6, 0.92));
    private static readonly Schedule FeedTemperature = new((7.0, 445), (7.1, 453), (19.0, 453), (19.2, 445));
    private static readonly Schedule Pressure = new((13.0, 9.6e6), (13.02, 9.3e6), (16.0, 9.3e6), (16.3, 9.6e6));
    private static readonly Schedule ThirdPassFlow = new((9.0, 1), (9.005, 0.965), (12.0, 0.965), (12.005, 1));

    private static readonly SimulatorOptions Plant = SimulatorOptions.Default.WithModels(PassModels.Default.WithSlip(VoidFractionModel.Zivi));
    private static readonly double[] FlowShares = [1.00, 0.99, 1.01, 1.015, 1.00, 0.985];
    private static readonly double[] HeatShares = [1.00, 1.005, 0.995, 1.00, 1.00, 1.01];

    /// <summary>Writes the file, beside its place first and then into it, so that a run that was broken off leaves nothing half.</summary>
    public static void Write(SteamGenerator generator, string file)
    {
        string aside = file + ".part";
        using (var writer = new StreamWriter(aside) { NewLine = "\n" })
        {
            string[] passes = [.. generator.Passes.SelectMany(pass => pass.Tags.Select(tag => tag.Value.ToString()))];
            writer.WriteLine(string.Join(",", ["time", .. generator.Tags.Select(tag => tag.Value.ToString()), .. passes]));
            WriteRows(generator, writer);
        }

        File.Move(aside, file, overwrite: true);
    }

    private static void WriteRows(SteamGenerator generator, StreamWriter writer)
    {
        var random = new Random(Seed);
        double[][] differentials = Differentials(generator);
        TimeZoneInfo zone = TimeZoneInfo.FindSystemTimeZoneById("America/Edmonton");
        var start = new DateTimeOffset(2031, 3, 9, 0, 0, 0, TimeSpan.FromHours(-7));
        for (int step = 0; step < Steps; step++)
        {
            double hour = step * StepSeconds / 3600.0;
            List<string> cells = [Local(start.AddSeconds((double)step * StepSeconds), zone), Text(FeedTemperature.At(hour) - 273.15 + (0.1 * Normal(random)), 2), Text(100 * Firing.At(hour), 2)];
            for (int i = 0; i < differentials.Length; i++)
            {
                double drift = i == 4 ? 1 + (MeterDriftPerHour * Math.Max(0, hour - MeterDriftStartHour)) : 1;
                cells.Add(Text(Flow(i, hour) * 3.6 * (1 + (0.003 * Normal(random))), 3));
                cells.Add(Text(100 * differentials[i][step] * drift * (1 + (0.005 * Normal(random))) / SpanPascals, 3));
                cells.Add(Text((Pressure.At(hour) - Atmosphere + (3e3 * Normal(random))) / 1e3, 1));
            }

            Spoil(cells, step);
            writer.WriteLine(string.Join(",", cells));
        }
    }

    /// <summary>For each pass the differential that a true meter would show, row by row [Pa].</summary>
    private static double[][] Differentials(SteamGenerator generator)
    {
        var columns = new double[generator.Passes.Count][];
        Parallel.For(0, columns.Length, i => columns[i] = Differentials(generator.Passes[i].WithConvectiveShare(Ratio.FromPercent(40)), i));
        return columns;
    }

    private static double[] Differentials(Pass pass, int index)
    {
        var simulator = new PassSimulator(pass, Conditions(index, 0), Plant);
        return [.. Enumerable.Range(0, Steps).Select(step => simulator.Advance(Conditions(index, step * StepSeconds / 3600.0), Duration.FromSeconds(StepSeconds)).Differential!.Value.Pascals)];
    }

    private static PassConditions Conditions(int pass, double hour) => new(
        MassFlow.FromKilogramsPerSecond(Flow(pass, hour)), Temperature.FromKelvins(FeedTemperature.At(hour)), UnitsNet.Pressure.FromPascals(Pressure.At(hour)), Power.FromMegawatts(8.17 * HeatShares[pass] * Firing.At(hour)));

    private static double Flow(int pass, double hour) => 4.42 * FlowShares[pass] * (pass == 2 ? ThirdPassFlow.At(hour) : 1);

    /// <summary>What every history has: a transmitter out of service, a lost connection, a blank, a sign error, a step back in time.</summary>
    private static void Spoil(List<string> cells, int step)
    {
        const int second = 3 + 3, fourth = 3 + 9, sixth = 3 + 15;
        if (step is >= 6100 and < 6220) cells[second + 1] = "Out of Service";
        if (step is >= 2000 and < 2006) cells[fourth] = "Comm Fail";
        if (step is 3000 or 3001) cells[sixth + 1] = "";
        if (step == 5000) cells[sixth] = "-15.9";
        if (step == 7000) cells[0] = cells[0][..11] + "01:00:00" + cells[0][19..];
        if (step == 7500) cells[1] = "n/a?";
    }

    private static string Local(DateTimeOffset time, TimeZoneInfo zone) =>
        TimeZoneInfo.ConvertTime(time, zone).ToString("yyyy-MM-dd'T'HH:mm:ss", CultureInfo.InvariantCulture);

    private static string Text(double value, int digits) => value.ToString("F" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    // Box and Muller (1958).
    private static double Normal(Random random) => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
