using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>What else is measured while a pass has shifted, as means over a quiet time. Immutable; each <c>With…</c> method returns a changed copy.</summary>
public sealed class ShiftWitnesses
{
    private ShiftWitnesses()
    {
    }

    /// <summary>No witness.</summary>
    public static ShiftWitnesses None { get; } = new();

    internal HealthFigures? Baseline { get; private set; }

    internal HealthFigures? Now { get; private set; }

    internal (double Value, double Uncertainty) SeparatorQuality { get; private set; } = (double.NaN, double.NaN);

    internal (double Value, double Uncertainty) SeparatorFlow { get; private set; } = (double.NaN, double.NaN);

    internal (double Value, double Uncertainty) TotalFeed { get; private set; } = (double.NaN, double.NaN);

    internal double OutletTemperature { get; private set; } = double.NaN;

    /// <summary>With what the pass was before it shifted, and what it is: pressure drop and metal temperature.</summary>
    /// <param name="baseline">Before.</param>
    /// <param name="now">Now.</param>
    public ShiftWitnesses WithHealth(HealthFigures baseline, HealthFigures now)
    {
        Require.NotNull(baseline, nameof(baseline));
        Require.NotNull(now, nameof(now));
        return Changed(copy => (copy.Baseline, copy.Now) = (baseline, now));
    }

    /// <summary>With the temperature at the outlet of the pass.</summary>
    /// <param name="temperature">Of the wet steam.</param>
    public ShiftWitnesses WithOutletTemperature(Temperature temperature)
    {
        double kelvins = Require.Positive(temperature.Si(), "Outlet temperature", Scale.Celsius, nameof(temperature));
        return Changed(copy => copy.OutletTemperature = kelvins);
    }

    /// <summary>With the quality of all passes together, by the separator's flows or by solids.</summary>
    /// <param name="quality">Quality.</param>
    /// <param name="standardUncertainty">Its standard uncertainty, greater than zero.</param>
    public ShiftWitnesses WithSeparatorQuality(MassFraction quality, MassFraction standardUncertainty)
    {
        (double Value, double Uncertainty) read = (Require.Within(quality.Si(), 0, 1, "Separator quality", Scale.None, nameof(quality)), Require.Positive(standardUncertainty.Si(), "Standard uncertainty of the quality", Scale.None, nameof(standardUncertainty)));
        return Changed(copy => copy.SeparatorQuality = read);
    }

    /// <summary>With steam and water that leave the separator together.</summary>
    /// <param name="flow">Steam plus water.</param>
    /// <param name="standardUncertainty">Its standard uncertainty, greater than zero.</param>
    public ShiftWitnesses WithSeparatorFlow(MassFlow flow, MassFlow standardUncertainty)
    {
        (double Value, double Uncertainty) read = Flow(flow, standardUncertainty);
        return Changed(copy => copy.SeparatorFlow = read);
    }

    /// <summary>With the feed of all passes by its own meter.</summary>
    /// <param name="flow">Total feed.</param>
    /// <param name="standardUncertainty">Its standard uncertainty, greater than zero.</param>
    public ShiftWitnesses WithTotalFeed(MassFlow flow, MassFlow standardUncertainty)
    {
        (double Value, double Uncertainty) read = Flow(flow, standardUncertainty);
        return Changed(copy => copy.TotalFeed = read);
    }

    private static (double Value, double Uncertainty) Flow(MassFlow flow, MassFlow standardUncertainty) =>
        (Require.Positive(flow.Si(), "Flow", Scale.KilogramsPerSecond, nameof(flow)), Require.Positive(standardUncertainty.Si(), "Standard uncertainty of the flow", Scale.KilogramsPerSecond, nameof(standardUncertainty)));

    private ShiftWitnesses Changed(Action<ShiftWitnesses> change)
    {
        var copy = (ShiftWitnesses)MemberwiseClone();
        change(copy);
        return copy;
    }
}
