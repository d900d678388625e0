using System.Globalization;
using UnitsNet;

namespace TwoPhase.Holdup;

/// <summary>What stands in one section of a pass.</summary>
public readonly record struct SectionHoldup
{
    private readonly double _liquid, _vapour, _volume;

    internal SectionHoldup(string section, double liquid, double vapour, double volume) =>
        (Section, _liquid, _vapour, _volume) = (section, liquid, vapour, volume);

    /// <summary>Name of the section.</summary>
    public string Section { get; }

    /// <summary>Liquid in it.</summary>
    public Mass Liquid => Mass.FromKilograms(_liquid);

    /// <summary>Vapour in it.</summary>
    public Mass Vapour => Mass.FromKilograms(_vapour);

    /// <summary>Both together.</summary>
    public Mass Total => Mass.FromKilograms(_liquid + _vapour);

    /// <summary>Its water-side volume.</summary>
    public Volume WaterVolume => Volume.FromCubicMeters(_volume);

    internal object ToDump() => ToString();

    /// <summary>The section in a line, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0}: {1:F1} kg liquid, {2:F1} kg vapour in {3:F3} m³", Section, _liquid, _vapour, _volume);
}
