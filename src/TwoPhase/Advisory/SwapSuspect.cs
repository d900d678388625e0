using TwoPhase.Metering;

namespace TwoPhase.Advisory;

/// <summary>Two passes whose tags look exchanged: each has shifted by what the other one's value would explain.</summary>
/// <param name="First">Index of the one pass.</param>
/// <param name="Second">Index of the other.</param>
/// <param name="Signal">Whose tags: differential or feed flow.</param>
public readonly record struct SwapSuspect(int First, int Second, PassSignal Signal);
