namespace Backfill.Demo;

/// <summary>Numbers that look thrown and depend on nothing but what they are of, so that any day can be made alone.</summary>
internal readonly struct Chance(ulong seed)
{
    /// <summary>The chance of something in particular.</summary>
    public Chance Of(string what, long number = 0)
    {
        ulong hash = Mixed(seed ^ (ulong)number);
        foreach (char letter in what) hash = Mixed(hash ^ letter);
        return new(hash);
    }

    /// <summary>From 0 up to 1.</summary>
    public double Share => (Mixed(seed) >> 11) * (1.0 / (1UL << 53));

    public Random Stream() => new((int)(Mixed(seed) >> 33));

    // Finaliser of splitmix64 (Steele, Lea and Flood, 2014).
    private static ulong Mixed(ulong z)
    {
        z += 0x9E3779B97F4A7C15;
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
        return z ^ (z >> 31);
    }
}
