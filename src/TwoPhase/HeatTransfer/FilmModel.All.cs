namespace TwoPhase.HeatTransfer;

public abstract partial class FilmModel
{
    /// <summary>Every model of this class that needs no parameters, for reports that show the spread; see <see cref="IsForDryWall"/>.</summary>
    public static IReadOnlyList<FilmModel> All => Catalogue.Models;

    /// <summary>
    /// The default where a pass names none: <see cref="GungorWinterton1986"/>, whose coefficients two sources bear out, whose data
    /// reach from 0.08 to 20.3 MPa, and which knows horizontal tubes.
    /// </summary>
    public static FilmModel Default => GungorWinterton1986;

    // A class of its own: the statics of a partial class over several files are initialised in no stated order.
    private static class Catalogue
    {
        public static readonly IReadOnlyList<FilmModel> Models = [Chen, GungorWinterton1986, GungorWinterton1987, SteinerTaborek, DougallRohsenow];
    }
}
