using TwoPhase.Friction;
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
    /// <summary>A choice of correlations.</summary>
    /// <param name="slip">Void fraction; null for the default.</param>
    /// <param name="friction">Friction; null for the default.</param>
    public PassModels(VoidFractionModel? slip = null, FrictionModel? friction = null)
    {
        Slip = slip ?? DefaultSlip;
        Friction = friction ?? DefaultFriction;
    }

    /// <summary>Rouhani and Axelsson's void fraction in Steiner's form for horizontal tubes; Müller-Steinhagen and Heck's friction.</summary>
    public static PassModels Default { get; } = new();

    /// <summary>Void fraction.</summary>
    public VoidFractionModel Slip { get; }

    /// <summary>Friction.</summary>
    public FrictionModel Friction { get; }

    private static VoidFractionModel DefaultSlip => VoidFractionModel.Steiner;

    private static FrictionModel DefaultFriction => FrictionModel.MullerSteinhagenHeck;

    /// <summary>The same with another slip model.</summary>
    /// <param name="slip">Void fraction.</param>
    public PassModels WithSlip(VoidFractionModel slip) => new(Require.NotNull(slip, nameof(slip)), Friction);

    /// <summary>The same with another friction model.</summary>
    /// <param name="friction">Friction.</param>
    public PassModels WithFriction(FrictionModel friction) => new(Slip, Require.NotNull(friction, nameof(friction)));

    /// <summary>The names of the models.</summary>
    public override string ToString() => $"slip {Slip.Name}, friction {Friction.Name}";
}
