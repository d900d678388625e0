using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>What the filled legs between tappings and transmitter add to a differential.</summary>
/// <remarks>Legs and condensate pots are hot and pressurised: prove a suspicion under the site's work permit.</remarks>
public static class ImpulseLines
{
    /// <summary>Head that two legs add to the differential: (ρ₊ h₊ − ρ₋ h₋) g.</summary>
    /// <remarks>
    /// <para>h height of liquid above the transmitter [m], ρ its density [kg/m³], + the high-pressure leg, − the low-pressure leg, g = 9.80665 m/s².</para>
    /// <para>Range: legs at rest, full of one liquid each. Where one is short, its pot's steam stands above the liquid: use (ρ − ρg) for the part that is missing.</para>
    /// <para>Accuracy: exact for the densities given.</para>
    /// <para>Source: hydrostatics; ISO 2186:2007 for how legs are laid.</para>
    /// </remarks>
    /// <param name="highHeight">h₊, height of the high-pressure leg.</param>
    /// <param name="highDensity">ρ₊, density in it.</param>
    /// <param name="lowHeight">h₋, height of the low-pressure leg.</param>
    /// <param name="lowDensity">ρ₋, density in it.</param>
    public static Pressure Head(Length highHeight, Density highDensity, Length lowHeight, Density lowDensity)
    {
        double high = Require.Finite(highHeight.Si(), "Height of the high-pressure leg", Scale.Metres, nameof(highHeight)) * Positive(highDensity, nameof(highDensity));
        double low = Require.Finite(lowHeight.Si(), "Height of the low-pressure leg", Scale.Metres, nameof(lowHeight)) * Positive(lowDensity, nameof(lowDensity));
        return Pressure.FromPascals((high - low) * SiDoor.StandardGravity);
    }

    private static double Positive(Density density, string parameter) =>
        Require.Positive(density.Si(), "Density in the leg", Scale.KilogramsPerCubicMetre, parameter);
}
