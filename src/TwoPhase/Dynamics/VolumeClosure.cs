namespace TwoPhase.Dynamics;

/// <summary>
/// Mean specific volume of a cell as a function of its mean enthalpy at given pressure: linear on one branch (liquid, wet or vapour), and
/// where a boundary stands in the cell the mean over two branches.
/// </summary>
/// <remarks>
/// <para>v̄(h̄) = v0 + b (h̄ − h0) + Δb Ē(h̄ − hb), Ē the mean excess over the boundary.</para>
/// <para>With the cell mean instead, the outflow is off by some tenths of a per cent while a boundary walks through a cell.</para>
/// </remarks>
internal struct VolumeClosure
{
    /// <summary>The branch, or that below the boundary: v0 [m³/kg] at h0 [J/kg], slope [m³/J].</summary>
    public double Volume0, Enthalpy0, Expansion0;

    /// <summary>Enthalpy of the boundary [J/kg] and by how much the slope changes there; zero for none.</summary>
    public double Boundary, Step;

    /// <summary>The profile about the boundary.</summary>
    public BentProfile Profile;

    public readonly bool IsLinear => Step == 0;

    public readonly double Volume(double enthalpy, out double slope)
    {
        slope = Expansion0;
        double volume = Volume0 + (Expansion0 * (enthalpy - Enthalpy0));
        if (IsLinear) return volume;
        volume += Step * Profile.Over(enthalpy - Boundary, out double share);
        slope += Step * share;
        return volume;
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
        // V = a M + b H is linear in the outflow on one branch.
        if (IsLinear)
        {
            double a = Volume0 - (Expansion0 * Enthalpy0);
            return ((a * mass) + (Expansion0 * content) - volume) / (step * (a + (Expansion0 * outEnthalpy)));
        }

        double outflow = guess;
        for (int i = 0; i < 20; i++)
        {
            double left = mass - (step * outflow), enthalpy = (content - (step * outflow * outEnthalpy)) / left;
            double mean = Volume(enthalpy, out double slope);
            double excess = (left * mean) - volume;
            double derivative = -step * (mean + (slope * (outEnthalpy - enthalpy)));
            double change = excess / derivative;
            outflow -= change;
            if (Math.Abs(change) <= 1e-14 * Math.Abs(outflow)) break;
        }

        return outflow;
    }
}
