namespace TwoPhase.Numerics;

/// <summary>A bounded iteration ended without meeting its tolerance. The message carries what it last had.</summary>
public sealed class ConvergenceException : Exception
{
    /// <summary>An iteration that ended without result.</summary>
    public ConvergenceException()
        : base("The iteration did not converge.")
    {
    }

    /// <summary>An iteration that ended without result.</summary>
    /// <param name="message">What was sought, the last value with its unit, the residual and the rounds.</param>
    public ConvergenceException(string message)
        : base(message)
    {
    }

    /// <summary>An iteration that ended without result because of another failure.</summary>
    /// <param name="message">What was sought, the last value with its unit, the residual and the rounds.</param>
    /// <param name="innerException">The other failure.</param>
    public ConvergenceException(string message, Exception innerException)
        : base(message, innerException)
    {
    }
}
