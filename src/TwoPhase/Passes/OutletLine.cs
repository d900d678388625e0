using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>
/// The unheated line between the end of the last tube and the place where the outlet pressure is measured: the meter or the
/// header. Its enthalpy does not change, so quality follows from the pressure lost in it.
/// </summary>
/// <remarks>The loss is Δp = K G² v / 2 with the homogeneous specific volume v of the wet stream and G on the bore of the line.</remarks>
public sealed class OutletLine
{
    /// <summary>A line given by its loss and its volume.</summary>
    /// <param name="bore">Inside diameter, on which K is based.</param>
    /// <param name="lossCoefficient">K of everything between tube end and measuring place, friction included; not negative.</param>
    /// <param name="volume">Water-side volume, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public OutletLine(Length bore, double lossCoefficient, Volume volume)
    {
        RawBore = Require.Positive(bore.Si(), "Bore of the outlet line", Scale.Millimetres, nameof(bore));
        LossCoefficient = Require.NotNegative(lossCoefficient, "Loss coefficient of the outlet line", Scale.None, nameof(lossCoefficient));
        RawVolume = Require.Positive(volume.Si(), "Volume of the outlet line", Scale.CubicMetres, nameof(volume));
    }

    /// <summary>Inside diameter.</summary>
    public Length Bore => Length.FromMeters(RawBore);

    /// <summary>K, friction included.</summary>
    public double LossCoefficient { get; }

    /// <summary>Water-side volume.</summary>
    public Volume WaterVolume => Volume.FromCubicMeters(RawVolume);

    internal double RawBore { get; }

    internal double RawVolume { get; }
}
