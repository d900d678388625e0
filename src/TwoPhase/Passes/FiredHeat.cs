using System.Globalization;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>Where the heat of a fire goes.</summary>
public readonly record struct FiredHeat
{
    /// <summary>Heat that the fuel releases, the water of combustion condensed.</summary>
    public Power ReleasedGross => Power.FromWatts(RawReleasedGross);

    /// <summary>Heat that the fuel releases, the water of combustion as vapour.</summary>
    public Power ReleasedNet => Power.FromWatts(RawReleasedNet);

    /// <summary>Heat that the air brings, above 25 °C; negative in the cold.</summary>
    public Power AirHeat => Power.FromWatts(RawAirHeat);

    /// <summary>Sensible heat that the flue gas takes away, above 25 °C.</summary>
    public Power StackLoss => Power.FromWatts(RawStackLoss);

    /// <summary>Heat lost through the casing.</summary>
    public Power ShellLoss => Power.FromWatts(RawShellLoss);

    /// <summary>Heat absorbed by the water: net release and air, less the losses. Zero when the stack takes all.</summary>
    public Power Absorbed => Power.FromWatts(RawAbsorbed);

    /// <summary>Share of the absorbed heat that the convection bank takes; the radiant section takes the rest.</summary>
    public Ratio ConvectiveShare => Ratio.FromDecimalFractions(RawConvectiveShare);

    /// <summary>Heat absorbed in the convection bank.</summary>
    public Power Convective => Power.FromWatts(RawAbsorbed * RawConvectiveShare);

    /// <summary>Heat absorbed in the radiant section.</summary>
    public Power Radiant => Power.FromWatts(RawAbsorbed * (1 - RawConvectiveShare));

    /// <summary>Air over the least that burns the fuel, less 1.</summary>
    public Ratio ExcessAir => Ratio.FromDecimalFractions(RawExcessAir);

    /// <summary>Temperature below which the flue gas, at 101.325 kPa, would drop water: there the balance does not hold. Null when it carries next to none.</summary>
    public Temperature? WaterDewPoint => double.IsNaN(RawWaterDewPoint) ? null : Temperature.FromKelvins(RawWaterDewPoint);

    internal double RawReleasedGross { get; init; }

    internal double RawReleasedNet { get; init; }

    internal double RawAirHeat { get; init; }

    internal double RawStackLoss { get; init; }

    internal double RawShellLoss { get; init; }

    internal double RawAbsorbed => Math.Max(0, RawReleasedNet + RawAirHeat - RawStackLoss - RawShellLoss);

    internal double RawConvectiveShare { get; init; }

    internal double RawExcessAir { get; init; }

    internal double RawWaterDewPoint { get; init; }

    /// <summary>Absorbed heat over released heat; zero without fire.</summary>
    /// <param name="basis">Gross or net: what the released heat counts.</param>
    /// <exception cref="ArgumentOutOfRangeException">The basis is none.</exception>
    public Ratio Efficiency(HeatingBasis basis)
    {
        double released = basis switch
        {
            HeatingBasis.Gross => RawReleasedGross,
            HeatingBasis.Net => RawReleasedNet,
            _ => throw new ArgumentOutOfRangeException(nameof(basis), $"{basis} is no basis of an efficiency: say gross or net."),
        };
        return Ratio.FromDecimalFractions(released > 0 ? RawAbsorbed / released : 0);
    }

    internal object ToDump() => ToString();

    /// <summary>Absorbed heat, its split and the efficiency, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0:G5} MW absorbed, {1:F1} % of it by convection, {2:F1} % of the gross release", RawAbsorbed * 1e-6, RawConvectiveShare * 100, (double)Efficiency(HeatingBasis.Gross).Percent);
}
