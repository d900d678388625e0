namespace PassReport.Demo;

/// <summary>A value in time: straight lines between the points given, level before the first and after the last.</summary>
internal sealed class Schedule(params (double Hour, double Value)[] points)
{
    public double At(double hour)
    {
        if (hour <= points[0].Hour) return points[0].Value;
        for (int i = 1; i < points.Length; i++)
        {
            (double Hour, double Value) a = points[i - 1], b = points[i];
            if (hour <= b.Hour) return a.Value + ((b.Value - a.Value) * (hour - a.Hour) / (b.Hour - a.Hour));
        }

        return points[^1].Value;
    }
}
