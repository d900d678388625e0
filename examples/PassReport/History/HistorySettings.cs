namespace PassReport.History;

/// <summary>How the history file is written: the "history" member of the generator's file.</summary>
internal sealed class HistorySettings
{
    /// <summary>Name of the time column; with a unit, <c>time_s [s]</c>, it counts from <see cref="Start"/>.</summary>
    public string Time { get; set; } = "time";

    /// <summary>Zone of time stamps that carry no offset, by its IANA name; without one such stamps are refused.</summary>
    public string? Zone { get; set; }

    /// <summary>How a time stamp is written where it is not ISO 8601, as .NET writes formats: <c>MM/dd/yyyy HH:mm:ss</c>.</summary>
    public string? TimeFormat { get; set; }

    /// <summary>Whether numbers have a decimal comma.</summary>
    public bool DecimalComma { get; set; }

    /// <summary>Where a counted time starts.</summary>
    public DateTimeOffset? Start { get; set; }

    /// <summary>Words that stand where a number should and mean that it is bad.</summary>
    public IReadOnlyList<string> BadValues { get; set; } = [];

    /// <summary>Statuses of the long form that mean that a value is good.</summary>
    public IReadOnlyList<string> GoodStatuses { get; set; } = ["Good"];

    /// <summary>How long a value of the long form holds until the tag reports again [s].</summary>
    public double HoldSeconds { get; set; } = 60;
}
