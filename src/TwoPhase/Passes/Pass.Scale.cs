using UnitsNet;

namespace TwoPhase.Passes;

public sealed partial class Pass
{
    /// <summary>The pass with more scale on the water side of every heated section, of the conductivity that its scale has.</summary>
    /// <param name="thickness">Added to what there is.</param>
    /// <exception cref="ArgumentOutOfRangeException">A bore would close, or the thickness is negative beyond what there is.</exception>
    public Pass WithAddedScale(Length thickness)
    {
        double added = Units.SiDoor.Si(thickness);
        return Changed(pass => pass._sections = Array.ConvertAll(_sections, section => section.IsHeated ? section.WithScale(Length.FromMeters(section.RawScale + added), section.ScaleConductivity) : section));
    }
}
