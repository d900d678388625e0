namespace TwoPhase.Passes;

/// <summary>One cell of an operating map: the conditions and the figure found there, or why there is none.</summary>
/// <typeparam name="T">The figure.</typeparam>
public readonly record struct OperatingCell<T>
{
    internal OperatingCell(in PassConditions conditions, T? figure, string? fault) => (Conditions, Figure, Fault) = (conditions, figure, fault);

    /// <summary>Feed, outlet pressure and heat of the cell.</summary>
    public PassConditions Conditions { get; }

    /// <summary>The figure; <c>default</c> where there is none.</summary>
    public T? Figure { get; }

    /// <summary>True where the pass has a steady state and the figure was found.</summary>
    public bool HasFigure => Fault is null && Conditions.RawFeedFlow > 0;

    /// <summary>Why there is no figure; null where there is one.</summary>
    public string? Fault { get; }

    internal object ToDump() => ToString();

    /// <summary>Conditions and figure, or the fault.</summary>
    public override string ToString() => $"{Conditions}: {(HasFigure ? Figure : Fault)}";
}
