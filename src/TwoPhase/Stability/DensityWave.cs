using System.Globalization;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Stability;

/// <summary>How far a pass is from swinging by itself in density waves, and the throttling at its inlet that would hold it.</summary>
/// <remarks>
/// <para>Stable where Npch − Nsub ≤ 2 (ki + F + ke)/(1 + (F + 2 ke)/2).</para>
/// <para>Losses as Δp = k ρ u²: ki of everything before the first heat, with ρ and u of the feed; ke of everything behind the last heat, with ρ and u of the
/// homogeneous outlet; F = f L/(2 D) of the heated tubes, here their friction and bends over G² v averaged along them, v homogeneous volume, G mass flux where
/// the heat begins. See <see cref="StabilityNumbers"/> for Npch and Nsub.</para>
/// <para>Range: Nsub above π, one pass among several between common headers, uniform heat, no gravity; a control valve on each pass counts as inlet loss only
/// as far as it stands still.</para>
/// <para>Accuracy: conservative. The linearised equations of the homogeneous channel, solved in the tests of this library for Nsub 4 to 9, put the threshold 11 to 25 % higher
/// with inlet throttling and half as high again in a bare tube. Thermal capacity of the wall, which usually steadies, and slip are left out.</para>
/// <para>Source: Ishii, PhD thesis, Georgia Institute of Technology (1971); Saha, Ishii and Zuber, J. Heat Transfer 98(4), 616-622 (1976); coefficients from memory, borne out by that comparison.</para>
/// <para>Advisory: it ranks passes and shows what a restrictor is worth; it does not replace watching the passes swing against each other.</para>
/// </remarks>
public sealed class DensityWave
{
    // Nsub where the simplified criterion ends; period over transit time.
    private const double LeastSubcooling = Math.PI, LeastTransits = 1.5, MostTransits = 3;

    private readonly double _given, _passDrop, _transit, _needed;

    private DensityWave(PassProfile profile, double given)
    {
        PassNode inlet = profile.Nodes[0];
        var losses = new LossSplit(profile);
        _given = given;
        _passDrop = inlet.Pressure - profile.Nodes[^1].Pressure;
        _transit = losses.Transit;
        Reason = "the outlet is not wet steam";
        Status = StabilityStatus.NotApplicable;
        if (StabilityNumbers.Of(profile) is not { } numbers) return;

        double perCoefficient = inlet.Flow.MassFlux * inlet.Flow.MassFlux * inlet.HomogeneousVolume;
        Numbers = numbers;
        InletCoefficient = losses.Inlet + (given / perCoefficient);
        FrictionCoefficient = losses.Friction;
        ExitCoefficient = losses.Exit;
        double damping = 1 + ((FrictionCoefficient + (2 * ExitCoefficient)) / 2);
        Threshold = 2 * (InletCoefficient + FrictionCoefficient + ExitCoefficient) / damping;
        _needed = Math.Max(0, (numbers.Excess * damping / 2) - FrictionCoefficient - ExitCoefficient - losses.Inlet) * perCoefficient;
        if (numbers.Subcooling <= LeastSubcooling) Reason = string.Format(CultureInfo.InvariantCulture, "subcooling number {0:F2} is not above π, where the criterion ends; so little subcooling usually steadies", numbers.Subcooling);
        else (Status, Reason) = (numbers.Excess <= Threshold ? StabilityStatus.Stable : StabilityStatus.Unstable, "");
    }

    /// <summary>The density-wave threshold of a pass.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <param name="inletRestriction">Pressure lost at this flow between the common feed header and the inlet of the pass, in orifice and valve; none where not given.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="inletRestriction"/> is negative.</exception>
    public static DensityWave Of(PassProfile profile, Pressure? inletRestriction = null) =>
        new(Require.NotNull(profile, nameof(profile)), inletRestriction is { } given ? Require.NotNegative(given.Si(), "Inlet restriction", Scale.Kilopascals, nameof(inletRestriction)) : 0);

    /// <summary>Which side of the threshold the pass stands on.</summary>
    public StabilityStatus Status { get; }

    /// <summary>Why the criterion does not apply; empty where it does.</summary>
    public string Reason { get; }

    /// <summary>Phase-change and subcooling number; null when the outlet is not wet steam.</summary>
    public StabilityNumbers? Numbers { get; }

    /// <summary>ki, the given restriction included [-].</summary>
    public double InletCoefficient { get; }

    /// <summary>F [-].</summary>
    public double FrictionCoefficient { get; }

    /// <summary>ke [-].</summary>
    public double ExitCoefficient { get; }

    /// <summary>Greatest stable Npch − Nsub [-]; 0 when the outlet is not wet steam.</summary>
    public double Threshold { get; }

    /// <summary>Pressure that orifice and valve at the inlet must take at this flow for the threshold; zero where none is needed, null where the criterion does not apply.</summary>
    public Pressure? RestrictionNeeded => Status == StabilityStatus.NotApplicable ? null : Pressure.FromPascals(_needed);

    /// <summary>The same as a share of all the pressure lost between the headers: the authority that the inlet needs; null where the criterion does not apply.</summary>
    public Ratio? AuthorityNeeded => Status == StabilityStatus.NotApplicable ? null : Ratio.FromDecimalFractions(_needed / (_needed + _passDrop));

    /// <summary>The restriction that was given.</summary>
    public Pressure InletRestriction => Pressure.FromPascals(_given);

    /// <summary>Time a particle takes from inlet to outlet with both phases at one velocity.</summary>
    public Duration TransitTime => Duration.FromSeconds(_transit);

    /// <summary>Shortest likely period of a swing: 1.5 transit times.</summary>
    /// <remarks>
    /// The trade counts 1.5 to 2 transit times (from memory, Bouré, Bergles and Tong, Nucl. Eng. Des. 25, 165-192 (1973)); the linearised homogeneous channel swings with 1.9 to 2.8 of
    /// them at its threshold. Higher modes, at high subcooling, are faster: Yadigaroglu and Bergles, J. Heat Transfer 94(2), 189-195 (1972).
    /// </remarks>
    public Duration ShortestPeriod => Duration.FromSeconds(LeastTransits * _transit);

    /// <summary>Longest likely period of a swing: 3 transit times; see <see cref="ShortestPeriod"/>.</summary>
    public Duration LongestPeriod => Duration.FromSeconds(MostTransits * _transit);

    internal object ToDump() => ToString();

    /// <summary>The finding in a line, invariant culture.</summary>
    public override string ToString() => Status == StabilityStatus.NotApplicable ? $"not applicable: {Reason}" : string.Format(
        CultureInfo.InvariantCulture, "{0}: {1:F2} against a threshold of {2:F2}; {3:F0} kPa at the inlet would hold it; period {4:F0} to {5:F0} s",
        Status, Numbers!.Value.Excess, Threshold, _needed * 1e-3, LeastTransits * _transit, MostTransits * _transit);
}
