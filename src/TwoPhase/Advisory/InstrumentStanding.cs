namespace TwoPhase.Advisory;

/// <summary>How a quantity of a reconciled generator is known.</summary>
public enum InstrumentStanding
{
    /// <summary>No answer.</summary>
    None,

    /// <summary>Measured, and the other measurements check it.</summary>
    Checked,

    /// <summary>Measured, and nothing checks it: whatever its error, it stays as it was read, but for an error that it shares with others.</summary>
    Unchecked,

    /// <summary>Not measured; the others determine it.</summary>
    Inferred,

    /// <summary>Not measured, and the others do not determine it.</summary>
    NotObservable,

    /// <summary>Measured, but taken for faulty and not used; the others determine it.</summary>
    SetAside,
}
