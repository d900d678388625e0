using System.Globalization;
using static TwoPhase.Units.Spelling;

namespace TwoPhase.Units;

/// <summary>
/// Reads a unit as plants write it, with its basis: <c>psig</c>, <c>kPa(a)</c>, <c>inH2O at 60 degF</c>,
/// <c>m3/d of cold water at 15 degC</c>, <c>% of a 75 kPa span</c>, <c>% of 0 to 16 MPa(g)</c>.
/// </summary>
internal static class UnitText
{
    private static readonly string[] BaseWords = [" at ", " over ", "@"];

    /// <summary>Factor and offset to SI.</summary>
    /// <param name="text">The unit.</param>
    /// <param name="kind">What it must be a unit of.</param>
    /// <param name="basis">What the site agreed; the text wins over it.</param>
    /// <exception cref="FormatException">The text is no unit of this kind, has two meanings, or its basis is nowhere given.</exception>
    public static LinearMap Map(string text, UnitKind kind, UnitBasis basis)
    {
        string trimmed = Spelling.Plain(text);
        if (trimmed.Length == 0) throw new FormatException("has no unit");
        if (PerCentSpan(trimmed) is { } span) return OfSpan(span, kind, basis);

        (string unit, string[] statements) = SplitBase(trimmed);
        unit = WithoutSpaces(unit);
        if (UnitTable.Ambiguity(unit) is { } meanings) throw new FormatException($"unit '{text}' has two meanings: {meanings}");
        if (kind == UnitKind.StandardGasFlow && statements.Length > 0) return GasAt(unit, text, statements);

        UnitBasis agreed = basis;
        foreach (string statement in statements) agreed = WithBase(statement, text, agreed);
        if (statements.Length > 0 && UnitTable.Find(unit, kind) is not null && UnitTable.WaterColumnMetres(unit) is null) throw new FormatException($"unit '{text}' needs no base, and states one");
        return kind switch
        {
            UnitKind.AbsolutePressure => AbsolutePressure(unit, text, agreed),
            UnitKind.PressureDifference => Difference(unit, text, agreed),
            UnitKind.MassFlow => Flow(unit, text, agreed),
            _ => Size(unit, text, kind),
        };
    }

    private static LinearMap Size(string unit, string text, UnitKind kind) =>
        UnitTable.Find(unit, kind) ?? UnitsNetFallback.Find(unit, kind) ?? throw Unknown(text, kind);

    private static LinearMap AbsolutePressure(string unit, string text, UnitBasis basis)
    {
        if (PressureSize(unit, basis) is not null) throw new FormatException($"unit '{text}' does not say whether it is gauge or absolute: write {unit}(g) or {unit}(a)");
        (string stem, char suffix) = Suffix(unit);
        LinearMap size = PressureSize(stem, basis) ?? UnitsNetFallback.Find(stem, UnitKind.PressureDifference) ?? throw Unknown(text, UnitKind.AbsolutePressure);
        return suffix switch
        {
            'a' => size,
            'g' => size.Above(basis.Atmosphere ?? throw new FormatException($"unit '{text}' is gauge and the site's atmospheric pressure is not given: agree it for the site, or write '{unit} at 93 kPa(a)'")),
            'd' => throw new FormatException($"unit '{text}' is a pressure difference where a pressure with a basis is wanted: write {stem}(g) or {stem}(a)"),
            _ => throw new FormatException($"unit '{text}' does not say whether it is gauge or absolute: write {stem}(g) or {stem}(a)"),
        };
    }

    private static LinearMap Difference(string unit, string text, UnitBasis basis)
    {
        if (PressureSize(unit, basis) is { } size) return size;
        (string stem, char suffix) = Suffix(unit);
        if (PressureSize(stem, basis) is not { } difference) return UnitsNetFallback.Find(unit, UnitKind.PressureDifference) ?? throw Unknown(text, UnitKind.PressureDifference);
        return suffix == 'd' ? difference : throw new FormatException($"unit '{text}' has a basis, but a differential has none: is the tag a static pressure?");
    }

    private static LinearMap Flow(string unit, string text, UnitBasis basis)
    {
        if (UnitTable.Find(unit, UnitKind.MassFlow) is { } mass) return mass;
        if (UnitTable.Find(unit, UnitKind.VolumeFlow) is { } volume)
        {
            return volume.Times(basis.WaterDensity ?? throw new FormatException($"unit '{text}' is a volume flow and its base density is not given: write '{unit} at 998.2 kg/m3' or '{unit} at 15 degC', or agree it for the site"));
        }

        if (UnitTable.Find(unit, UnitKind.StandardGasFlow) is not null) throw new FormatException($"unit '{text}' counts a gas, and water is measured here");
        return UnitsNetFallback.Find(unit, UnitKind.MassFlow) ?? throw Unknown(text, UnitKind.MassFlow);
    }

    private static LinearMap? PressureSize(string unit, UnitBasis basis) =>
        UnitTable.WaterColumnMetres(unit) is { } metres ? new LinearMap(metres * UnitTable.PascalsPerMetreOfWater(basis.ColumnTemperature)) : UnitTable.Find(unit, UnitKind.PressureDifference);

    private static LinearMap OfSpan(string span, UnitKind kind, UnitBasis basis)
    {
        (double low, double high, string unit) = Range(span);
        LinearMap map = Map(unit, kind, basis);
        return high > low ? map.PerCentOf(low, high) : throw new FormatException($"span '{span}' ends below its start");
    }

    /// <summary>What follows "% of", without its decoration; null when the text is no per cent of a span.</summary>
    private static string? PerCentSpan(string text)
    {
        string rest = text[0] == '%' ? text[1..].TrimStart() : "";
        if (!Starts(rest, "of ")) return null;
        rest = rest[3..].Trim();
        if (Starts(rest, "a ")) rest = rest[2..].Trim();
        return Ends(rest, " span") ? rest[..^5].TrimEnd() : rest;
    }

    private static (double Low, double High, string Unit) Range(string span)
    {
        (double first, string rest) = QuantityText.SplitNumber(span);
        string separator = Starts(rest, "to ") ? "to " : rest.StartsWith("..", StringComparison.Ordinal) ? ".." : "";
        if (separator.Length == 0) return (0, first, rest);
        (double second, string unit) = QuantityText.SplitNumber(rest[separator.Length..].TrimStart());
        return (first, second, unit);
    }

    /// <summary>Parts "at 15 degC and 101.325 kPa(a)" or "(60F)" from the unit in front of it.</summary>
    private static (string Unit, string[] Statements) SplitBase(string text)
    {
        foreach (string word in BaseWords)
        {
            int at = text.IndexOf(word, StringComparison.OrdinalIgnoreCase);
            if (at > 0) return (WithoutFiller(text[..at].TrimEnd()), Statements(text[(at + word.Length)..]));
        }

        int open = text.LastIndexOf('(');
        bool inBrackets = open > 0 && text[^1] == ')' && text.Length > open + 2 && (char.IsDigit(text[open + 1]) || text[open + 1] == '-');
        return inBrackets ? (WithoutFiller(text[..open].TrimEnd()), [text[(open + 1)..^1]]) : (WithoutFiller(text), []);
    }

    private static string[] Statements(string text)
    {
        int and = text.IndexOf(" and ", StringComparison.OrdinalIgnoreCase);
        return and < 0 ? [text] : [text[..and], text[(and + 5)..]];
    }

    private static string WithoutFiller(string unit)
    {
        foreach (string filler in new[] { " of cold water", " of water" })
        {
            if (Ends(unit, filler)) return unit[..^filler.Length];
        }

        return unit;
    }

    /// <summary>Gas counted at a base state of its own, brought to 15 °C and 101.325 kPa as an ideal gas.</summary>
    private static LinearMap GasAt(string unit, string text, string[] statements)
    {
        int slash = Math.Max(unit.LastIndexOf('/'), 0);
        string plain = unit[..slash] switch { "Sm3" or "Nm3" or "stdm3" => "m3", "scf" => "ft3", string other => other };
        if (UnitTable.Find(plain + unit[slash..], UnitKind.VolumeFlow) is not { } volume || statements.Length != 2) throw new FormatException($"unit '{text}': a gas volume is written like 'Sm3/h' or 'm3/h at 15 degC and 101.325 kPa(a)'");
        double kelvins = QuantityText.Parse(statements[0], UnitKind.Temperature, UnitBasis.None);
        double pascals = QuantityText.Parse(statements[1], UnitKind.AbsolutePressure, UnitBasis.None);
        return volume.Times(pascals / UnitTable.StandardPascals * (UnitTable.StandardKelvins / kelvins));
    }

    private static UnitBasis WithBase(string statement, string text, UnitBasis basis)
    {
        (double value, string unit) = QuantityText.SplitNumber(statement.Trim());
        string plain = WithoutSpaces(unit);
        try
        {
            if (UnitTable.Find(plain, UnitKind.Density) is { } density) return basis.WithBaseDensity(UnitsNet.Density.FromKilogramsPerCubicMeter(density.Map(value)));
            if (UnitTable.Find(plain, UnitKind.Temperature) is { } temperature)
            {
                var kelvins = UnitsNet.Temperature.FromKelvins(temperature.Map(value));
                return basis.WithBaseTemperature(kelvins).WithWaterColumnTemperature(kelvins);
            }

            (string stem, char suffix) = Suffix(plain);
            LinearMap? atmosphere = UnitTable.Find(plain, UnitKind.PressureDifference) ?? (suffix == 'a' ? UnitTable.Find(stem, UnitKind.PressureDifference) : null);
            if (atmosphere is { } pressure) return basis.WithAtmosphericPressure(UnitsNet.Pressure.FromPascals(pressure.Map(value)));
        }
        catch (ArgumentException error)
        {
            throw new FormatException($"unit '{text}': {error.Message}", error);
        }

        throw new FormatException($"unit '{text}': '{statement.Trim()}' is neither a base density, a base temperature nor an atmospheric pressure");
    }

    /// <summary>Splits kPag, kPa(g), kPa(abs), psid into the unit and g, a, d; '\0' when there is none.</summary>
    private static (string Stem, char Suffix) Suffix(string unit)
    {
        int open = unit.LastIndexOf('(');
        if (open > 0 && unit[^1] == ')')
        {
            string word = unit[(open + 1)..^1];
            return (unit[..open], IsAny(word, "g", "ga", "gauge") ? 'g' : IsAny(word, "a", "abs", "absolute") ? 'a' : IsAny(word, "d", "diff") ? 'd' : '\0');
        }

        foreach ((string ending, char suffix) in new[] { ("gauge", 'g'), ("absolute", 'a'), ("abs", 'a'), ("g", 'g'), ("a", 'a'), ("d", 'd') })
        {
            if (unit.Length > ending.Length && Ends(unit, ending)) return (unit[..^ending.Length], suffix);
        }

        return (unit, '\0');
    }

    private static bool IsAny(string word, params string[] words) => Array.Exists(words, candidate => Same(word, candidate));

    private static FormatException Unknown(string text, UnitKind kind) =>
        new(string.Format(CultureInfo.InvariantCulture, "unit '{0}' is no unit of {1} that is known here", text, Name(kind)));

    private static string Name(UnitKind kind) => kind switch
    {
        UnitKind.AbsolutePressure => "pressure with a basis",
        UnitKind.PressureDifference => "differential pressure",
        UnitKind.MassFlow or UnitKind.VolumeFlow => "water flow",
        UnitKind.StandardGasFlow or UnitKind.StandardGasVolume => "standard gas volume",
        UnitKind.Ratio => "a ratio (%, fraction)",
        _ => string.Concat(kind.ToString().Select((c, i) => i > 0 && char.IsUpper(c) ? " " + char.ToLowerInvariant(c) : char.ToLowerInvariant(c).ToString())),
    };
}
