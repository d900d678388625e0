namespace TwoPhase.Units;

/// <summary>How the raw number of a tag becomes coherent SI: every spelling, basis and span comes down to factor and offset.</summary>
internal readonly struct UnitMap(double factor, double offset = 0) : IEquatable<UnitMap>
{
    public double Factor { get; } = factor;

    public double Offset { get; } = offset;

    public double Si(double raw) => (raw * Factor) + Offset;

    public double Raw(double si) => (si - Offset) / Factor;

    /// <summary>The same quantity counted from another zero, for example from the site's atmosphere.</summary>
    public UnitMap Above(double zero) => new(Factor, Offset + zero);

    /// <summary>Each unit of the number worth <paramref name="size"/> of what it was.</summary>
    public UnitMap Times(double size) => new(Factor * size, Offset * size);

    /// <summary>0 to 100 of the number spread over <paramref name="low"/> to <paramref name="high"/> of this unit.</summary>
    public UnitMap PerCentOf(double low, double high) => new(Factor * (high - low) / 100, Si(low));

    public bool Equals(UnitMap other) => Factor == other.Factor && Offset == other.Offset;

    public override bool Equals(object? obj) => obj is UnitMap other && Equals(other);

    public override int GetHashCode() => (Factor, Offset).GetHashCode();
}
