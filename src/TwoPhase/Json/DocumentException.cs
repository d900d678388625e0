namespace TwoPhase.Json;

/// <summary>A document that cannot be read; the message is one line and says where, as a JSON path or as line and column.</summary>
public sealed class DocumentException : Exception
{
    /// <summary>An unexplained fault.</summary>
    public DocumentException()
    {
    }

    /// <summary>A fault of the whole document.</summary>
    /// <param name="message">What is wrong.</param>
    public DocumentException(string message)
        : base(message)
    {
    }

    /// <summary>A fault of the whole document.</summary>
    /// <param name="message">What is wrong.</param>
    /// <param name="innerException">What was thrown.</param>
    public DocumentException(string message, Exception innerException)
        : base(message, innerException)
    {
    }

    /// <summary>A fault at one place.</summary>
    /// <param name="path">JSON path, <c>$.passes[2].meter.throat</c>.</param>
    /// <param name="message">What is wrong.</param>
    /// <param name="innerException">What was thrown; null when nothing was.</param>
    public DocumentException(string path, string message, Exception? innerException)
        : base(path.Length == 0 ? message : $"{path}: {message}", innerException) => Path = path;

    /// <summary>JSON path of the fault; empty when the text is no JSON at all.</summary>
    public string Path { get; } = "";
}
