using System.Text.Json;

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

    /// <summary>The same fault with the path first, in one line.</summary>
    internal static DocumentException Of(JsonException error) => new(error.Path is { Length: > 1 } path ? path : "", Text(error), error);

    private static string Text(JsonException error)
    {
        string where = error.LineNumber is { } line ? $"line {line + 1}, column {(error.BytePositionInLine ?? 0) + 1}: " : "";
        int details = error.Message.IndexOf(" Path: $", StringComparison.Ordinal);
        int position = error.Message.IndexOf(" LineNumber: ", StringComparison.Ordinal);
        int end = details >= 0 ? details : position >= 0 ? position : error.Message.Length;
        string message = string.Join(" ", error.Message[..end].Split('\r', '\n'));
        return where + message.TrimEnd('.');
    }
}
