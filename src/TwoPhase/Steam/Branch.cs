using TwoPhase.Steam.Backward;
using static TwoPhase.Steam.Water97;

namespace TwoPhase.Steam;

/// <summary>The stretch of an isobar that one region covers, and one phase of it.</summary>
internal readonly struct Branch(int region, double cold, double hot, bool vapour = false, bool startsSaturated = false, bool endsSaturated = false)
{
    /// <summary>At most this many stretches make up an isobar.</summary>
    public const int Most = 4;

    // The formulation's own seams, up to 0.09 kJ/kg in h, leave values that neither region reaches: each may go a little beyond.
    private const double Overlap = 0.2;

    /// <summary>Region, 1, 2, 3 or 5.</summary>
    public int Region { get; } = region;

    /// <summary>Lowest temperature of the stretch [K].</summary>
    public double Cold { get; } = cold;

    /// <summary>Highest temperature of the stretch [K].</summary>
    public double Hot { get; } = hot;

    /// <summary>Lowest temperature that a search may try: saturation is hard, a border is not, and the end of the formulation as the caller says.</summary>
    public double SearchFrom(double beyond) => startsSaturated ? Cold : Cold - (Cold <= LowestTemperature ? beyond : Overlap);

    /// <summary>Highest temperature that a search may try.</summary>
    public double SearchTo(double pressure, double beyond) => endsSaturated ? Hot : Hot + (Hot >= HighestTemperatureAt(pressure) ? beyond : Overlap);

    /// <summary>True where the temperature is bounded by saturation: the phase is known, so only round-off can lead there.</summary>
    public bool IsSaturatedAt(double temperature) => (startsSaturated && temperature <= Cold) || (endsSaturated && temperature >= Hot);

    /// <summary>The phase at p and T from the equation of this stretch.</summary>
    public PhaseCore At(double pressure, double temperature) => Region switch
    {
        1 => Region1.At(pressure, temperature),
        2 => Region2.At(pressure, temperature),
        3 => Region3.AtPressure(pressure, temperature, vapour),
        _ => Region5.At(pressure, temperature),
    };

    /// <summary>A temperature to start from: the backward equation where there is one.</summary>
    public double Start(double pressure, Property property, double value) => (Region, property) switch
    {
        (1, Property.Enthalpy) => Backward1.TemperatureFromEnthalpy(pressure, value),
        (1, Property.Entropy) => Backward1.TemperatureFromEntropy(pressure, value),
        (2, Property.Enthalpy) => Backward2.TemperatureFromEnthalpy(pressure, value),
        (2, Property.Entropy) => Backward2.TemperatureFromEntropy(pressure, value),
        (3, Property.Enthalpy) => Backward3.TemperatureFromEnthalpy(pressure, value),
        (3, Property.Entropy) => Backward3.TemperatureFromEntropy(pressure, value),
        (1, _) => (Cold + Hot) / 2,
        _ => pressure * value / GasConstant,
    };

    /// <summary>Highest temperature of the formulation at a pressure [K].</summary>
    public static double HighestTemperatureAt(double pressure) => pressure <= HighestPressureOfRegion5 ? HighestTemperature : Border25Temperature;

    /// <summary>The liquid side of a subcritical isobar, cold end first.</summary>
    public static int Liquid(double saturation, Span<Branch> branches)
    {
        if (saturation <= Border13Temperature)
        {
            branches[0] = new(1, LowestTemperature, saturation, endsSaturated: true);
            return 1;
        }

        branches[0] = new(1, LowestTemperature, Border13Temperature);
        branches[1] = new(3, Border13Temperature, saturation, endsSaturated: true);
        return 2;
    }

    /// <summary>The vapour side of a subcritical isobar, cold end first.</summary>
    public static int Vapour(double pressure, double saturation, Span<Branch> branches)
    {
        if (saturation <= Border13Temperature) return Superheated(pressure, saturation, true, branches);

        double border = Border23.Temperature(pressure);
        branches[0] = new(3, saturation, border, vapour: true, startsSaturated: true);
        return 1 + Superheated(pressure, border, false, branches.Slice(1));
    }

    /// <summary>A supercritical isobar, cold end first.</summary>
    public static int Supercritical(double pressure, Span<Branch> branches)
    {
        double border = Border23.Temperature(pressure);
        branches[0] = new(1, LowestTemperature, Border13Temperature);
        branches[1] = new(3, Border13Temperature, border);
        return 2 + Superheated(pressure, border, false, branches.Slice(2));
    }

    /// <summary>Regions 2 and 5 from a temperature up.</summary>
    public static int Superheated(double pressure, double from, bool startsSaturated, Span<Branch> branches)
    {
        branches[0] = new(2, from, Border25Temperature, startsSaturated: startsSaturated);
        if (pressure > HighestPressureOfRegion5) return 1;
        branches[1] = new(5, Border25Temperature, HighestTemperature);
        return 2;
    }
}
