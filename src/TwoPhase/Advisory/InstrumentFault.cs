namespace TwoPhase.Advisory;

/// <summary>One fault that explains why the measurements disagree: an instrument, or one of several that cannot be told apart.</summary>
public sealed class InstrumentFault
{
    internal InstrumentFault(IReadOnlyList<Suspect> suspects) => Suspects = suspects;

    /// <summary>The instruments whose fault explains the measurements at least a twentieth as well as that of the best, the best first.</summary>
    public IReadOnlyList<Suspect> Suspects { get; }

    /// <summary>The most likely faulty instrument, with its size once every other fault is taken out; it is the one set aside.</summary>
    public Suspect First => Suspects[0];

    /// <summary>Whether one instrument alone is named.</summary>
    public bool IsOneInstrument => Suspects.Count == 1;

    internal object ToDump() => ToString();

    /// <summary>The fault in words.</summary>
    public override string ToString() => IsOneInstrument ? First.ToString() : "one of: " + string.Join("; ", Suspects);
}
