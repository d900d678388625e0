using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>
/// A stretch of a pass drawn as one item: tubes of one bore in series, with their return bends, possibly several side by side.
/// Immutable; each <c>With…</c> method returns a changed copy.
/// </summary>
/// <remarks>
/// <para>The flow path of a section is its straight tubes and its return bends; bends are taken as spread evenly along it.</para>
/// <para>A section is heated by the flame (<see cref="HeatZone.Radiant"/>) unless <see cref="AsConvective"/>, <see cref="AsUnheated"/>,
/// <see cref="Crossover"/> or <see cref="Header"/> says otherwise.</para>
/// </remarks>
public sealed partial class TubeSection
{
    private double _bore, _outsideDiameter, _tubeLength, _bendRadius, _bendLoss, _roughness, _scale, _scaleConductivity = DepositConductivity;
    private double _inclination, _finSurface, _finMetal, _lossCoefficient, _frictionMultiplier = 1;
    private double? _rise, _metalMass;

    /// <summary>Straight tubes in series.</summary>
    /// <param name="name">Name of the section, its own within the pass.</param>
    /// <param name="bore">Inside diameter of the tube as drawn, without scale.</param>
    /// <param name="outsideDiameter">Outside diameter, greater than the bore.</param>
    /// <param name="tubeLength">Straight length of one tube.</param>
    /// <param name="tubesInSeries">How many such tubes the water runs through one after the other.</param>
    /// <exception cref="ArgumentOutOfRangeException">A measure is not greater than zero, or the outside diameter does not exceed the bore.</exception>
    public TubeSection(string name, Length bore, Length outsideDiameter, Length tubeLength, int tubesInSeries = 1)
    {
        Name = string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("A section needs a name.", nameof(name)) : name;
        _bore = Positive(bore, "Bore", nameof(bore), Scale.Millimetres);
        _outsideDiameter = Positive(outsideDiameter, "Outside diameter", nameof(outsideDiameter), Scale.Millimetres);
        if (_outsideDiameter <= _bore) throw Require.OutOfRange(_outsideDiameter, Of("Outside diameter"), Scale.Millimetres, nameof(outsideDiameter), $"must exceed the bore, {Scale.Millimetres.Text(_bore)}");
        _tubeLength = Positive(tubeLength, "Tube length", nameof(tubeLength), Scale.Metres);
        TubesInSeries = tubesInSeries >= 1 ? tubesInSeries : throw new ArgumentOutOfRangeException(nameof(tubesInSeries), $"{Of("Tubes in series")} = {Text(tubesInSeries)} must be at least 1.");
    }

    /// <summary>Name of the section.</summary>
    public string Name { get; }

    /// <summary>Inside diameter of the tube as drawn.</summary>
    public Length Bore => Length.FromMeters(_bore);

    /// <summary>Outside diameter of the tube.</summary>
    public Length OutsideDiameter => Length.FromMeters(_outsideDiameter);

    /// <summary>Straight length of one tube.</summary>
    public Length TubeLength => Length.FromMeters(_tubeLength);

    /// <summary>Tubes that the water runs through one after the other.</summary>
    public int TubesInSeries { get; }

    /// <summary>Equal flow paths side by side.</summary>
    public int ParallelTubes { get; private set; } = 1;

    /// <summary>Return bends in one flow path.</summary>
    public int ReturnBends { get; private set; }

    /// <summary>Radius of a return bend, to the centre line; zero without bends.</summary>
    public Length BendRadius => Length.FromMeters(_bendRadius);

    /// <summary>Loss coefficient K of one return bend for one phase: Δp = K G² / (2 ρ). Where both phases flow, <see cref="Friction.LocalLoss.BendB"/> gives what a bend has more than homogeneous flow.</summary>
    public double BendLossCoefficient => _bendLoss;

    /// <summary>Loss coefficient K of everything else in the section (entrance, exit, restrictor), on its own mass flux; both phases as homogeneous flow.</summary>
    public double LossCoefficient => _lossCoefficient;

    /// <summary>Roughness of the bore.</summary>
    public Length Roughness => Length.FromMeters(_roughness);

    /// <summary>Thickness of the scale on the water side; it narrows the bore.</summary>
    public Length ScaleThickness => Length.FromMeters(_scale);

    /// <summary>Thermal conductivity of the scale.</summary>
    public ThermalConductivity ScaleConductivity => ThermalConductivity.FromWattsPerMeterKelvin(_scaleConductivity);

    /// <summary>Slope of the tubes against the horizontal, positive where the flow rises: what slip and film models see.</summary>
    public Angle Inclination => Angle.FromRadians(_inclination);

    /// <summary>How much higher the outlet of the section lies than its inlet; from the inclination unless given.</summary>
    public Length Rise => Length.FromMeters(RawRise);

    /// <summary>Outside surface that fins add, all tubes together.</summary>
    public Area FinSurface => Area.FromSquareMeters(_finSurface);

    /// <summary>Metal that fins add, all tubes together.</summary>
    public Mass FinMetal => Mass.FromKilograms(_finMetal);

    /// <summary>Factor on the friction of a plain bore: 1 for plain tubes, the maker's figure for ribbed ones, or what a fit has found.</summary>
    public double FrictionMultiplier => _frictionMultiplier;

    /// <summary>Whether the bore is ribbed (rifled): correlations for plain bores are then used outside their range and flagged.</summary>
    public bool IsRibbed { get; private set; }

    /// <summary>Where the section takes its heat from.</summary>
    public HeatZone Zone { get; private set; } = HeatZone.Radiant;

    /// <summary>Whether the section takes heat from the fire.</summary>
    public bool IsHeated => Zone != HeatZone.Unheated;

    /// <summary>The metal of the tube.</summary>
    public TubeMetal Metal { get; private set; } = TubeMetal.CarbonSteel;

    /// <summary>Length of one flow path: straight tubes and bends.</summary>
    public Length FlowLength => Length.FromMeters(RawLength);

    /// <summary>Cross-section that the water flows through: all parallel tubes, scale deducted.</summary>
    public Area FlowArea => Area.FromSquareMeters(RawFlowArea);

    /// <summary>Volume inside the tubes, scale deducted.</summary>
    public Volume WaterVolume => Volume.FromCubicMeters(RawFlowArea * RawLength);

    /// <summary>Inside surface that the water wets.</summary>
    public Area InsideSurface => Area.FromSquareMeters(RawInsidePerimeter * RawLength);

    /// <summary>Outside surface with fins; of straight tubes only, since bends usually lie outside the gas.</summary>
    public Area OutsideSurface => Area.FromSquareMeters(RawOutsideSurface);

    /// <summary>Mass of tube metal and fins.</summary>
    public Mass MetalMass => Mass.FromKilograms(RawMetalMass);

    internal object ToDump() => ToString();

    /// <summary>Name and measures, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0}: {1:G4} mm bore, {2:G4} mm outside, {3:G5} m", Name, _bore * 1e3, _outsideDiameter * 1e3, RawLength);

    private double Positive(Length value, string what, string parameter, Scale scale) => Require.Positive(value.Si(), Of(what), scale, parameter);

    private string Of(string what) => $"{what} of section '{Name}'";

    private static string Text(int value) => value.ToString(CultureInfo.InvariantCulture);
}
