namespace LivePasses.Plant;

/// <summary>What happens at the invented plant, again and again every two hours: moves that everybody sees in the tags, and faults that nobody does.</summary>
internal static class Story
{
    private const double Length = 7200;

    // Firing as a share of full firing.
    private static readonly Course Firing = new((360, 0.92), (362, 0.97), (1500, 0.97), (1560, 0.92));

    // Feed temperature [K].
    private static readonly Course FeedTemperature = new((2400, 445), (2700, 455), (3900, 455), (4500, 445));

    // Header pressure [Pa].
    private static readonly Course HeaderPressure = new((2000, 9.6e6), (2060, 9.3e6), (5400, 9.3e6), (5700, 9.6e6));

    // The feed of one pass over that of the others.
    private static readonly Course ThirdFeed = new((900, 1), (905, 0.955), (1800, 0.955), (1810, 1));

    // The differential of one meter over the true one.
    private static readonly Course FifthMeter = new((3000, 1), (5400, 0.93), (6600, 0.93), (6610, 1));

    public static double FiringAt(double time) => Firing.At(time % Length);

    public static double FeedTemperatureAt(double time) => FeedTemperature.At(time % Length);

    public static double HeaderPressureAt(double time) => HeaderPressure.At(time % Length);

    public static double FeedShare(int pass, double time) => pass == 2 ? ThirdFeed.At(time % Length) : 1;

    public static double MeterFactor(int pass, double time) => pass == 4 ? FifthMeter.At(time % Length) : 1;

    /// <summary>Whether the differential of a pass is out of service.</summary>
    public static bool IsOutOfService(int pass, double time) => pass == 5 && time % Length is > 1200 and < 1320;

    /// <summary>Values at times, straight between.</summary>
    private sealed class Course(params (double Time, double Value)[] points)
    {
        private readonly MathNet.Numerics.Interpolation.IInterpolation _line =
            MathNet.Numerics.Interpolation.LinearSpline.InterpolateSorted([.. points.Select(static point => point.Time)], [.. points.Select(static point => point.Value)]);

        public double At(double time) => _line.Interpolate(Math.Clamp(time, points[0].Time, points[^1].Time));
    }
}
