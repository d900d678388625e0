using TwoPhase.Friction;
using TwoPhase.HeatTransfer;
using TwoPhase.Slip;
using TwoPhase.Units;

namespace TwoPhase.Passes;

/// <summary>
/// The correlations that the steady, the transient and the live solver use for a pass: one object for all three, so that they
/// cannot silently disagree.
/// </summary>
/// <remarks>The liquid held at a pass outlet varies sixfold between published slip models; see <see cref="VoidFractionModel.All"/>.</remarks>
public sealed class PassModels
{
    /// <summary>A choice of correlations; what is left out is the default.</summary>
    /// <param name="slip">Void fraction.</param>
    /// <param name="friction">Friction.</param>
    /// <param name="film">Inside film of a wetted wall.</param>
    /// <param name="criticalQuality">Quality at which the wall dries out.</param>
    public PassModels(VoidFractionModel? slip = null, FrictionModel? friction = null, FilmModel? film = null, CriticalQualityModel? criticalQuality = null)
    {
        Slip = slip ?? VoidFractionModel.Steiner;
        Friction = friction ?? FrictionModel.MullerSteinhagenHeck;
        Film = film ?? FilmModel.Default;
        CriticalQuality = criticalQuality ?? CriticalQualityModel.Default;
    }

    /// <summary>
    /// Rouhani and Axelsson's void fraction in Steiner's form for horizontal tubes; Müller-Steinhagen and Heck's friction;
    /// <see cref="FilmModel.Default"/>; <see cref="CriticalQualityModel.Default"/>.
    /// </summary>
    public static PassModels Default { get; } = new();

    /// <summary>Void fraction.</summary>
    public VoidFractionModel Slip { get; }

    /// <summary>Friction.</summary>
    public FrictionModel Friction { get; }

    /// <summary>Inside film of a wetted wall.</summary>
    public FilmModel Film { get; }

    /// <summary>Quality at which the wall dries out: an indicator, never an alarm.</summary>
    public CriticalQualityModel CriticalQuality { get; }

    /// <summary>The same with another slip model.</summary>
    /// <param name="slip">Void fraction.</param>
    public PassModels WithSlip(VoidFractionModel slip) => new(Require.NotNull(slip, nameof(slip)), Friction, Film, CriticalQuality);

    /// <summary>The same with another friction model.</summary>
    /// <param name="friction">Friction.</param>
    public PassModels WithFriction(FrictionModel friction) => new(Slip, Require.NotNull(friction, nameof(friction)), Film, CriticalQuality);

    /// <summary>The same with another film model.</summary>
    /// <param name="film">Inside film of a wetted wall.</param>
    public PassModels WithFilm(FilmModel film) => new(Slip, Friction, Require.NotNull(film, nameof(film)), CriticalQuality);

    /// <summary>The same with another model of the critical quality.</summary>
    /// <param name="criticalQuality">Quality at which the wall dries out.</param>
    public PassModels WithCriticalQuality(CriticalQualityModel criticalQuality) => new(Slip, Friction, Film, Require.NotNull(criticalQuality, nameof(criticalQuality)));

    internal object ToDump() => ToString();

    /// <summary>The names of the models.</summary>
    public override string ToString() => $"slip {Slip.Name}, friction {Friction.Name}, film {Film.Name}, critical quality {CriticalQuality.Name}";
}
