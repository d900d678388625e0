using static TwoPhase.Units.SiDoor;

namespace TwoPhase.Units;

/// <summary>The spellings that plants use, each with its kind and its size in SI. Looked up before UnitsNet, which refuses most of them.</summary>
internal static class UnitTable
{
    // US liquid gallon of 231 cubic inches and barrel of 42 gallons; imperial gallon of 1985: exact by definition.
    private const double CubicMetresPerGallon = 231 * MetresPerInch * MetresPerInch * MetresPerInch;
    private const double CubicMetresPerBarrel = 42 * CubicMetresPerGallon;
    private const double CubicMetresPerImperialGallon = 4.54609e-3;
    private const double CubicMetresPerCubicFoot = MetresPerFoot * MetresPerFoot * MetresPerFoot;

    // International Table calorie: exact by definition.
    private const double JoulesPerCalorie = 4.1868;

    // One standard or normal cubic metre or cubic foot, as cubic metres at 15 °C and 101.325 kPa (ISO 13443); ideal gas.
    public const double StandardKelvins = 288.15;
    public const double StandardPascals = 101325;
    private const double NormalGas = StandardKelvins / 273.15;
    private const double CubicFootGas = CubicMetresPerCubicFoot * StandardKelvins / ((60 + 459.67) / 1.8);

    /// <summary>Conventional inch of water: 1000 kg/m³ under standard gravity. Source: NIST SP 811 (2008), B.8.</summary>
    private const double PascalsPerConventionalInch = 1000 * StandardGravity * MetresPerInch;

    private static readonly Dictionary<string, Entry> Direct = Build(
        (UnitKind.PressureDifference, [("Pa", 1), ("hPa", 100), ("kPa", 1e3), ("MPa", 1e6), ("bar", 1e5), ("mbar", 100), ("psi", PascalsPerPsi), ("ksi", 1e3 * PascalsPerPsi), ("lb/in2", PascalsPerPsi), ("lbf/in2", PascalsPerPsi),
            ("kg/cm2", StandardGravity * 1e4), ("kgf/cm2", StandardGravity * 1e4), ("ksc", StandardGravity * 1e4), ("at", StandardGravity * 1e4), ("atm", StandardPascals)]),
        (UnitKind.Temperature, [("K", 1)]),
        (UnitKind.TemperatureDifference, [("K", 1), ("C", 1), ("degC", 1), ("F", 1 / 1.8), ("degF", 1 / 1.8)]),
        (UnitKind.Ratio, [("%", 0.01), ("pct", 0.01), ("percent", 0.01), ("fraction", 1), ("frac", 1), ("1", 1), ("-", 1)]),
        (UnitKind.Length, [("m", 1), ("mm", 1e-3), ("cm", 1e-2), ("km", 1e3), ("um", 1e-6), ("micron", 1e-6), ("in", MetresPerInch), ("inch", MetresPerInch), ("inches", MetresPerInch), ("\"", MetresPerInch), ("ft", MetresPerFoot), ("feet", MetresPerFoot)]),
        (UnitKind.Area, [("m2", 1), ("cm2", 1e-4), ("mm2", 1e-6), ("in2", MetresPerInch * MetresPerInch), ("ft2", MetresPerFoot * MetresPerFoot)]),
        (UnitKind.Volume, [("m3", 1), ("L", 1e-3), ("litre", 1e-3), ("liter", 1e-3), ("gal", CubicMetresPerGallon), ("USgal", CubicMetresPerGallon), ("impgal", CubicMetresPerImperialGallon), ("bbl", CubicMetresPerBarrel), ("bbls", CubicMetresPerBarrel), ("ft3", CubicMetresPerCubicFoot)]),
        (UnitKind.StandardGasVolume, [("Sm3", 1), ("stdm3", 1), ("Nm3", NormalGas), ("kSm3", 1e3), ("kNm3", 1e3 * NormalGas), ("scf", CubicFootGas), ("kscf", 1e3 * CubicFootGas)]),
        (UnitKind.Mass, [("kg", 1), ("g", 1e-3), ("mg", 1e-6), ("t", 1e3), ("tonne", 1e3), ("tonnes", 1e3), ("te", 1e3), ("kt", 1e6), ("lb", KilogramsPerPound), ("lbs", KilogramsPerPound), ("lbm", KilogramsPerPound),
            ("klb", 1e3 * KilogramsPerPound), ("klbs", 1e3 * KilogramsPerPound), ("klbm", 1e3 * KilogramsPerPound), ("shortton", 2000 * KilogramsPerPound), ("longton", 2240 * KilogramsPerPound)]),
        (UnitKind.Duration, [("s", 1), ("sec", 1), ("second", 1), ("seconds", 1), ("ms", 1e-3), ("min", 60), ("minute", 60), ("minutes", 60), ("h", 3600), ("hr", 3600), ("hrs", 3600), ("hour", 3600), ("hours", 3600), ("d", 86400), ("day", 86400), ("days", 86400)]),
        (UnitKind.Angle, [("rad", 1), ("deg", Math.PI / 180)]),
        (UnitKind.Energy, [("J", 1), ("kJ", 1e3), ("MJ", 1e6), ("GJ", 1e9), ("TJ", 1e12), ("kWh", 3.6e6), ("MWh", 3.6e9), ("Btu", JoulesPerBtu), ("kBtu", 1e3 * JoulesPerBtu), ("kcal", 1e3 * JoulesPerCalorie), ("Gcal", 1e9 * JoulesPerCalorie)]),
        (UnitKind.Power, [("W", 1), ("kW", 1e3), ("MW", 1e6), ("MWth", 1e6), ("GW", 1e9)]),
        (UnitKind.MassFlow, [("pph", KilogramsPerPound / 3600), ("kpph", 1e3 * KilogramsPerPound / 3600), ("tph", 1e3 / 3600), ("tpd", 1e3 / 86400)]),
        (UnitKind.VolumeFlow, [("gpm", CubicMetresPerGallon / 60), ("USgpm", CubicMetresPerGallon / 60), ("bpd", CubicMetresPerBarrel / 86400), ("bwpd", CubicMetresPerBarrel / 86400), ("lpm", 1e-3 / 60)]),
        (UnitKind.StandardGasFlow, [("scfh", CubicFootGas / 3600), ("scfm", CubicFootGas / 60), ("scfd", CubicFootGas / 86400), ("kscfd", 1e3 * CubicFootGas / 86400)]),
        (UnitKind.Density, [("kg/m3", 1), ("g/cm3", 1e3), ("kg/L", 1e3), ("g/L", 1), ("mg/L", 1e-3), ("ug/L", 1e-6), ("lb/ft3", KilogramsPerPound / CubicMetresPerCubicFoot)]),
        (UnitKind.SpecificEnergy, [("J/kg", 1), ("kJ/kg", 1e3), ("MJ/kg", 1e6), ("Btu/lb", 2326), ("kcal/kg", 1e3 * JoulesPerCalorie)]),
        (UnitKind.SpecificHeat, [("J/(kg.K)", 1), ("kJ/(kg.K)", 1e3), ("J/kgK", 1), ("kJ/kgK", 1e3), ("Btu/(lb.F)", 4186.8)]),
        (UnitKind.ThermalConductivity, [("W/(m.K)", 1), ("W/mK", 1), ("Btu/(h.ft.F)", JoulesPerBtu * 1.8 / (3600 * MetresPerFoot))]),
        (UnitKind.HeatTransferCoefficient, [("W/(m2.K)", 1), ("kW/(m2.K)", 1e3), ("W/m2K", 1), ("Btu/(h.ft2.F)", JoulesPerBtu * 1.8 / (3600 * MetresPerFoot * MetresPerFoot))]),
        (UnitKind.ThermalConductance, [("W/K", 1), ("kW/K", 1e3), ("MW/K", 1e6), ("Btu/(h.F)", JoulesPerBtu * 1.8 / 3600)]),
        (UnitKind.EnergyPerStandardVolume, [("MJ/Sm3", 1e6), ("kJ/Sm3", 1e3), ("MJ/Nm3", 1e6 / NormalGas), ("Btu/scf", JoulesPerBtu / CubicFootGas)]));

    private static readonly Dictionary<string, double> WaterColumns = new(StringComparer.OrdinalIgnoreCase)
    {
        ["inH2O"] = MetresPerInch,
        ["inWC"] = MetresPerInch,
        ["inWG"] = MetresPerInch,
        ["\"H2O"] = MetresPerInch,
        ["\"WC"] = MetresPerInch,
        ["ftH2O"] = MetresPerFoot,
        ["mmH2O"] = 1e-3,
        ["mmWC"] = 1e-3,
        ["cmH2O"] = 1e-2,
        ["mH2O"] = 1,
    };

    private const string MilliOrMega = "millipascal or megapascal (MPa)";

    // Spellings whose first letter means a thousand to one trade and a million, or a thousandth, to another.
    private static readonly Dictionary<string, string> TwoMeanings = new(StringComparer.Ordinal)
    {
        ["mPa"] = MilliOrMega,
        ["mPag"] = MilliOrMega,
        ["mPaa"] = MilliOrMega,
        ["mW"] = "milliwatt or megawatt (MW)",
        ["ton"] = "short (shortton), long (longton) or metric tons (t)",
        ["tons"] = "short (shortton), long (longton) or metric tons (t)",
    };

    private static readonly string[] ThousandOrMillion = ["lb", "lbs", "lbm", "Btu", "scf", "gal", "bbl", "pph", "scfd", "scfh", "BtuH"];

    /// <summary>The size of a unit, whatever its basis; null when the table does not know the text as this kind.</summary>
    /// <param name="text">The unit's spelling, without spaces and with plain digits.</param>
    /// <param name="kind">The kind that is wanted.</param>
    public static LinearMap? Find(string text, UnitKind kind)
    {
        if (kind == UnitKind.Temperature && Direct.TryGetValue(Key(UnitKind.TemperatureDifference, text), out Entry degree) && degree.Spelling != "K")
        {
            return new LinearMap(degree.Size, degree.Size == 1 ? 273.15 : 459.67 / 1.8);
        }

        if (Direct.TryGetValue(Key(kind, text), out Entry entry)) return new LinearMap(entry.Size);
        if (Millions(text, kind) is { } millions) return millions;
        int slash = text.LastIndexOf('/');
        if (slash <= 0 || Numerator(kind) is not { } numerator) return null;
        return Find(text[..slash], numerator) is { } amount && Direct.TryGetValue(Key(UnitKind.Duration, text[(slash + 1)..]), out Entry time) ? amount.Times(1 / time.Size) : null;
    }

    /// <summary>Metres of water of a spelling such as inH2O; null when it is none.</summary>
    public static double? WaterColumnMetres(string text) => WaterColumns.TryGetValue(text, out double metres) ? metres : null;

    /// <summary>Pascals of one metre of water: the conventional column, or that of real water at a temperature.</summary>
    public static double PascalsPerMetreOfWater(double? kelvins) =>
        kelvins is { } t ? ColdWater.Density(t) * StandardGravity : PascalsPerConventionalInch / MetresPerInch;

    /// <summary>The two meanings of an ambiguous spelling; null when the text has one meaning or none.</summary>
    public static string? Ambiguity(string text)
    {
        string unit = text.Split('/', '(')[0];
        if (TwoMeanings.TryGetValue(unit, out string? meanings)) return meanings;
        if (unit.Length < 3 || (unit[0] != 'M' && unit[0] != 'm')) return null;
        string stem = unit[1..];
        return Array.Exists(ThousandOrMillion, name => Spelling.Same(name, stem))
            ? $"a thousand (k{stem}) or a million (MM{stem})"
            : null;
    }

    private static LinearMap? Millions(string text, UnitKind kind)
    {
        if (!Spelling.Starts(text, "MM") || text.Length < 4) return null;
        string stem = text[2..];
        bool imperial = Array.Exists(ThousandOrMillion, name => Spelling.Same(name, stem));
        return imperial && Direct.TryGetValue(Key(kind, stem), out Entry entry) ? new LinearMap(1e6 * entry.Size) : null;
    }

    private static UnitKind? Numerator(UnitKind rate) => rate switch
    {
        UnitKind.MassFlow => UnitKind.Mass,
        UnitKind.VolumeFlow => UnitKind.Volume,
        UnitKind.StandardGasFlow => UnitKind.StandardGasVolume,
        UnitKind.Power => UnitKind.Energy,
        _ => null,
    };

    private static string Key(UnitKind kind, string text) => $"{(int)kind}:{text}";

    private static Dictionary<string, Entry> Build(params (UnitKind Kind, (string Spelling, double Size)[] Units)[] groups)
    {
        var table = new Dictionary<string, Entry>(StringComparer.OrdinalIgnoreCase);
        foreach ((UnitKind kind, (string Spelling, double Size)[] units) in groups)
        {
            foreach ((string spelling, double size) in units) table[Key(kind, spelling)] = new Entry(spelling, size);
        }

        return table;
    }

    private readonly struct Entry(string spelling, double size)
    {
        public string Spelling { get; } = spelling;

        public double Size { get; } = size;
    }
}
