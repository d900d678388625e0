using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

public sealed partial class TubeSection
{
    /// <summary>An unheated line between two sections.</summary>
    /// <param name="name">Name of the line.</param>
    /// <param name="bore">Inside diameter.</param>
    /// <param name="outsideDiameter">Outside diameter.</param>
    /// <param name="length">Length of the line.</param>
    /// <param name="lossCoefficient">K of its bends and ends together.</param>
    public static TubeSection Crossover(string name, Length bore, Length outsideDiameter, Length length, double lossCoefficient = 0) =>
        new TubeSection(name, bore, outsideDiameter, length).AsUnheated().WithLossCoefficient(lossCoefficient);

    /// <summary>An unheated header or vessel that the whole flow of the pass runs through.</summary>
    /// <param name="name">Name of the header.</param>
    /// <param name="bore">Inside diameter of the body.</param>
    /// <param name="volume">Water-side volume.</param>
    /// <param name="metal">Mass of its metal.</param>
    /// <param name="lossCoefficient">K of inlet and outlet together, on the mass flux in the body.</param>
    /// <exception cref="ArgumentOutOfRangeException">A measure is not greater than zero.</exception>
    public static TubeSection Header(string name, Length bore, Volume volume, Mass metal, double lossCoefficient = 0)
    {
        double diameter = Require.Positive(bore.Si(), $"Bore of section '{name}'", Scale.Millimetres, nameof(bore));
        double water = Require.Positive(volume.Si(), $"Volume of section '{name}'", Scale.CubicMetres, nameof(volume));
        double mass = Require.Positive(metal.Si(), $"Metal of section '{name}'", Kilograms, nameof(metal));
        double length = water / (Math.PI / 4 * diameter * diameter);
        double outside = Math.Sqrt((diameter * diameter) + (mass / (TubeMetal.CarbonSteel.RawDensity * length * Math.PI / 4)));
        return Crossover(name, bore, Length.FromMeters(outside), Length.FromMeters(length), lossCoefficient).WithMetalMass(metal);
    }

    /// <summary>With return bends in each flow path.</summary>
    /// <param name="count">Number of bends.</param>
    /// <param name="centreRadius">Radius to the centre line: half the distance between the tubes that it joins.</param>
    /// <param name="lossCoefficient">K of one bend for one phase; about 0.2 to 0.4 for 180° bends of long radius (common practice, no source).</param>
    public TubeSection WithReturnBends(int count, Length centreRadius, double lossCoefficient)
    {
        TubeSection copy = Copy();
        copy.ReturnBends = count >= 0 ? count : throw new ArgumentOutOfRangeException(nameof(count), $"{Of("Return bends")} = {Text(count)} must not be negative.");
        copy._bendRadius = Require.NotNegative(centreRadius.Si(), Of("Radius of the bends"), Scale.Millimetres, nameof(centreRadius));
        copy._bendLoss = Require.NotNegative(lossCoefficient, Of("Loss coefficient of the bends"), Scale.None, nameof(lossCoefficient));
        return copy;
    }

    /// <summary>With several equal flow paths side by side, each taking the same share of the flow.</summary>
    /// <param name="count">Number of paths.</param>
    public TubeSection WithParallelTubes(int count)
    {
        TubeSection copy = Copy();
        copy.ParallelTubes = count >= 1 ? count : throw new ArgumentOutOfRangeException(nameof(count), $"{Of("Parallel tubes")} = {Text(count)} must be at least 1.");
        return copy;
    }

    /// <summary>With tubes that slope; the outlet then lies higher by the whole length times the sine, unless <see cref="WithRise"/> says otherwise.</summary>
    /// <param name="inclination">−90° to 90°, positive where the flow rises.</param>
    public TubeSection WithInclination(Angle inclination)
    {
        TubeSection copy = Copy();
        copy._inclination = Require.Within(inclination.Si(), -Math.PI / 2, Math.PI / 2, Of("Inclination"), Scale.Degrees, nameof(inclination));
        return copy;
    }

    /// <summary>With the height of the outlet above the inlet: for coils whose horizontal tubes are stacked.</summary>
    /// <param name="rise">Positive where the outlet lies higher; at most the length of the flow path.</param>
    public TubeSection WithRise(Length rise)
    {
        TubeSection copy = Copy();
        copy._rise = Require.Within(rise.Si(), -RawLength, RawLength, Of("Rise"), Scale.Metres, nameof(rise));
        return copy;
    }

    /// <summary>With a rough bore.</summary>
    /// <param name="roughness">Zero for smooth; 46 µm is usual for commercial steel.</param>
    public TubeSection WithRoughness(Length roughness)
    {
        TubeSection copy = Copy();
        copy._roughness = Require.NotNegative(roughness.Si(), Of("Roughness"), Scale.Millimetres, nameof(roughness));
        return copy.RequireOpenBore(nameof(roughness));
    }

    /// <summary>With scale on the water side.</summary>
    /// <param name="thickness">Thickness of the layer.</param>
    /// <param name="conductivity">Its thermal conductivity.</param>
    public TubeSection WithScale(Length thickness, ThermalConductivity conductivity)
    {
        TubeSection copy = Copy();
        copy._scale = Require.NotNegative(thickness.Si(), Of("Scale"), Scale.Millimetres, nameof(thickness));
        copy._scaleConductivity = Require.Positive(conductivity.Si(), Of("Conductivity of the scale"), TubeMetal.WattsPerMetreKelvin, nameof(conductivity));
        return copy.RequireOpenBore(nameof(thickness));
    }

    /// <summary>With fins, as the surface and the metal that they add to all tubes of the section together.</summary>
    /// <param name="surface">Outside surface added.</param>
    /// <param name="metal">Metal added.</param>
    public TubeSection WithFins(Area surface, Mass metal)
    {
        TubeSection copy = Copy();
        copy._finSurface = Require.NotNegative(surface.Si(), Of("Surface of the fins"), new Scale("m²", 1), nameof(surface));
        copy._finMetal = Require.NotNegative(metal.Si(), Of("Metal of the fins"), Kilograms, nameof(metal));
        return copy;
    }

    /// <summary>With a ribbed (rifled) bore, whose friction is that of a plain bore times the maker's factor.</summary>
    /// <param name="frictionMultiplier">Factor, at least 1.</param>
    public TubeSection WithRibs(double frictionMultiplier)
    {
        TubeSection copy = Copy();
        copy.IsRibbed = true;
        copy._frictionMultiplier = Require.Within(frictionMultiplier, 1, 100, Of("Friction multiplier"), Scale.None, nameof(frictionMultiplier));
        return copy;
    }

    /// <summary>With friction that is that of the formula times a factor, as a fit to measured pressures has found it.</summary>
    /// <param name="factor">Factor, 0.01 to 100; over that of ribs where the bore has some.</param>
    public TubeSection WithFrictionFactor(double factor)
    {
        TubeSection copy = Copy();
        copy._frictionMultiplier = Require.Within(factor, 0.01, 100, Of("Friction factor"), Scale.None, nameof(factor));
        return copy;
    }

    /// <summary>With a further loss, on the section's own mass flux.</summary>
    /// <param name="coefficient">K, not negative.</param>
    public TubeSection WithLossCoefficient(double coefficient)
    {
        TubeSection copy = Copy();
        copy._lossCoefficient = Require.NotNegative(coefficient, Of("Loss coefficient"), Scale.None, nameof(coefficient));
        return copy;
    }

    /// <summary>Of another metal.</summary>
    /// <param name="metal">The metal.</param>
    public TubeSection WithMetal(TubeMetal metal)
    {
        TubeSection copy = Copy();
        copy.Metal = Require.NotNull(metal, nameof(metal));
        return copy;
    }

    /// <summary>With the mass of its metal, fins included, as the drawing gives it; else it follows from the diameters.</summary>
    /// <param name="mass">Greater than zero.</param>
    public TubeSection WithMetalMass(Mass mass)
    {
        TubeSection copy = Copy();
        copy._metalMass = Require.Positive(mass.Si(), Of("Metal"), Kilograms, nameof(mass));
        return copy;
    }

    /// <summary>The same section in the convection bank.</summary>
    public TubeSection AsConvective() => In(HeatZone.Convective);

    /// <summary>The same section outside the fire.</summary>
    public TubeSection AsUnheated() => In(HeatZone.Unheated);

    private static readonly Scale Kilograms = new("kg", 1);

    private TubeSection In(HeatZone zone)
    {
        TubeSection copy = Copy();
        copy.Zone = zone;
        return copy;
    }

    private TubeSection Copy() => (TubeSection)MemberwiseClone();

    private TubeSection RequireOpenBore(string parameter)
    {
        if (RawFreeBore <= 0) throw Require.OutOfRange(_scale, Of("Scale"), Scale.Millimetres, parameter, $"must be below half the bore, {Scale.Millimetres.Text(_bore / 2)}");
        Require.Below(_roughness, RawFreeBore / 2, Of("Roughness"), Scale.Millimetres, parameter);
        return this;
    }
}
