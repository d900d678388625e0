using System.Globalization;
using TwoPhase.Steam.Backward;

namespace TwoPhase.Tests.Steam.Backward;

/// <summary>Every digit of the verification tables that the releases print for their backward equations.</summary>
public class PublishedBackwardTests
{
    // Half a unit of the last printed digit, and a little for one row: the release prints 3.701940010 for subregion z, where
    // its own coefficients in exact rational arithmetic give 3.7019400094668.
    private const double Tolerance = 0.55;

    public static TheoryData<string> Rows => [.. ReferenceTable.Load("Steam/Data/if97-backward-published.csv").Rows.Select(row => row.ToString())];

    [Theory]
    [MemberData(nameof(Rows))]
    public void BackwardEquation_PublishedPoint_MatchesEveryPrintedDigit(string line)
    {
        string[] cells = line.Split(',');
        (string function, string first, string printed) = (cells[2], cells[3], cells[9]);
        double[] inputs = [.. Inputs(cells)];

        double actual = Evaluate(function, first, inputs) / Si(cells[10]);

        Approx.Absolute(Number(printed), actual, Tolerance * UnitOfTheLastDigit(printed), line);
    }

    private static double Evaluate(string function, string name, double[] x) => function switch
    {
        "T1_ph" => Backward1.TemperatureFromEnthalpy(x[0], x[1]),
        "T1_ps" => Backward1.TemperatureFromEntropy(x[0], x[1]),
        "p1_hs" => Backward1.PressureFromEnthalpyEntropy(x[0], x[1]),
        "T2_ph" => Backward2.TemperatureFromEnthalpy(x[0], x[1]),
        "T2_ps" => Backward2.TemperatureFromEntropy(x[0], x[1]),
        "p2_hs" => Backward2.PressureFromEnthalpyEntropy(x[0], x[1]),
        "h2bc_p" => Backward2.EnthalpyOfBorderBc(x[0]),
        "p2bc_h" => Backward2.PressureOfBorderBc(x[0]),
        "h2ab_s" => Backward2.EnthalpyOfBorderAb(x[0]),
        "T3_ph" => Backward3.TemperatureFromEnthalpy(x[0], x[1]),
        "v3_ph" => Backward3.VolumeFromEnthalpy(x[0], x[1]),
        "T3_ps" => Backward3.TemperatureFromEntropy(x[0], x[1]),
        "v3_ps" => Backward3.VolumeFromEntropy(x[0], x[1]),
        "p3_hs" => Backward3.PressureFromEnthalpyEntropy(x[0], x[1]),
        "h3ab_p" => Backward3.EnthalpyOfBorderAb(x[0]),
        "p3sat_h" => Boundaries.SaturationPressureFromEnthalpy(x[0]),
        "p3sat_s" => Boundaries.SaturationPressureFromEntropy(x[0]),
        "h1sat_s" or "h3asat_s" => Boundaries.LiquidEnthalpy(x[0]),
        "h2absat_s" or "h2c3bsat_s" => Boundaries.VapourEnthalpy(x[0]),
        "hB13_s" => Boundaries.EnthalpyOfBorder13(x[0]),
        "TB23_hs" => Boundaries.TemperatureOfBorder23(x[0], x[1]),
        "Tsat_hs" => Boundaries.SaturationTemperatureFromEnthalpyEntropy(x[0], x[1]),
        "T3bound_p" => Border(name, x[0] / 1e6),
        "v3_pT" => Volume3.At(x[0], x[1]),
        _ => throw new ArgumentException(function, nameof(function)),
    };

    private static double Border(string name, double megapascals) => name switch
    {
        "ab" => Volume3.Ab(megapascals),
        "cd" => Volume3.Cd(megapascals),
        "ef" => Volume3.Ef(megapascals),
        "gh" => Volume3.Gh(megapascals),
        "ij" => Volume3.Ij(megapascals),
        "jk" => Volume3.Jk(megapascals),
        "mn" => Volume3.Mn(megapascals),
        "op" => Volume3.Op(megapascals),
        "qu" => Volume3.Qu(megapascals),
        "rx" => Volume3.Rx(megapascals),
        "uv" => Volume3.Uv(megapascals),
        "wx" => Volume3.Wx(megapascals),
        _ => throw new ArgumentException(name, nameof(name)),
    };

    // A cell without a unit is a name (subregion or border), not a number.
    private static IEnumerable<double> Inputs(string[] cells)
    {
        for (int k = 3; k < 9; k += 2)
        {
            if (cells[k + 1].Length > 0 && cells[k + 1] != "-") yield return Number(cells[k]) * Si(cells[k + 1]);
        }
    }

    private static double Si(string unit) => unit switch
    {
        "MPa" => 1e6,
        "kJ/kg" or "kJ/(kg K)" => 1e3,
        "K" or "m3/kg" => 1,
        _ => throw new ArgumentException(unit, nameof(unit)),
    };

    private static double Number(string text) => double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);

    private static double UnitOfTheLastDigit(string printed)
    {
        string[] parts = printed.Split('E');
        int decimals = parts[0].Length - 1 - parts[0].IndexOf('.', StringComparison.Ordinal);
        int exponent = parts.Length > 1 ? int.Parse(parts[1], CultureInfo.InvariantCulture) : 0;
        return Math.Pow(10, exponent - decimals);
    }
}
