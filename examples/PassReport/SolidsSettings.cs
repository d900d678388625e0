using TwoPhase.Limits;
using UnitsNet;

namespace PassReport;

/// <summary>One dissolved thing; both concentrations in mg/L of cold water.</summary>
internal sealed class SolidsSettings
{
    public string Name { get; set; } = "";

    public double Feed { get; set; }

    public double Outlet { get; set; }

    public SolidsLimit ToLimit() => new(Name, MassConcentration.FromMilligramsPerLiter(Feed), MassConcentration.FromMilligramsPerLiter(Outlet));
}
