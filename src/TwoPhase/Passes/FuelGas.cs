using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>A fuel gas of stated composition.</summary>
/// <remarks>
/// <para>Heating values: combustion at 25 °C, volume of the dry gas at 15 °C and 101.325 kPa with its compressibility
/// Z = 1 − (Σ x s)². Combustion at 15 °C would add 0.1 % to the gross value of a natural gas.</para>
/// <para>Source: ISO 6976:2016.</para>
/// </remarks>
public sealed class FuelGas
{
    private const double StandardTemperature = 288.15, StandardPressure = 101325, SumTolerance = 1e-6;

    private readonly FuelShare[] _shares;

    /// <summary>A fuel gas from its composition.</summary>
    /// <param name="shares">Shares by mole, which sum to 1.</param>
    /// <exception cref="ArgumentException">The shares do not sum to 1, a component is named twice, or nothing burns.</exception>
    public FuelGas(params FuelShare[] shares)
    {
        _shares = (FuelShare[])Require.NotNull(shares, nameof(shares)).Clone();
        double sum = _shares.Sum(share => share.RawShare);
        if (!(Math.Abs(sum - 1) <= SumTolerance)) throw new ArgumentException($"Shares of the fuel gas sum to {Scale.None.Text(sum)}; they must sum to 1: {string.Join(", ", _shares)}.", nameof(shares));
        if (_shares.GroupBy(share => share.Component).FirstOrDefault(group => group.Count() > 1) is { } twice) throw new ArgumentException($"The fuel gas has two shares of {twice.Key}.", nameof(shares));
        Figures = GasFigures.Mix(_shares);
        if (Figures.Gross == 0 || OxygenNeed <= 0) throw new ArgumentException($"The fuel gas needs no air to burn: {string.Join(", ", _shares)}.", nameof(shares));
        MolesPerVolume = StandardPressure / (GasFigures.GasConstant * StandardTemperature * (1 - (Figures.Summation * Figures.Summation)));
        RawGross = Figures.Gross;
    }

    /// <summary>Shares by mole.</summary>
    public IReadOnlyList<FuelShare> Shares => _shares;

    /// <summary>Molar mass.</summary>
    public MolarMass MolarMass => MolarMass.FromKilogramsPerMole(Figures.MolarMass);

    internal GasFigures Figures { get; }

    /// <summary>J/m³ as it was given; null when it follows from the composition.</summary>
    internal (double Value, HeatingBasis Basis)? Measured { get; private set; }

    /// <summary>Moles of oxygen that burn a mole of fuel.</summary>
    internal double OxygenNeed => Figures.Carbon + (Figures.Hydrogen / 4) + Figures.Sulphur - (Figures.Oxygen / 2);

    /// <summary>Moles in a cubic metre at 15 °C and 101.325 kPa.</summary>
    internal double MolesPerVolume { get; }

    /// <summary>J/mol.</summary>
    internal double RawGross { get; private set; }

    /// <summary>J/mol.</summary>
    internal double RawNet => RawGross - WaterHeat;

    private double WaterHeat => GasFigures.WaterLatent * Figures.Hydrogen / 2;

    /// <summary>Heating value of a cubic metre at 15 °C and 101.325 kPa.</summary>
    /// <param name="basis">Gross or net.</param>
    /// <exception cref="ArgumentOutOfRangeException">The basis is none.</exception>
    public EnergyDensity HeatingValue(HeatingBasis basis) => EnergyDensity.FromJoulesPerCubicMeter((RawGross - Beyond(basis)) * MolesPerVolume);

    /// <summary>The gas with its heating value as measured, instead of the one that its composition gives.</summary>
    /// <param name="value">Heating value of a cubic metre at 15 °C and 101.325 kPa; greater than zero on the net basis too.</param>
    /// <param name="basis">What it counts.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not greater than zero, or the basis is none.</exception>
    public FuelGas WithHeatingValue(EnergyDensity value, HeatingBasis basis)
    {
        double gross = (Require.Positive(value.Si(), "Heating value", Scale.MegajoulesPerCubicMetre, nameof(value)) / MolesPerVolume) + Beyond(basis);
        if (!(gross > WaterHeat)) throw Require.OutOfRange(value.Si(), "Gross heating value", Scale.MegajoulesPerCubicMetre, nameof(value), $"must exceed {Scale.MegajoulesPerCubicMetre.Text(WaterHeat * MolesPerVolume)}, the heat of its own water");
        var copy = (FuelGas)MemberwiseClone();
        (copy.RawGross, copy.Measured) = (gross, (value.Si(), basis));
        return copy;
    }

    internal object ToDump() => ToString();

    /// <summary>The composition, invariant culture.</summary>
    public override string ToString() => string.Join(", ", _shares);

    // What lies between the gross value and that of a basis.
    private double Beyond(HeatingBasis basis) => basis switch
    {
        HeatingBasis.Gross => 0,
        HeatingBasis.Net => WaterHeat,
        _ => throw new ArgumentOutOfRangeException(nameof(basis), $"{basis} is no basis of a heating value: say gross or net."),
    };
}
