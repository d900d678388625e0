using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>
/// The unheated line between the end of the last tube and the place where the outlet pressure is measured: the meter or the
/// header. Its enthalpy does not change, so quality follows from the pressure lost in it.
/// </summary>
/// <remarks>
/// <para>The loss is Δp = K G² v / 2 with the homogeneous specific volume v of the wet stream and G on the bore of the line.</para>
/// <para>Most sites measure pressure only at the header: then the line runs from the tube end to the header, with its non-return valve where it
/// has one, and the outlet pressure of the conditions is that of the header. The meter stands at the end of the line unless
/// <see cref="WithMeterAtTubeEnd"/> says otherwise.</para>
/// <para>Immutable; each <c>With…</c> method returns a changed copy.</para>
/// </remarks>
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

    /// <summary>Whether a non-return valve stands at the end of the line, so that nothing flows back from the header.</summary>
    public bool HasNonReturnValve { get; private set; }

    /// <summary>Whether the meter stands at the tube end, before the line; else it stands at its end.</summary>
    public bool IsMeterAtTubeEnd { get; private set; }

    /// <summary>The line with a non-return valve at its end. Its loss while open is part of K.</summary>
    public OutletLine WithNonReturnValve() => Changed(line => line.HasNonReturnValve = true);

    /// <summary>The line with the meter at the tube end, while the pressure is still measured at the end of the line.</summary>
    /// <remarks>A reading then takes the pressure at the meter too low by the loss of the line, at 10 MPa about a point of quality for each 0.1 MPa.</remarks>
    public OutletLine WithMeterAtTubeEnd() => Changed(line => line.IsMeterAtTubeEnd = true);

    internal double RawBore { get; }

    internal double RawVolume { get; }

    private OutletLine Changed(Action<OutletLine> change)
    {
        var copy = (OutletLine)MemberwiseClone();
        change(copy);
        return copy;
    }
}
