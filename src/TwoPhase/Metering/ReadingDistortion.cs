namespace TwoPhase.Metering;

/// <summary>What a mistake does to flow, pressure and differential, SI, and how it is taken back.</summary>
internal readonly struct ReadingDistortion
{
    public ReadingDistortion()
    {
    }

    public double FlowFactor { get; init; } = 1;

    public double PressureShift { get; init; }

    public double DifferentialShift { get; init; }

    /// <summary>Also stands for what is wrong with area, coefficient and expansibility, whose square acts beside the differential.</summary>
    public double DifferentialFactor { get; init; } = 1;

    /// <summary>Power of the differential's share of <see cref="Span"/>: ½ for a root too many, 2 for one too few.</summary>
    public double Power { get; init; } = 1;

    public double Span { get; init; } = 1;

    public RawReading Apply(in RawReading right) => new(
        right.Flow * FlowFactor,
        right.Pressure + PressureShift,
        (Raised(right.Differential, Power) * DifferentialFactor) + DifferentialShift);

    public RawReading Undo(in RawReading indicated) => new(
        indicated.Flow / FlowFactor,
        indicated.Pressure - PressureShift,
        Raised((indicated.Differential - DifferentialShift) / DifferentialFactor, 1 / Power));

    private double Raised(double differential, double power) => power == 1 ? differential : Span * Math.Pow(differential / Span, power);
}

/// <summary>Flow, pressure and differential, SI.</summary>
internal readonly record struct RawReading(double Flow, double Pressure, double Differential);
