namespace TwoPhase.Dynamics;

/// <summary>
/// Mean specific volume of a cell in which a boundary stands, as a function of its mean enthalpy at given pressure: the mean over two branches
/// (liquid and wet, or wet and vapour), each linear.
/// </summary>
/// <remarks>
/// <para>v̄(h̄) = v0 + b (h̄ − hb) + Δb Ē(h̄ − hb), Ē the mean excess over the boundary.</para>
/// <para>With the cell mean instead, the outflow is off by some tenths of a per cent while a boundary walks through a cell.</para>
/// </remarks>
internal struct VolumeClosure
{
    // Newton's method doubles the digits with each step: behind a change as small as this, round-off is all that is left to find.
    private const double Settled = 1e-9;

    /// <summary>v0 [m³/kg] at the boundary's enthalpy hb [J/kg], slope b below it [m³/J] and by how much the slope changes there.</summary>
    public double Volume0, Boundary, Expansion0, Step;

    /// <summary>The profile about the boundary.</summary>
    public BentProfile Profile;

    public readonly double Volume(double enthalpy, out double slope)
    {
        double above = Profile.Over(enthalpy - Boundary, out double share);
        slope = Expansion0 + (Step * share);
        return Volume0 + (Expansion0 * (enthalpy - Boundary)) + (Step * above);
    }

    /// <summary>Outflow [kg/s] that leaves the cell exactly full after a step.</summary>
    /// <param name="volume">Volume of the cell [m³].</param>
    /// <param name="step">Length of the step [s].</param>
    /// <param name="mass">Mass with the inflow of the step, before the outflow [kg].</param>
    /// <param name="content">Enthalpy likewise [J].</param>
    /// <param name="outEnthalpy">Enthalpy that the outflow carries [J/kg].</param>
    /// <param name="guess">Outflow of the step before [kg/s].</param>
    public readonly double Outflow(double volume, double step, double mass, double content, double outEnthalpy, double guess)
    {
        double outflow = guess;
        for (int i = 0; i < 20; i++)
        {
            double left = mass - (step * outflow), enthalpy = (content - (step * outflow * outEnthalpy)) / left;
            double mean = Volume(enthalpy, out double slope);
            double excess = (left * mean) - volume;
            double derivative = -step * (mean + (slope * (outEnthalpy - enthalpy)));
            double change = excess / derivative;
            outflow -= change;
            if (Math.Abs(change) <= Settled * Math.Abs(outflow)) break;
        }

        return outflow;
    }
}
