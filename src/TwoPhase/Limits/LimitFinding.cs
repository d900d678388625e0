using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>One row of the table of limits: the limit, where it is nearest, how far it is, and what moves it most.</summary>
public sealed class LimitFinding
{
    private readonly LimitFigure _figure;
    private readonly Pass _pass;
    private readonly Lazy<LimitEffect[]> _effects;

    internal LimitFinding(in LimitFigure figure, Pass pass, Func<LimitEffect[]> effects)
    {
        _figure = figure;
        _pass = pass;
        _effects = new(effects);
    }

    /// <summary>What the limit is about.</summary>
    public LimitKind Kind => _figure.Kind;

    /// <summary>The limit in words.</summary>
    public string Name => _figure.Name;

    /// <summary>How the pass stands to it.</summary>
    public LimitStatus Status => _figure.Status;

    /// <summary>Name of the section where the pass is nearest to it, or furthest beyond; null where it does not apply.</summary>
    public string? Section => Applies ? _pass.Ducts[_figure.Place.Duct].Name : null;

    /// <summary>Distance of that place from the inlet of the pass; null where it does not apply.</summary>
    public Length? Position => Applies ? Length.FromMeters(_figure.Place.Position) : null;

    /// <summary>The value there; null where the limit does not apply.</summary>
    public IQuantity? Value => Applies ? _figure.Quantity.Level(_figure.Value) : null;

    /// <summary>The limit; null where it does not apply.</summary>
    public IQuantity? Limit => Applies ? _figure.Quantity.Level(_figure.Limit) : null;

    /// <summary>Room left, negative beyond the limit; null where it does not apply.</summary>
    public IQuantity? Margin => Applies ? _figure.Quantity.Difference(_figure.Margin) : null;

    /// <summary>Why the limit does not apply, or what to know of it; may be empty.</summary>
    public string Reason => _figure.Reason;

    /// <summary>What one step of each input does to the margin; empty where the limit does not apply. The first call solves the pass five times.</summary>
    public IReadOnlyList<LimitEffect> Effects => _effects.Value;

    /// <summary>The input whose step moves the margin most; <see cref="LimitInput.None"/> where none does or the limit does not apply.</summary>
    public LimitInput MovedMostBy => Effects.Where(effect => Math.Abs(effect.RawChange) > 0).OrderByDescending(effect => Math.Abs(effect.RawChange)).Select(effect => effect.Input).FirstOrDefault();

    internal bool Applies => Status is LimitStatus.Within or LimitStatus.Beyond or LimitStatus.Indicator;

    internal object ToDump() => ToString();

    /// <summary>The row, invariant culture.</summary>
    public override string ToString() => Applies
        ? $"{Name}: {_figure.Quantity.LevelText(_figure.Value)} in section '{Section}', limit {_figure.Quantity.LevelText(_figure.Limit)}, margin {_figure.Quantity.DifferenceText(_figure.Margin)}, {Words}{(Reason.Length > 0 ? "; " + Reason : "")}"
        : $"{Name}: not applicable; {Reason}";

    private string Words => Status switch { LimitStatus.Within => "within", LimitStatus.Beyond => "beyond", _ => "an indicator, no alarm" };
}
