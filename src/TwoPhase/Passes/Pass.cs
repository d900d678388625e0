using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>One tube pass of a once-through steam generator: its sections in the order in which the water meets them.</summary>
/// <remarks>Immutable; each <c>With…</c> method returns a changed copy.</remarks>
public sealed partial class Pass
{
    private TubeSection[] _sections;

    /// <summary>A pass from its sections.</summary>
    /// <param name="name">Name of the pass.</param>
    /// <param name="sections">The sections from inlet to outlet, each with its own name; none when only the readings of the pass are wanted.</param>
    /// <param name="heatAtFullFiring">Heat absorbed at 100 % firing, where it is known.</param>
    /// <exception cref="ArgumentException">Two sections share a name.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The heat is not greater than zero.</exception>
    public Pass(string name, IEnumerable<TubeSection> sections, Power? heatAtFullFiring = null)
    {
        Name = string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("A pass needs a name.", nameof(name)) : name;
        _sections = [.. Require.NotNull(sections, nameof(sections))];
        if (_sections.GroupBy(section => section.Name).FirstOrDefault(group => group.Count() > 1) is { } twice) throw new ArgumentException($"Pass '{name}' has two sections named '{twice.Key}'.", nameof(sections));
        if (heatAtFullFiring is { } heat) Require.Positive(heat.Si(), $"Heat at full firing of pass '{name}'", Scale.Megawatts, nameof(heatAtFullFiring));
        HeatAtFullFiring = heatAtFullFiring;
        Heat = _sections.Any(section => section.IsHeated) ? HeatProfile.Even(_sections) : null;
        Lay();
    }

    /// <summary>Name of the pass.</summary>
    public string Name { get; }

    /// <summary>The sections from inlet to outlet.</summary>
    public IReadOnlyList<TubeSection> Sections => _sections;

    /// <summary>Heat absorbed at 100 % firing; null where unknown.</summary>
    public Power? HeatAtFullFiring { get; private set; }

    /// <summary>How the heat is spread; even over the heated surface unless given. Null when no section is heated.</summary>
    public HeatProfile? Heat { get; private set; }

    /// <summary>The line between tube end and the place where the outlet pressure is measured; null when they are one.</summary>
    public OutletLine? OutletLine { get; private set; }

    /// <summary>The feed interchanger; null when there is none.</summary>
    public FeedInterchanger? Interchanger { get; private set; }

    /// <summary>Length of the flow path, outlet line included.</summary>
    public Length FlowLength => Length.FromMeters(Ducts.Length == 0 ? 0 : Ducts[^1].End);

    /// <summary>Water-side volume, outlet line included.</summary>
    public Volume WaterVolume => Volume.FromCubicMeters(Ducts.Sum(duct => duct.Area * duct.Length));

    /// <summary>Inside surface of the sections.</summary>
    public Area InsideSurface => Area.FromSquareMeters(_sections.Sum(section => section.RawInsidePerimeter * section.RawLength));

    /// <summary>Outside surface of the heated sections, fins included.</summary>
    public Area HeatedSurface => Area.FromSquareMeters(_sections.Where(section => section.IsHeated).Sum(section => section.RawOutsideSurface));

    /// <summary>Mass of metal of the sections.</summary>
    public Mass MetalMass => Mass.FromKilograms(_sections.Sum(section => section.RawMetalMass));

    /// <summary>The pass with another spread of heat.</summary>
    /// <param name="heat">The spread; every name must be that of a heated section.</param>
    /// <exception cref="ArgumentException">A name is unknown, or its section is not heated.</exception>
    public Pass WithHeat(HeatProfile heat)
    {
        foreach (SectionHeat entry in Require.NotNull(heat, nameof(heat)).Sections)
        {
            if (!Section(entry.Section, nameof(heat)).IsHeated) throw new ArgumentException($"Section '{entry.Section}' of pass '{Name}' is not heated and cannot have a heat share.", nameof(heat));
        }

        return Changed(pass => pass.Heat = heat);
    }

    /// <summary>The pass with another share of its heat in the convection bank, the shares within each zone kept in proportion.</summary>
    /// <param name="share">Share of the absorbed heat taken by the convective sections.</param>
    /// <exception cref="ArgumentException">The pass has no convective or no radiant section.</exception>
    public Pass WithConvectiveShare(Ratio share)
    {
        string[] convective = [.. _sections.Where(section => section.Zone == HeatZone.Convective).Select(section => section.Name)];
        return Heat is null || convective.Length == 0
            ? throw new ArgumentException($"Pass '{Name}' has no convective section.", nameof(share))
            : WithHeat(Heat.WithConvectiveShare(convective, share));
    }

    /// <summary>The pass with another heat at full firing.</summary>
    /// <param name="heat">Heat absorbed at 100 % firing.</param>
    public Pass WithHeatAtFullFiring(Power heat)
    {
        Require.Positive(heat.Si(), $"Heat at full firing of pass '{Name}'", Scale.Megawatts, nameof(heat));
        return Changed(pass => pass.HeatAtFullFiring = heat);
    }

    /// <summary>The pass with the friction of every section times a factor, as a fit to measured pressures has found it.</summary>
    /// <param name="factor">Factor on what the sections have now.</param>
    public Pass WithFrictionFactor(double factor)
    {
        Require.Positive(factor, $"Friction factor of pass '{Name}'", Scale.None, nameof(factor));
        return Changed(pass => pass._sections = Array.ConvertAll(_sections, section => section.WithFrictionFactor(section.FrictionMultiplier * factor)));
    }

    /// <summary>The pass with an outlet line.</summary>
    /// <param name="line">The line.</param>
    public Pass WithOutletLine(OutletLine line)
    {
        Require.NotNull(line, nameof(line));
        return Changed(pass => pass.OutletLine = line);
    }

    /// <summary>The pass with a feed interchanger between two of its unheated sections.</summary>
    /// <param name="interchanger">The interchanger; its cold section comes first.</param>
    /// <exception cref="ArgumentException">A section is unknown or heated, or the cold one does not come first.</exception>
    public Pass WithInterchanger(FeedInterchanger interchanger)
    {
        TubeSection cold = Section(Require.NotNull(interchanger, nameof(interchanger)).ColdSection, nameof(interchanger)), hot = Section(interchanger.HotSection, nameof(interchanger));
        if ((cold.IsHeated ? cold : hot.IsHeated ? hot : null) is { } heated) throw new ArgumentException($"Section '{heated.Name}' is heated by the fire and cannot be a side of the interchanger.", nameof(interchanger));
        if (Array.IndexOf(_sections, cold) > Array.IndexOf(_sections, hot)) throw new ArgumentException($"The cold side '{cold.Name}' must come before the hot side '{hot.Name}'.", nameof(interchanger));
        return Changed(pass => pass.Interchanger = interchanger);
    }

    internal object ToDump() => ToString();

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    private TubeSection Section(string name, string parameter) =>
        Array.Find(_sections, section => section.Name == name) ?? throw new ArgumentException($"Pass '{Name}' has no section '{name}'; it has {string.Join(", ", _sections.Select(section => $"'{section.Name}'"))}.", parameter);

    private Pass Changed(Action<Pass> change)
    {
        var copy = (Pass)MemberwiseClone();
        change(copy);
        copy.Lay();
        return copy;
    }
}
