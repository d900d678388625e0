namespace TwoPhase.HeatTransfer;

public abstract partial class OnsetModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread.</summary>
    public static IReadOnlyList<OnsetModel> All => Catalogue.Models;

    /// <summary>The default where none is named: <see cref="DavisAnderson"/>, which is derived and has no limit of pressure.</summary>
    public static OnsetModel Default => DavisAnderson;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<OnsetModel> Models = [DavisAnderson, BerglesRohsenow];
    }
}
