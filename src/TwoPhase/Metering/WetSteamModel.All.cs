namespace TwoPhase.Metering;

public abstract partial class WetSteamModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread.</summary>
    public static IReadOnlyList<WetSteamModel> All => Catalogue.Models;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<WetSteamModel> Models =
            [Homogeneous, James, Murdock, Chisholm1967, Chisholm, Lin, SmithLeang, DeLeeuw, ReaderHarrisGraham, StevenOrifice];
    }
}
