using FsCheck.Xunit;
using TwoPhase.Units;

namespace TwoPhase.Tests.Units;

public class QuantityTextTests
{
    [Theory]
    [InlineData("77.9 mm", 0.0779)]
    [InlineData("77.9mm", 0.0779)]
    [InlineData(" 3 in ", 0.0762)]
    [InlineData("1e-3 m", 1e-3)]
    [InlineData("-2.5E+1 m", -25)]
    public void Parse_LengthInAnyCulture_IsMetres(string text, double metres) =>
        Culture.Run("de-DE", () => Approx.Relative(metres, QuantityText.Parse(text, UnitKind.Length, UnitBasis.None), 1e-15));

    [Theory]
    [InlineData("77,9 mm", "comma")]
    [InlineData("mm", "number")]
    [InlineData("", "number")]
    [InlineData("NaN mm", "number")]
    [InlineData("1e999 mm", "number")]
    [InlineData("77.9", "no unit")]
    [InlineData("77.9 kg", "length")]
    public void Parse_NoQuantity_SaysWhy(string text, string why)
    {
        FormatException error = Assert.Throws<FormatException>(() => QuantityText.Parse(text, UnitKind.Length, UnitBasis.None));
        Assert.Contains(why, error.Message, StringComparison.Ordinal);
    }

    [Property]
    public bool Write_AnyLength_ReadsBackAsTheSameDouble(double value)
    {
        if (double.IsNaN(value) || double.IsInfinity(value) || Math.Abs(value) > 1e300) return true;
        return QuantityText.Parse(QuantityText.Write(value, "mm", UnitKind.Length, "m"), UnitKind.Length, UnitBasis.None) == value;
    }

    [Fact]
    public void Write_PlainNumber_KeepsItPlain() => Assert.Equal("77.9 mm", QuantityText.Write(UnitsNet.Length.FromMillimeters(77.9).Si(), "mm", UnitKind.Length, "m"));
}
