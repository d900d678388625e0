namespace TwoPhase.Benchmarks.Ratios;

/// <summary>One measured thing: a loop of calls whose results are summed, so that none is optimised away.</summary>
/// <param name="What">What one call does, as the table prints it.</param>
/// <param name="Calls">Calls in one run of the loop.</param>
/// <param name="Run">The loop; returns the sum of its results.</param>
internal sealed record RatioCase(string What, int Calls, Func<double> Run)
{
    /// <summary>What the time of a call is divided by; null for a yardstick itself.</summary>
    public RatioCase? Yardstick { get; init; }

    /// <summary>The largest ratio that is good enough; null where none is set.</summary>
    public double? Target { get; init; }
}
