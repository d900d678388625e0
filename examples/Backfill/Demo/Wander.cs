namespace Backfill.Demo;

/// <summary>A value about zero that wanders: sines whose periods do not meet, of size one together.</summary>
internal sealed class Wander(Chance chance, params double[] periods)
{
    private readonly double[] _phases = [.. periods.Select((_, i) => 2 * Math.PI * chance.Of("phase", i).Share)];

    public double At(double seconds)
    {
        double sum = 0;
        for (int i = 0; i < periods.Length; i++) sum += Math.Sin((2 * Math.PI * seconds / periods[i]) + _phases[i]);
        return sum / Math.Sqrt(periods.Length);
    }
}
