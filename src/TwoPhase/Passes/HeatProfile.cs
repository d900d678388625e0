using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>How the heat absorbed by a pass is spread over its sections, and along each of them.</summary>
/// <remarks>The distribution moves the boiling onset, and with it the water held in the pass, more than any slip model does.</remarks>
public sealed class HeatProfile
{
    // Shares typed in whole per cent or three decimals must pass; a forgotten section must not.
    private const double SumTolerance = 1e-6;

    private readonly SectionHeat[] _sections;

    /// <summary>A profile from the shares of its sections; sections not named take no heat.</summary>
    /// <param name="sections">The shares, which sum to 1.</param>
    /// <exception cref="ArgumentException">The shares do not sum to 1, or a section is named twice.</exception>
    public HeatProfile(params SectionHeat[] sections)
    {
        _sections = (SectionHeat[])Require.NotNull(sections, nameof(sections)).Clone();
        double sum = _sections.Sum(section => section.RawShare);
        if (!(Math.Abs(sum - 1) <= SumTolerance))
        {
            string shares = string.Join(", ", _sections.Select(section => $"'{section.Section}' {Scale.None.Text(section.RawShare)}"));
            throw new ArgumentException($"Heat shares of the sections sum to {Scale.None.Text(sum)}; they must sum to 1: {shares}.", nameof(sections));
        }

        foreach (SectionHeat section in _sections)
        {
            if (_sections.Count(other => other.Section == section.Section) > 1) throw new ArgumentException($"Section '{section.Section}' has two heat shares.", nameof(sections));
        }
    }

    /// <summary>The sections that take heat.</summary>
    public IReadOnlyList<SectionHeat> Sections => _sections;

    /// <summary>Uniform flux over the outside surface (fins included) of every heated section: the assumption when nothing is known.</summary>
    /// <param name="sections">The sections of the pass.</param>
    /// <exception cref="ArgumentException">No section is heated.</exception>
    public static HeatProfile Even(IEnumerable<TubeSection> sections)
    {
        TubeSection[] heated = [.. Require.NotNull(sections, nameof(sections)).Where(section => section.IsHeated)];
        double surface = heated.Sum(section => section.RawOutsideSurface);
        return surface > 0
            ? new([.. heated.Select(section => new SectionHeat(section.Name, Ratio.FromDecimalFractions(section.RawOutsideSurface / surface)))])
            : throw new ArgumentException("No section of the pass is heated.", nameof(sections));
    }

    /// <summary>The entry of a section; null when it takes no heat.</summary>
    /// <param name="section">Name of the section.</param>
    public SectionHeat? Find(string section) => Array.Find(_sections, entry => entry.Section == section);

    /// <summary>The same profile with another share for the sections of the convection bank, the rest for the others; shapes are kept.</summary>
    /// <param name="convectiveSections">Names of the sections of the convection bank.</param>
    /// <param name="share">Their share together.</param>
    /// <exception cref="ArgumentException">The profile gives either group no heat, so there is nothing to scale.</exception>
    public HeatProfile WithConvectiveShare(IReadOnlyCollection<string> convectiveSections, Ratio share)
    {
        double wanted = Require.Within(share.Si(), 0, 1, "Convective share", Scale.None, nameof(share));
        double present = _sections.Where(section => convectiveSections.Contains(section.Section)).Sum(section => section.RawShare);
        if (present is not (> 0 and < 1)) throw new ArgumentException($"The convection bank has a share of {Scale.None.Text(present)}: it cannot be scaled against the radiant sections.", nameof(convectiveSections));
        return new([.. _sections.Select(section => section.WithShare(
            section.RawShare * (convectiveSections.Contains(section.Section) ? wanted / present : (1 - wanted) / (1 - present))))]);
    }
}
