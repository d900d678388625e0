namespace TwoPhase.Metering;

/// <summary>How the convergent section of a classical Venturi tube was made; ISO 5167-4 gives each its own coefficient and limits.</summary>
public enum ConvergentFinish
{
    /// <summary>Cast, the convergent left as cast.</summary>
    AsCast,

    /// <summary>The convergent machined.</summary>
    Machined,

    /// <summary>Rolled and welded from sheet, rough.</summary>
    RoughWelded,
}
