using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Limits;

/// <summary>One limit as it is found, SI doubles.</summary>
internal readonly record struct LimitFigure(LimitKind Kind, string Name, QuantityScale Quantity)
{
    public LimitStatus Status { get; init; }

    public double Value { get; init; }

    public double Limit { get; init; }

    /// <summary>Room to the limit, negative beyond it.</summary>
    public double Margin { get; init; }

    public PassNode Place { get; init; }

    public string Reason { get; init; } = "";

    public LimitFigure NotApplicable(string reason) => this with { Status = LimitStatus.NotApplicable, Reason = reason };

    /// <summary>A value that may rise up to a limit.</summary>
    public LimitFigure Below(double limit, double value, in PassNode place, string reason = "") => Judged(value, limit, limit - value, place, reason);

    /// <summary>A value that may fall down to a limit.</summary>
    public LimitFigure Above(double limit, double value, in PassNode place, string reason = "") => Judged(value, limit, value - limit, place, reason);

    private LimitFigure Judged(double value, double limit, double margin, in PassNode place, string reason) =>
        this with { Status = margin >= 0 ? LimitStatus.Within : LimitStatus.Beyond, Value = value, Limit = limit, Margin = margin, Place = place, Reason = reason };
}
