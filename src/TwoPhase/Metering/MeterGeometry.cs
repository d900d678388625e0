namespace TwoPhase.Metering;

/// <summary>What of a meter's shape enters ṁ = C ε E A √(2 ρ Δp), at working temperature, SI.</summary>
internal readonly struct MeterGeometry
{
    public MeterGeometry(double pipeDiameter, double throatDiameter)
    {
        // Bores are round numbers of millimetres: their ratio shall meet a limit such as 0.75 exactly, not by a rounding error beyond it.
        double beta = Math.Round(throatDiameter / pipeDiameter, 15);
        PipeDiameter = pipeDiameter;
        ThroatDiameter = throatDiameter;
        DiameterRatio = beta;
        FlowArea = Math.PI / 4 * throatDiameter * throatDiameter / Numerics.Fast.Sqrt(1 - (beta * beta * beta * beta));
    }

    private MeterGeometry(double pipeDiameter, double throatDiameter, double diameterRatio, double flowArea)
    {
        PipeDiameter = pipeDiameter;
        ThroatDiameter = throatDiameter;
        DiameterRatio = diameterRatio;
        FlowArea = flowArea;
    }

    public double PipeDiameter { get; }

    public double ThroatDiameter { get; }

    public double DiameterRatio { get; }

    /// <summary>E·A: throat area times the velocity-of-approach factor 1/√(1 − β⁴), times the calibration factor [m²].</summary>
    public double FlowArea { get; }

    /// <summary>A meter of which only the constant is known.</summary>
    public static MeterGeometry FromFlowArea(double flowArea) => new(double.NaN, double.NaN, double.NaN, flowArea);

    /// <summary>The same shape passing more or less flow, as a calibration has found.</summary>
    public MeterGeometry WithFlowFactor(double factor) => new(PipeDiameter, ThroatDiameter, DiameterRatio, FlowArea * factor);
}
